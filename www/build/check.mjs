// Runs before Trunk builds: index.html must say what the later steps rely on.

import { readFile } from 'node:fs/promises';
import { env, exit } from 'node:process';
import { ENGINE_LINK, PAGE_SCRIPT, PAGE_STYLE, scripts } from './html.mjs';

const html = await readFile(env.TRUNK_HTML_FILE ?? 'www/index.html', 'utf8');
const wrong = [];
if (!html.includes(ENGINE_LINK)) wrong.push(`the engine's link has to be: ${ENGINE_LINK}`);
if (!html.includes(PAGE_STYLE)) wrong.push(`the style sheet's link has to be: ${PAGE_STYLE}`);
if (!html.includes(PAGE_SCRIPT) || scripts(html).length !== 1) {
  wrong.push(`the one and only script has to be: ${PAGE_SCRIPT}`);
}
for (const sentence of wrong) console.error(`www/index.html: ${sentence}`);
if (wrong.length > 0) exit(1);
