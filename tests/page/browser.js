// Opens the built page in headless Chromium, served and from disk, and watches what it does.

import assert from 'node:assert/strict';
import { after } from 'node:test';
import { fileURLToPath } from 'node:url';
import { chromium } from 'playwright-core';
import { startServer } from '../../www/build/serve.mjs';

/** @typedef {'served' | 'one file'} Way */

/** @type {Way[]} */
export const WAYS = ['served', 'one file'];

export const DIST = new URL('../../dist/', import.meta.url);

const FLAGS = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
];

/** @type {Promise<import('playwright-core').Browser> | undefined} */
let launched;

/** One browser for each test file; every visit has a profile of its own. */
function browser() {
  launched ??= chromium.launch({
    executablePath: process.env.CHROMIUM ?? '/usr/bin/chromium',
    args: FLAGS,
  });
  return launched;
}

after(async () => (await launched)?.close());

/**
 * @typedef {object} Visit
 * @property {string} address where the page is
 * @property {string[]} requests addresses that were asked for, in order
 * @property {() => Promise<void>} stopServer takes the server away, as when the network fails
 *
 * @typedef {object} Options
 * @property {string} [hash] what follows the address, with its '#'
 * @property {string} [folder] served in the place of dist/
 * @property {RegExp} [expected] faults that this visit provokes on purpose
 * @property {import('playwright-core').BrowserContextOptions} [context] viewport, touch, colours
 */

/**
 * Opens the page in a profile of its own. Closing it fails on any error in the console, any uncaught
 * exception, any failed request and any request to another place than the page's own.
 *
 * @param {Way} way
 * @param {Options} [options]
 */
async function open(way, { hash = '', folder = fileURLToPath(DIST), expected, context: settings } = {}) {
  const server = way === 'served' ? await startServer({ folder }) : null;
  const address = server?.address ?? new URL('shiftgauge.html', DIST).href;
  const context = await (await browser()).newContext(settings);
  const page = await context.newPage();
  const { faults, requests } = watch(context, page, address);
  await page.goto(address + hash, { waitUntil: 'networkidle' });
  const end = async () => {
    await context.close();
    await server?.close();
  };
  const close = async () => {
    await end();
    assert.deepEqual(faults.filter((fault) => !expected?.test(fault)), [], 'faults of the page');
  };
  return { page, close, end, address, requests, stopServer: async () => server?.close() };
}

/**
 * Opens the page for a test that closes it itself.
 *
 * @param {{ from: 'served' | 'disk', viewport: { width: number, height: number }, expected?: RegExp,
 *   hash?: string }} options
 */
export function openPage({ from, viewport, expected, hash }) {
  return open(from === 'served' ? 'served' : 'one file', { expected, hash, context: { viewport } });
}

/**
 * Opens the page, runs the body and closes the page.
 *
 * @param {Way} way
 * @param {(page: import('playwright-core').Page, visit: Visit) => Promise<void>} body
 * @param {Options} [options]
 */
export async function visit(way, body, options = {}) {
  const { page, close, end, ...rest } = await open(way, options);
  try {
    await body(page, rest);
  } catch (failure) {
    await end();
    throw failure;
  }
  await close();
}

/**
 * @param {import('playwright-core').BrowserContext} context
 * @param {import('playwright-core').Page} page
 * @param {string} address
 */
function watch(context, page, address) {
  /** @type {string[]} */
  const faults = [];
  /** @type {string[]} */
  const requests = [];
  page.on('console', (message) => {
    if (message.type() === 'error') faults.push(`console: ${message.text()}`);
  });
  page.on('pageerror', (error) => faults.push(`uncaught: ${error.message}`));
  context.on('requestfailed', (request) => {
    faults.push(`failed: ${request.url()} ${request.failure()?.errorText}`);
  });
  context.on('request', (request) => {
    const url = request.url();
    requests.push(url);
    if (!url.startsWith(address) && !/^(data|blob):/.test(url)) faults.push(`elsewhere: ${url}`);
  });
  return { faults, requests };
}
