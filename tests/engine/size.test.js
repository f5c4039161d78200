import assert from 'node:assert/strict';
import { test } from 'node:test';
import { gzippedLength } from '../../www/build/sizes.mjs';
import { ENGINE_BYTES } from './engine.js';

/** The aim is 80 kB without the tables of species; the ceiling leaves room for those. */
const CEILING_BYTES = 120_000;

test('the engine stays small on its way over the network', (t) => {
  const size = gzippedLength(ENGINE_BYTES);
  t.diagnostic(`engine: ${ENGINE_BYTES.length} bytes, ${size} gzipped, ceiling ${CEILING_BYTES}`);
  assert.ok(size <= CEILING_BYTES, `${size} bytes gzipped`);
});
