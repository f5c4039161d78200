// Makes the engine that is timed as small and fast as the one of the page.
// usage: node prepare.js FOLDER

import { writeFile } from 'node:fs/promises';
import { join, resolve } from 'node:path';
import { argv } from 'node:process';
import { optimise } from '../../www/build/engine.mjs';

const folder = resolve(argv[2] ?? '');
await optimise(folder);
await writeFile(join(folder, 'package.json'), '{ "type": "module" }\n');
await writeFile(join(folder, 'index.html'), '<!doctype html><title>Benchmarks</title>\n');
