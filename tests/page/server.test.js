import assert from 'node:assert/strict';
import { request } from 'node:http';
import { test } from 'node:test';
import { fileURLToPath } from 'node:url';
import { startServer } from '../../www/build/serve.mjs';

const folder = fileURLToPath(new URL('../../dist', import.meta.url));

/** @type {[string, string, number, RegExp][]} */
const ANSWERS = [
  ['GET', '/', 200, /^text\/html/],
  ['GET', '/?case=1', 200, /^text\/html/],
  ['GET', '/page.js', 200, /^text\/javascript/],
  ['HEAD', '/shiftgauge_bg.wasm', 200, /^application\/wasm$/],
  ['GET', '/offline/manifest.webmanifest', 200, /^application\/manifest\+json$/],
  ['GET', '/none', 404, /^text\/plain/],
  ['GET', '/offline', 404, /^text\/plain/],
  ['GET', '/../Cargo.toml', 404, /^text\/plain/],
  ['GET', '/%2e%2e%2fCargo.toml', 404, /^text\/plain/],
  ['GET', '/%', 404, /^text\/plain/],
  ['POST', '/', 405, /^text\/plain/],
];

for (const [method, path, status, type] of ANSWERS) {
  test(`the server answers ${method} ${path} with ${status}`, async () => {
    const server = await startServer({ folder });
    try {
      const answer = await ask(server.address, method, path);
      assert.equal(answer.statusCode, status);
      assert.match(answer.headers['content-type'] ?? '', type);
    } finally {
      await server.close();
    }
  });
}

/**
 * Sends the path as it stands, which `fetch` would tidy up first.
 * @param {string} address
 * @param {string} method
 * @param {string} path
 * @returns {Promise<import('node:http').IncomingMessage>}
 */
function ask(address, method, path) {
  return new Promise((resolve, reject) => {
    const sent = request(address, { method, path }, (answer) => {
      answer.resume().on('end', () => resolve(answer));
    });
    sent.on('error', reject).end();
  });
}
