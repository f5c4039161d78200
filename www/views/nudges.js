/** Nudges: one small change of each knob, an arrow as long as what it does, and why. */

import { byId, create } from '../dom.js';
import { NO_BREAK, amountChange, formula, significant, signed } from '../format.js';

/** @import { Nudge } from '../shiftgauge.js' */
/** @import { State } from '../state.js' */

const section = byId('nudges', HTMLElement);
const list = byId('nudge-list', HTMLElement);
const WORDS = { forward: 'forward', reverse: 'back', none: 'no move' };
const ARROWS = { forward: '→', reverse: '←', none: '·' };
/** An arrow of full length stands for this change of conversion; short ones are drawn longer than to scale. */
const FULL = 0.05;

/** @param {State} state */
export function render({ report }) {
  const nudges = report?.nudges ?? [];
  section.hidden = nudges.length === 0 || report?.rest?.outcome === 'has no limit';
  if (section.hidden) return;
  const open = new Set([...list.querySelectorAll('details[open]')].map((row) => row.getAttribute('data-nudge')));
  list.replaceChildren(...nudges.map((nudge) => row(nudge, open)));
}

/**
 * @param {Nudge} nudge
 * @param {Set<string | null>} open   those whose reason is open stay so
 */
function row(nudge, open) {
  const name = formula(nudge.name);
  const key = `${nudge.knob} ${nudge.species ?? ''}`;
  const arrow = create('span', { class: 'length', 'aria-hidden': 'true' }, ARROWS[nudge.direction]);
  arrow.style.setProperty('--length', String(length(nudge)));
  const details = create('details', { class: `nudge ${nudge.direction}`, 'data-nudge': key },
    create('summary', {},
      create('span', { class: 'turn' }, name), arrow,
      create('span', { class: 'effect' }, create('strong', {}, WORDS[nudge.direction]), ` ${size(nudge)}`)),
    create('p', {}, formula(nudge.why)));
  details.open = open.has(key);
  return create('li', {}, details);
}

/** @param {Nudge} nudge */
function length({ conversion_change: change, direction }) {
  if (change === null || direction === 'none') return 0;
  return Math.min(1, Math.sqrt(Math.abs(change) / FULL));
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
