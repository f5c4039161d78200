import assert from 'node:assert/strict';
import { readFile } from 'node:fs/promises';
import { test } from 'node:test';
import { engine } from './engine.js';

/** The module starts itself through these; the page has no use for them. */
const NOT_FOR_THE_PAGE = ['default', 'start'];

test('the page is told of every function of the engine, and of no other', async () => {
  const types = await readFile(new URL('../../www/shiftgauge.d.ts', import.meta.url), 'utf8');
  const declared = [...types.matchAll(/^export function (\w+)/gm)].map((match) => match[1]);
  const built = Object.keys(engine).filter((name) => !NOT_FOR_THE_PAGE.includes(name));
  assert.deepEqual(declared.sort(), built.sort());
});
