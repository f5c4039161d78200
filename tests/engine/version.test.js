import assert from 'node:assert/strict';
import { readFile } from 'node:fs/promises';
import { test } from 'node:test';
import { engine, ENGINE_BYTES, startedEngine } from './engine.js';

const manifest = await readFile(new URL('../../Cargo.toml', import.meta.url), 'utf8');

test('the engine starts in Node and gives the version of the package', () => {
  const version = manifest.match(/^version = "(.*)"$/m)?.[1];
  assert.ok(version && JSON.stringify(startedEngine().version()).includes(version));
});

test('a second start keeps the running engine', () => {
  const first = engine.initSync({ module: ENGINE_BYTES });
  assert.equal(engine.initSync({ module: ENGINE_BYTES }), first);
});

test('after a reset the next start makes a new engine, and it works', () => {
  const first = engine.initSync({ module: ENGINE_BYTES });
  engine.reset();
  assert.notEqual(engine.initSync({ module: ENGINE_BYTES }), first);
  assert.ok(engine.version());
});
