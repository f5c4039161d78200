/** How sure the verdict is: the interval against the band, and which inputs make it. */

import { drawScale } from '../chart/scale.js';
import { byId, create } from '../dom.js';
import { goTo } from '../find-field.js';
import { NO_BREAK, formula, significant, signed, temperatureDifference, temperatureUnit } from '../format.js';

/** @import { BudgetRow, Interval, ReactionReport, Report } from '../shiftgauge.js' */
/** @import { State } from '../state.js' */
/** @import { ScaleScene } from '../chart/scale.js' */

const section = byId('certainty', HTMLElement);
const drawing = byId('certainty-drawing', HTMLElement);
const words = byId('certainty-text', HTMLElement);
const better = byId('better', HTMLElement);
const rows = byId('budget-rows', HTMLElement);
const small = byId('budget-small', HTMLElement);
/** Shares below this are told in one line. */
const SMALL = 0.01;

/** @type {ScaleScene | null} */
let scene = null;
let width = 0;

new ResizeObserver(([entry]) => {
  const found = Math.round(entry?.contentRect.width ?? 0);
  if (found === width || found === 0) return;
  width = found;
  draw();
}).observe(drawing);

/** @param {State} state */
export function render({ report, answered }) {
  const reaction = report?.reactions[0];
  section.hidden = reaction === undefined || reaction.verdict === null || report?.rest === null;
  if (reaction === undefined || answered === null || section.hidden) return;
  scene = (reaction.band?.kind === 'conversion' ? conversionScene(reaction) : temperatureScene(reaction, answered.temperature)) ?? affinityScene(reaction);
  words.textContent = scene?.description ?? 'There is no interval to draw: Q is no number here.';
  better.hidden = reaction.better.length === 0;
  better.replaceChildren(create('p', {}, 'To settle it, measure better:'), create('ul', {}, ...reaction.better.map(({ text }) => create('li', {}, formula(text)))));
  fillBudget(reaction);
  draw();
}

function draw() {
  if (scene === null || width === 0) drawing.replaceChildren();
  else drawing.replaceChildren(drawScale(scene, Math.max(260, width)));
}

/**
 * @param {ReactionReport} reaction
 * @param {string} typed
 * @returns {ScaleScene | null}
 */
function temperatureScene({ approach_k: value, approach_interval_k: ends, band }, typed) {
  if (value === null || ends === null || band?.kind !== 'temperature') return null;
  const unit = temperatureUnit(typed);
  const per = unit === '°F' ? 1.8 : 1;
  /** @param {number} kelvin */
  const say = (kelvin) => signed(temperatureDifference(kelvin, unit));
  return {
    value: value * per,
    ends: scaled(ends, per),
    band: band.half_width_k * per,
    unit: unit === '°F' ? '°F' : 'K',
    labels: { value: `T − T* ${say(value)}`, zero: 'rest: T = T*' },
    title: 'T − T* with its 95 % interval, against the band',
    description: `T − T* is ${say(value)}, ${range(ends, say)}. The band that counts as rest is ±${NO_BREAK}${temperatureDifference(band.half_width_k, unit)}: the interval ${place(ends, band.half_width_k)}.`,
  };
}

/**
 * Where there is no T*, or no interval of it, the verdict rests on the affinity.
 * @param {ReactionReport} reaction
 * @returns {ScaleScene | null}
 */
function affinityScene({ affinity_over_rt: value, affinity_interval_over_rt: ends, t_star_k: tStar }) {
  if (value === null || ends === null) return null;
  const say = (/** @type {number} */ number) => signed(significant(number, 3));
  const why = tStar === null ? 'There is no T* to compare with' : 'There is no interval of T − T* to compare with';
  return {
    value,
    ends,
    band: null,
    unit: '',
    labels: { value: `ln K − ln Q ${say(value)}`, zero: 'rest: Q = K' },
    title: 'ln K − ln Q with its 95 % interval',
    description: `${why}, so the verdict rests on ln K − ln Q: ${say(value)}, ${range(ends, say)}. Above zero the mixture moves forward, below it in reverse: ${side(ends)}.`,
  };
}

/** @param {Interval} ends */
function side([low, high]) {
  if (low !== null && low > 0) return 'the interval lies above';
  return high !== null && high < 0 ? 'the interval lies below' : 'the interval reaches to both sides';
}

/**
 * @param {ReactionReport} reaction
 * @returns {ScaleScene | null}
 */
function conversionScene({ missing_conversion: value, missing_conversion_interval: ends, band }) {
  if (value === null || ends === null || band?.kind !== 'conversion') return null;
  /** @param {number} share */
  const say = (share) => `${signed(significant(share * 100, 3))}${NO_BREAK}%`;
  return {
    value: value * 100,
    ends: scaled(ends, 100),
    band: band.half_width * 100,
    unit: '%',
    labels: { value: `missing ${say(value)}`, zero: 'rest' },
    title: 'Missing conversion with its 95 % interval, against the band',
    description: `The missing conversion is ${say(value)}, ${range(ends, say)}. The band that counts as rest is ±${NO_BREAK}${significant(band.half_width * 100, 3)}${NO_BREAK}%: the interval ${place(ends, band.half_width)}.`,
  };
}

/**
 * @param {Interval} ends
 * @param {number} factor
 * @returns {Interval}
 */
const scaled = ([low, high], factor) => [low === null ? null : low * factor, high === null ? null : high * factor];

/**
 * @param {Interval} ends
 * @param {(value: number) => string} say
 */
function range([low, high], say) {
  if (low === null && high === null) return 'with 95 % open both ways';
  if (low === null) return `with 95 % below ${say(/** @type {number} */ (high))}, open downwards`;
  if (high === null) return `with 95 % above ${say(low)}, open upwards`;
  return low === high ? 'and nothing has a tolerance, so that there is no interval' : `with 95 % between ${say(low)} and ${say(high)}`;
}

/**
 * @param {Interval} ends
 * @param {number} band
 */
function place([low, high], band) {
  if (low !== null && high !== null && low >= -band && high <= band) return 'lies inside it';
  if ((low !== null && low > band) || (high !== null && high < -band)) return 'lies outside it';
  return 'reaches out of it';
}

/** @param {ReactionReport} reaction */
function fillBudget({ budget, linear }) {
  const large = budget.filter((row) => row.share_of_variance >= SMALL);
  rows.replaceChildren(...large.map(budgetRow));
  const rest = budget.length - large.length;
  const more = rest === 0 ? '' : `${rest} further ${rest === 1 ? 'input makes' : 'inputs make'} less than 1 % each.`;
  small.textContent = [large.length === 0 ? 'No input has a tolerance that matters.' : '', more, linear ? '' : 'Within these tolerances the figures bend, so that the interval is a rough one.'].filter(Boolean).join(' ');
}

/** @param {BudgetRow} row */
function budgetRow({ input, name, share_of_variance: share }) {
  const label = formula(name);
  const lead = input === '' ? create('span', {}, label) : create('button', { type: 'button', class: 'plain' }, label);
  if (input !== '') lead.addEventListener('click', () => goTo(input));
  const bar = create('span', { class: 'bar', 'aria-hidden': 'true' });
  bar.style.setProperty('--share', String(share));
  return create('li', {}, lead, bar, create('span', { class: 'share' }, `${significant(share * 100, 2)}${NO_BREAK}%`));
}
