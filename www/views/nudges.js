/** Nudges: one small change of each knob, an arrow that is longer the more it does, and why. */

import { byId, create } from '../dom.js';
import { NO_BREAK, amountChange, formula, significant, signed } from '../format.js';

/** @import { Nudge } from '../shiftgauge.js' */
/** @import { State } from '../state.js' */

const section = byId('nudges', HTMLElement);
const list = byId('nudge-list', HTMLElement);
const WORDS = { forward: 'forward', reverse: 'back', none: 'no move' };
const ARROWS = { forward: '→', reverse: '←', none: '·' };
/** @param {State} state */
export function render({ report }) {
  const nudges = report?.nudges ?? [];
  section.hidden = nudges.length === 0 || report?.rest?.outcome === 'has no limit';
  if (section.hidden) return;
  const open = new Set([...list.querySelectorAll('details[open]')].map((row) => row.getAttribute('data-nudge')));
  const largest = Math.max(...nudges.map(({ extent_change_mol: extent }) => Math.abs(extent ?? 0)));
  list.replaceChildren(...nudges.map((nudge) => row(nudge, open, largest)));
}

/**
 * @param {Nudge} nudge
 * @param {Set<string | null>} open   those whose reason is open stay so
 * @param {number} largest            of the list, mol of extent
 */
function row(nudge, open, largest) {
  const name = formula(nudge.name.replaceAll('(g)', ''));
  const key = `${nudge.knob} ${nudge.species ?? ''}`;
  const arrow = create('span', { class: 'length', 'aria-hidden': 'true' }, ARROWS[nudge.direction]);
  arrow.style.setProperty('--length', String(length(nudge, largest)));
  const details = create('details', { class: `nudge ${nudge.direction}`, 'data-nudge': key },
    create('summary', {},
      create('span', { class: 'turn' }, name), arrow,
      create('span', { class: 'effect' }, create('strong', {}, WORDS[nudge.direction]), ` ${size(nudge)}`)),
    create('p', {}, formula(nudge.why)));
  details.open = open.has(key);
  return create('li', {}, details);
}

/**
 * Arrows stand in the ratio of the square roots, so that a small one is still seen.
 * @param {Nudge} nudge
 * @param {number} largest
 */
function length({ extent_change_mol: change, direction }, largest) {
  if (change === null || direction === 'none' || largest === 0) return 0;
  return Math.sqrt(Math.abs(change) / largest);
}

/**
 * The change of rest in points of conversion; where that has no meaning, in moles of extent.
 * @param {Nudge} nudge
 */
function size({ knob, direction, local_direction: local, conversion_change: change, extent_change_mol: extent }) {
  const turned = local !== direction && local !== 'none' && direction !== 'none' ? `, at first ${WORDS[local]}` : '';
  if (direction === 'none' && (change === null || change === 0)) return '';
  if (knob === 'add' || knob === 'remove') return extent === null ? '' : `${amountChange(extent)} of extent${turned}`;
  if (change !== null) return `${signed(significant(change * 100, 2))}${NO_BREAK}points of conversion${turned}`;
  return extent === null ? '' : `${amountChange(extent)} of extent${turned}`;
}
