/** Finding a species of the library, or of one's own book, while its name is typed. */

import { whole } from '../book.js';
import { byId, create } from '../dom.js';
import { findSpecies } from '../engine.js';
import { fixed, formula, significant } from '../format.js';
import { showSheet } from '../species-sheet.js';

/** @import { Asked, SpeciesMatch } from '../shiftgauge.js' */
/** @import { State } from '../state.js' */

const field = byId('library-find', HTMLInputElement);
const count = byId('library-count', HTMLElement);
const list = byId('library-found', HTMLElement);
const PHASES = { g: 'gas', l: 'liquid', s: 'solid', aq: 'dissolved' };

/** @type {Asked} */
let asked = {};

field.addEventListener('input', find);

/** @param {State} state */
export function render({ question, answered, current }) {
  const temperature = current ? answered?.temperature ?? null : asked.temperature ?? null;
  const before = JSON.stringify(asked);
  asked = { temperature, book: { species: whole(question.book).species } };
  if (field.value !== '' && JSON.stringify(asked) !== before) find();
}

function find() {
  const found = findSpecies(field.value, asked);
  const near = found[0]?.found_by === 'near';
  if (field.value.trim() === '') count.textContent = '';
  else if (found.length === 0) count.textContent = 'The library has nothing like this. A species of your own can be added below.';
  else count.textContent = near ? 'Nothing is called so. Nearest:' : `${found.length} found.`;
  list.replaceChildren(...found.map(row));
}

/** @param {SpeciesMatch} match */
function row(match) {
  const [low, high] = match.range_k;
  const outside = match.outside_by_k === null ? '' : `, ${significant(match.outside_by_k, 2)} K outside its range here`;
  const open = create('button', { type: 'button', class: 'found-species' },
    create('strong', {}, formula(match.formula)), ' ',
    create('span', {}, [match.names[0] ?? '', match.cas].filter((text) => text !== '').join(', ')), ' ',
    create('em', {}, `${PHASES[match.phase]}${match.form === null ? '' : `, ${match.form}`}, ${fixed(low, 0)} to ${fixed(high, 0)} K${outside}${match.own ? ', my own' : ''}`));
  open.addEventListener('click', () => showSheet(match.species, asked));
  return create('li', { class: match.outside_by_k === null ? '' : 'is-outside' }, open);
}
