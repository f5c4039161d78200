// The work inside the engine in headless Chromium.
// usage: node chromium.js FOLDER, where FOLDER holds the engine built with the feature `bench`.

import { resolve } from 'node:path';
import { argv, env } from 'node:process';
import { chromium } from 'playwright-core';
import { startServer } from '../../www/build/serve.mjs';
import { timeBatches } from './batches.js';

const server = await startServer({ folder: resolve(argv[2] ?? '') });
const browser = await chromium.launch({
  executablePath: env.CHROMIUM ?? '/usr/bin/chromium',
  args: ['--no-sandbox', '--disable-gpu'],
});
try {
  const page = await browser.newPage();
  await page.goto(new URL('index.html', server.address).href);
  const lines = await page.evaluate(
    /** @param {string} source */
    async (source) => {
      const loader = new URL('shiftgauge.js', location.href).href;
      const { default: init, Bench } = await import(loader);
      await init();
      const time = /** @type {typeof timeBatches} */ (new Function(`return ${source}`)());
      return time(Bench.set_up(), Bench.names(), 'Chromium');
    },
    timeBatches.toString(),
  );
  for (const line of lines) console.log(JSON.stringify(line));
} finally {
  await browser.close();
  await server.close();
}
