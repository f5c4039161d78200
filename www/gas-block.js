/** One table of gases, of the reading or of the feed: wet or dry, how the water is known, a row a species. */

import { byId, chosen, choose, part } from './dom.js';
import { createEntries, placeRow } from './entries.js';
import { asText, fieldsOf, isRecord } from './state.js';
import { understoodSpecies } from './understood.js';

/** @import { GasBlock, Water } from './shiftgauge.js' */
/** @import { Row } from './entries.js' */
/** @import { State } from './state.js' */

const REMAINDER = 'remainder';
const WAYS = ['per_dry', 'fraction', 'dew_point'];

/**
 * @param {string} prefix   of the ids: `gas` or `feed`
 * @param {string} path     of the block in the case, such as `reading.gas`
 */
export function createGasBlock(prefix, path) {
  /** @param {string} name */
  const input = (name) => byId(`${prefix}-${name}`, HTMLInputElement);
  const waterRows = byId(`${prefix}-water-rows`, HTMLElement);
  const waterKind = byId(`${prefix}-water-kind`, HTMLSelectElement);
  const fields = { per_dry: input('water-per-dry'), fraction: input('water-fraction'), dew_point: input('water-dew-point'), pressure: input('water-pressure') };
  const entries = createEntries(byId(`${prefix}-rows`, HTMLElement), 'gas-row-template', prepareRow);
  byId(`${prefix}-add`, HTMLButtonElement).addEventListener('click', () => entries.add('', '').species.focus());

  /** @param {Row} row */
  function prepareRow(row) {
    /** What stood in the field before it became the remainder, to be put back. */
    let before = '';
    const button = part(row.root, 'remainder', HTMLButtonElement);
    button.addEventListener('click', () => {
      const becomes = row.value.value.trim() !== REMAINDER;
      if (becomes) before = row.value.value;
      row.value.value = becomes ? REMAINDER : before;
      row.value.dispatchEvent(new Event('input', { bubbles: true }));
      if (!becomes) row.value.focus();
    });
    // Pressed or chosen, the remainder moves to the row that claims it; typed, it is checked like anything typed.
    row.value.addEventListener('input', ({ isTrusted }) => {
      if (isTrusted || row.value.value !== REMAINDER) return;
      for (const other of entries.all()) if (other !== row && other.value.value.trim() === REMAINDER) other.value.value = '';
    });
  }

  /** @returns {Water | null} */
  function readWater() {
    switch (waterKind.value) {
      case 'per_dry': return { per_dry: fields.per_dry.value };
      case 'fraction': return { fraction: fields.fraction.value };
      case 'dew_point': {
        const pressure = fields.pressure.value.trim() === '' ? {} : { pressure: fields.pressure.value };
        return { dew_point: fields.dew_point.value, ...pressure };
      }
      case 'from_feed': return 'from_feed';
      default: return null;
    }
  }

  return {
    entries,
    /** @param {unknown} block */
    fill(block) {
      const gas = fieldsOf(block);
      const { water } = gas;
      choose(`${prefix}-basis`, gas.basis === 'wet' ? 'wet' : 'dry');
      const known = fieldsOf(water);
      waterKind.value = water === 'from_feed' ? water : WAYS.find((way) => way in known) ?? 'none';
      for (const [name, field] of Object.entries(fields)) field.value = asText(known[name]);
      entries.clear();
      for (const entry of Array.isArray(gas.entries) ? gas.entries : []) {
        if (isRecord(entry)) entries.add(asText(entry.species), asText(entry.value));
      }
    },
    /**
     * The block as the form reads now; null where nothing stands in it.
     * @param {unknown} was   the block before, for what the form has no field for
     * @param {(species: string) => object} [more]   what else belongs to an entry
     * @returns {GasBlock | null}
     */
    read(was, more = () => ({})) {
      const rows = entries.given();
      rows.forEach((row, index) => placeRow(row, `${path}.entries[${index}]`));
      const basis = chosen(`${prefix}-basis`) === 'wet' ? 'wet' : 'dry';
      const water = basis === 'dry' ? readWater() : null;
      if (rows.length === 0 && water === null) return null;
      return {
        ...fieldsOf(was), basis, water,
        entries: rows.map((row) => ({ species: row.species.value.trim(), value: row.value.value, ...more(row.species.value.trim()) })),
      };
    },
    /** @param {State} state */
    render(state) {
      const dry = chosen(`${prefix}-basis`) === 'dry';
      waterRows.hidden = !dry;
      for (const row of waterRows.querySelectorAll('[data-water]')) {
        if (row instanceof HTMLElement) row.hidden = row.dataset.water !== waterKind.value;
      }
      const gases = understoodSpecies(state)?.filter(({ phase }) => phase === null || phase === 'g').map(({ species }) => species);
      if (gases !== undefined) entries.offer(gases.filter((species) => !(dry && species === 'H2O')));
      for (const row of entries.all()) {
        const pressed = row.value.value.trim() === REMAINDER;
        part(row.root, 'remainder', HTMLButtonElement).setAttribute('aria-pressed', String(pressed));
        row.root.classList.toggle('is-offered', row.offered);
      }
    },
  };
}
