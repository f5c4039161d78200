// Runs after Trunk and wasm-bindgen, in the folder where Trunk gathers the page.

import { copyFile, readFile, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import { env } from 'node:process';
import { bundle } from './bundle.mjs';
import { addReset, optimise } from './engine.mjs';
import { servedPage, withParts } from './html.mjs';
import { copyOffline, writeServiceWorker } from './offline.mjs';
import { writeOneFile } from './one-file.mjs';
import { printSizes } from './sizes.mjs';

const { TRUNK_SOURCE_DIR: source, TRUNK_STAGING_DIR: folder } = env;
if (!source || !folder) throw new Error('this script is started by Trunk: run ./Trunkfile build');

const page = join(folder, 'index.html');
await optimise(folder);
await addReset(folder);
for (const types of ['shiftgauge.d.ts', 'shiftgauge-report.d.ts', 'shiftgauge-library.d.ts']) await copyFile(join(source, types), join(folder, types));
await copyOffline(source, folder);
await bundle(source, folder);
await writeFile(page, servedPage(await withParts(await readFile(page, 'utf8'), source)));
await writeOneFile(folder);
await writeServiceWorker(source, folder);
// Says to Node that the engine's loader is a module, so that it can be imported from this folder.
await writeFile(join(folder, 'package.json'), '{ "type": "module" }\n');
await printSizes(folder);
