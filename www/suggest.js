/**
 * Species offered while one types: a field with a list under it, worked by keyboard and by touch. In an
 * equation the word at the cursor is looked up, elsewhere the whole field.
 */

import { create } from './dom.js';
import { findSpecies } from './engine.js';
import { formula } from './format.js';
import { wordAt } from './word.js';

/** @import { SpeciesMatch } from './shiftgauge.js' */

const MOST = 8;
const PHASES = { g: 'gas', l: 'liquid', s: 'solid', aq: 'dissolved' };
let serial = 0;

/**
 * @param {HTMLInputElement} field        says in `data-suggest` which phases are asked for, or `equation`
 * @param {(match: SpeciesMatch) => void} [picked]
 */
export function suggest(field, picked = () => {}) {
  const inEquation = field.dataset.suggest === 'equation';
  const phases = field.dataset.suggest?.split(' ') ?? [];
  serial += 1;
  const list = create('ul', { class: 'suggestions', role: 'listbox', id: `suggestions-${serial}`, 'aria-label': 'Species of the library' });
  list.hidden = true;
  for (const [name, value] of [['role', 'combobox'], ['aria-autocomplete', 'list'], ['aria-expanded', 'false'], ['aria-controls', list.id]]) field.setAttribute(String(name), String(value));
  const holder = create('span', { class: 'combobox' });
  field.replaceWith(holder);
  holder.append(field, list);
  /** @type {SpeciesMatch[]} */
  let matches = [];
  let active = -1;

  const word = () => (inEquation ? wordAt(field.value, field.selectionStart ?? field.value.length) : { text: field.value.trim(), start: 0, end: field.value.length });

  function close() {
    list.hidden = true;
    active = -1;
    field.setAttribute('aria-expanded', 'false');
    field.removeAttribute('aria-activedescendant');
  }

  /** @param {number} least   so many signs must be there */
  function offer(least) {
    const { text } = word();
    const found = text.length < least ? [] : findSpecies(text);
    matches = found.filter((match) => inEquation || phases.includes(match.phase)).slice(0, MOST);
    const whole = matches.filter(({ found_by: by }) => by === 'formula');
    const alreadyThere = whole.length === 1 && matches.length === 1;
    close();
    if (matches.length === 0 || alreadyThere) return;
    list.replaceChildren(...matches.map(option));
    list.hidden = false;
    field.setAttribute('aria-expanded', 'true');
  }

  /**
   * @param {SpeciesMatch} match
   * @param {number} index
   */
  function option(match, index) {
    const item = create('li', { role: 'option', id: `${list.id}-${index}`, 'aria-selected': 'false' },
      create('strong', {}, formula(match.formula)), ' ',
      create('span', {}, [match.names[0] ?? '', match.cas].filter((text) => text !== '').join(', ')), ' ',
      create('em', {}, `${PHASES[match.phase]}${match.form === null ? '' : `, ${match.form}`}`));
    // The field keeps the focus, and what is pressed is taken.
    item.addEventListener('pointerdown', (event) => event.preventDefault());
    item.addEventListener('click', () => take(match));
    return item;
  }

  /** @param {SpeciesMatch} match */
  function take(match) {
    if (inEquation) {
      const { start, end } = word();
      field.setRangeText(equationName(match, matches), start, end, 'end');
    } else {
      field.value = blockName(match);
    }
    close();
    picked(match);
    field.dispatchEvent(new Event('input', { bubbles: true }));
  }

  /** @param {number} step */
  function move(step) {
    const options = [...list.children];
    active = active + step < -1 ? options.length - 1 : active + step >= options.length ? -1 : active + step;
    options.forEach((item, index) => item.setAttribute('aria-selected', String(index === active)));
    options[active]?.scrollIntoView({ block: 'nearest' });
    if (active === -1) field.removeAttribute('aria-activedescendant');
    else field.setAttribute('aria-activedescendant', `${list.id}-${active}`);
  }

  field.addEventListener('input', (event) => {
    // A space behind a word ends it, so the list does not stay in the way of the next.
    const isEnded = inEquation && (field.selectionStart ?? 0) > word().end;
    if (isEnded) close();
    else if (event.isTrusted) offer(2);
  });
  field.addEventListener('blur', () => {
    close();
    // A name that means one species alone is written as its formula.
    const typed = field.value.trim();
    const [only, ...others] = inEquation ? [] : findSpecies(typed).filter((match) => phases.includes(match.phase) && match.found_by === 'name');
    if (only !== undefined && others.length === 0) take(only);
  });
  field.addEventListener('keydown', (event) => {
    if (event.key === 'ArrowDown' && list.hidden) offer(1);
    if (list.hidden) return;
    const chosen = matches[active];
    if (event.key === 'ArrowDown') move(1);
    else if (event.key === 'ArrowUp') move(-1);
    else if (event.key === 'Enter' && chosen !== undefined) take(chosen);
    else if (event.key === 'Escape') close();
    else return;
    event.preventDefault();
    event.stopPropagation();
  });
}

/**
 * How a block names a species: without the phase, which the block says, but with the name of its form.
 * @param {SpeciesMatch} match
 */
const blockName = ({ species, formula: bare, form }) => (form === null ? bare : species);

/**
 * In an equation the phase is written where the library has the formula in more than one that is likely.
 * @param {SpeciesMatch} match
 * @param {readonly SpeciesMatch[]} all
 */
function equationName(match, all) {
  const several = [...all, ...findSpecies(match.formula)].some((other) => other.formula === match.formula && other.species !== match.species && other.likely);
  return several || !match.likely ? match.species : match.formula;
}
