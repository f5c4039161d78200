/** The gas analysis: wet or dry, how the water is known, and one row a species. */

import { byId, chosen, choose, part } from '../dom.js';
import { createEntries, placeRow } from '../entries.js';
import { asText, isRecord } from '../state.js';
import { understoodSpecies } from '../understood.js';

/** @import { Case, GasBlock, Water } from '../shiftgauge.js' */
/** @import { Row } from '../entries.js' */
/** @import { State } from '../state.js' */

const REMAINDER = 'remainder';
const waterKind = byId('water-kind', HTMLSelectElement);
const perDry = byId('water-per-dry', HTMLInputElement);
const fraction = byId('water-fraction', HTMLInputElement);
const dewPoint = byId('water-dew-point', HTMLInputElement);
const waterPressure = byId('water-pressure', HTMLInputElement);
const entries = createEntries(byId('gas-rows', HTMLElement), 'gas-row-template', prepareRow);

byId('gas-add', HTMLButtonElement).addEventListener('click', () => entries.add('', '').species.focus());

/** @param {Row} row */
function prepareRow(row) {
  /** What stood in the field before it became the remainder, to be put back. */
  let before = '';
  const button = part(row.root, 'remainder', HTMLButtonElement);
  button.addEventListener('click', () => {
    const becomes = row.value.value.trim() !== REMAINDER;
    if (becomes) {
      for (const other of entries.all()) if (other.value.value.trim() === REMAINDER) other.value.value = '';
      before = row.value.value;
    }
    row.value.value = becomes ? REMAINDER : before;
    row.value.dispatchEvent(new Event('input', { bubbles: true }));
    if (!becomes) row.value.focus();
  });
}

/** @param {Case} question */
export function fill(question) {
  const gas = isRecord(question.reading.gas) ? question.reading.gas : null;
  const water = gas?.water;
  choose('gas-basis', gas?.basis === 'wet' ? 'wet' : 'dry');
  waterKind.querySelector('option[value="from_feed"]')?.remove();
  if (water === 'from_feed') waterKind.append(new Option('the feed in the file', 'from_feed'));
  /** @type {Record<string, unknown>} */
  const known = isRecord(water) ? water : {};
  waterKind.value = water === 'from_feed' ? water : ['per_dry', 'fraction', 'dew_point'].find((kind) => kind in known) ?? 'none';
  perDry.value = asText(known.per_dry);
  fraction.value = asText(known.fraction);
  dewPoint.value = asText(known.dew_point);
  waterPressure.value = asText(known.pressure);
  entries.clear();
  for (const entry of Array.isArray(gas?.entries) ? gas.entries : []) {
    if (isRecord(entry)) entries.add(asText(entry.species), asText(entry.value));
  }
}

/**
 * @param {Case} question
 * @returns {Case}
 */
export function read(question) {
  const rows = entries.given();
  rows.forEach((row, index) => placeRow(row, `reading.gas.entries[${index}]`));
  const basis = chosen('gas-basis') === 'wet' ? 'wet' : 'dry';
  const water = basis === 'dry' ? readWater() : null;
  const was = isRecord(question.reading.gas) ? question.reading.gas : {};
  /** @type {GasBlock | null} */
  const gas = rows.length === 0 && water === null ? null : {
    ...was, basis, water,
    entries: rows.map((row) => ({ species: row.species.value.trim(), value: row.value.value })),
  };
  return { ...question, reading: { ...question.reading, gas } };
}

/** @returns {Water | null} */
function readWater() {
  switch (waterKind.value) {
    case 'per_dry': return { per_dry: perDry.value };
    case 'fraction': return { fraction: fraction.value };
    case 'dew_point': return { dew_point: dewPoint.value, pressure: waterPressure.value };
    case 'from_feed': return 'from_feed';
    default: return null;
  }
}

/** @param {State} state */
export function render(state) {
  const dry = chosen('gas-basis') === 'dry';
  byId('water-rows', HTMLElement).hidden = !dry;
  for (const row of document.querySelectorAll('[data-water]')) {
    if (row instanceof HTMLElement) row.hidden = row.dataset.water !== waterKind.value;
  }
  const gases = understoodSpecies(state)?.filter(({ phase }) => phase === null || phase === 'g').map(({ species }) => species);
  if (gases !== undefined) entries.offer(gases.filter((species) => !(dry && species === 'H2O')));
  for (const row of entries.all()) {
    const pressed = row.value.value.trim() === REMAINDER;
    part(row.root, 'remainder', HTMLButtonElement).setAttribute('aria-pressed', String(pressed));
    row.root.classList.toggle('is-offered', row.offered);
  }
}
