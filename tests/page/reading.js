/** What the tests read from the page, by what it means rather than how it looks. */

/** @import { Page } from 'playwright-core' */

/**
 * Waits for the first answer.
 * @param {Page} page
 */
export async function answered(page) {
  await page.waitForSelector('#direction');
}

/**
 * The word of the verdict: forward, reverse, at rest or cannot tell.
 * @param {Page} page
 */
export async function direction(page) {
  return (await page.textContent('#direction')) ?? '';
}

/**
 * The text of one number of the answer: `q`, `k`, `gibbs`, `t_star` or `approach`.
 * @param {Page} page
 * @param {string} name
 */
export async function figure(page, name) {
  return (await page.textContent(`[data-figure="${name}"] dd`)) ?? '';
}

/**
 * A species' row of the ledger as numbers: now, at rest, change.
 * @param {Page} page
 * @param {string} species
 */
export async function ledger(page, species) {
  const cells = await page.locator(`#ledger-body tr[data-species="${species}"] td`).allTextContents();
  return cells.map(number);
}

/**
 * The number at the start of a text; its minus sign is U+2212.
 * @param {string} text
 */
export function number(text) {
  return Number.parseFloat(text.replace('\u2212', '-').replace(/,/g, ''));
}

/**
 * The value field of a gas, found by its accessible name.
 * @param {Page} page
 * @param {string} name   as shown, such as CO₂
 */
export function gasField(page, name) {
  return page.locator('#gas-rows').getByRole('textbox', { name: `${name}, value`, exact: true });
}

/**
 * The case as the page keeps it.
 * @param {Page} page
 * @returns {Promise<any>}
 */
export async function caseOf(page) {
  return page.evaluate(() => JSON.parse(window.sessionStorage.getItem('shiftgauge.case') ?? 'null'));
}

/**
 * Opens a case as a file would hold it; what it leaves out is that of an empty case.
 * @param {Page} page
 * @param {object} question
 */
export async function openCase(page, question) {
  await page.setInputFiles('#case-open', { name: 'case.json', mimeType: 'application/json', buffer: Buffer.from(JSON.stringify({ format: 'shiftgauge 1', ...question })) });
  await page.waitForSelector('#notice:has-text("Opened case.json")');
}

/** A visit with nothing but a finger, from a file on disk, with the network off. */
export const BY_TOUCH = { context: { offline: true, hasTouch: true, isMobile: true, viewport: { width: 390, height: 844 } } };

/** A visit at a desk, from a file on disk, with the network off. */
export const AT_DESK = { context: { offline: true, viewport: { width: 1280, height: 800 } } };

/**
 * Opens one of the page's own examples through the panel of cases.
 * @param {Page} page
 * @param {string} name
 */
export async function openExample(page, name) {
  if (await page.isHidden('#cases')) await page.click('#cases-button');
  await page.click(`[data-example="${name}"]`);
  await answered(page);
}
