// Serves a folder on this machine only: for ./Trunkfile serve and for the tests of the page.

import { createReadStream } from 'node:fs';
import { stat } from 'node:fs/promises';
import { createServer } from 'node:http';
import { extname, join, normalize, sep } from 'node:path';
import { fileURLToPath, pathToFileURL } from 'node:url';

const HOST = '127.0.0.1';

/** @type {Record<string, string>} */
const TYPES = {
  '.css': 'text/css; charset=utf-8',
  '.html': 'text/html; charset=utf-8',
  '.js': 'text/javascript; charset=utf-8',
  '.json': 'application/json',
  '.map': 'application/json',
  '.png': 'image/png',
  '.svg': 'image/svg+xml',
  '.ts': 'text/plain; charset=utf-8',
  '.wasm': 'application/wasm',
  '.webmanifest': 'application/manifest+json',
};

/**
 * Starts a server; port 0 takes any free one.
 * @param {{ folder: string, port?: number }} options
 * @returns {Promise<{ address: string, close: () => Promise<void> }>}
 */
export async function startServer({ folder, port = 0 }) {
  const server = createServer((request, response) => {
    answer(folder, request, response).catch(() => end(response, 500, 'the file could not be read'));
  });
  await new Promise((resolve, reject) => {
    server.once('error', reject);
    server.listen(port, HOST, () => resolve(undefined));
  });
  const bound = /** @type {import('node:net').AddressInfo} */ (server.address());
  return {
    address: `http://${HOST}:${bound.port}/`,
    close: () =>
      new Promise((resolve) => {
        server.close(() => resolve());
        server.closeAllConnections();
      }),
  };
}

/**
 * @param {string} folder
 * @param {import('node:http').IncomingMessage} request
 * @param {import('node:http').ServerResponse} response
 */
async function answer(folder, request, response) {
  if (request.method !== 'GET' && request.method !== 'HEAD') return end(response, 405, 'only GET');
  const path = fileOf(folder, request.url ?? '/');
  const found = path ? await stat(path).catch(() => null) : null;
  if (!path || !found?.isFile()) return end(response, 404, 'no such file');
  response.writeHead(200, {
    'Content-Type': TYPES[extname(path)] ?? 'application/octet-stream',
    'Content-Length': found.size,
    'Cache-Control': 'no-cache',
    'X-Content-Type-Options': 'nosniff',
  });
  if (request.method === 'HEAD') response.end();
  else createReadStream(path).pipe(response);
}

/**
 * The file that a request names, or null when it lies outside the folder.
 * @param {string} folder
 * @param {string} target
 */
function fileOf(folder, target) {
  try {
    const path = decodeURIComponent(new URL(target, 'http://localhost').pathname);
    const file = normalize(join(folder, path.endsWith('/') ? `${path}index.html` : path));
    return file.startsWith(normalize(folder + sep)) && !file.includes('\0') ? file : null;
  } catch {
    return null;
  }
}

/**
 * @param {import('node:http').ServerResponse} response
 * @param {number} status
 * @param {string} text
 */
function end(response, status, text) {
  if (!response.headersSent) response.writeHead(status, { 'Content-Type': 'text/plain' });
  response.end(`${text}\n`);
}

if (process.argv[1] && import.meta.url === pathToFileURL(process.argv[1]).href) {
  const port = Number(process.argv[2] ?? 8080);
  const folder = fileURLToPath(new URL('../../dist', import.meta.url));
  try {
    const { address } = await startServer({ folder, port });
    console.log(`== the page: ${address} (Ctrl-C ends it)`);
  } catch (error) {
    const busy = /** @type {NodeJS.ErrnoException} */ (error).code === 'EADDRINUSE';
    console.error(`== failed: serving on port ${port}${busy ? ', which is in use' : `: ${error}`}`);
    console.error('== next: take another port: PORT=8081 ./Trunkfile serve');
    process.exit(1);
  }
}
