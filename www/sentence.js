/** The verdict as a sentence, and what else must be said about how the reaction ends. */

import { NO_BREAK, pair, speciesName, temperatureDifference } from './format.js';

/** @import { Report, ReactionReport } from './shiftgauge.js' */
/** @import { TemperatureUnit } from './format.js' */

const PASCAL_PER_BAR = 1e5;
/** Phases whose activity does not hang on how much of them there is. */
const PURE = ['s', 'l'];

/**
 * @typedef {object} Sentence
 * @property {'forward' | 'reverse' | 'rest' | 'unclear'} tone
 * @property {string} arrow
 * @property {string} lead
 * @property {string} word
 * @property {string} tail
 * @property {string} more
 */

/**
 * @param {Report} report
 * @param {TemperatureUnit} unit
 * @returns {Sentence}
 */
export function sentence(report, unit) {
  const reaction = report.reactions[0];
  if (reaction === undefined) return unclear('');
  const more = [absence(report, reaction), ending(report), pressureAtRest(report), reaction.t_star_k === null ? reaction.approach_note ?? '' : '']
    .filter((text) => text !== '').join(' ');
  const distance = reaction.shortfall_k;
  /** @param {number} kelvin */
  const far = (kelvin) => temperatureDifference(kelvin, unit);
  switch (reaction.verdict) {
    case 'forward':
      return { tone: 'forward', arrow: '→', lead: 'The mixture moves ', word: 'forward', tail: distance !== null && distance > 0 ? `, ${far(distance)} short of equilibrium.` : '.', more };
    case 'reverse':
      return { tone: 'reverse', arrow: '←', lead: 'The mixture moves in ', word: 'reverse', tail: distance !== null && distance < 0 ? `, ${far(-distance)} past equilibrium.` : '.', more };
    case 'at rest':
      return { tone: 'rest', arrow: '⇌', lead: 'The mixture is ', word: 'at rest', tail: restTail(report, reaction), more };
    case 'cannot tell':
      return unclear(more);
    default:
      return { tone: 'unclear', arrow: '', lead: 'There is ', word: 'no reading', tail: ': K alone can be told.', more: '' };
  }
}

/**
 * @param {string} more
 * @returns {Sentence}
 */
function unclear(more) {
  return { tone: 'unclear', arrow: '?', lead: 'This reading ', word: 'cannot tell', tail: ' which way the mixture moves.', more };
}

/**
 * At rest with K not reached, the reaction is spent: it would go on, but what it uses up is gone.
 * @param {Report} report
 * @param {ReactionReport} reaction
 */
function restTail(report, reaction) {
  if (reaction.leaning === null) return '.';
  if (report.rest?.outcome !== 'nothing can move') return `, leaning ${reaction.leaning}.`;
  const side = reaction.leaning === 'forward' ? -1 : 1;
  const gone = reaction.terms.filter(({ nu, species }) => Math.sign(nu) === side && isAbsent(report, species));
  const way = reaction.leaning === 'forward' ? 'move forward' : 'move in reverse';
  return `: it would ${way}, but there is no ${gone.map(({ species }) => speciesName(species)).join(' and no ')} to use up.`;
}

/**
 * @param {Report} report
 * @param {string} species
 */
function isAbsent(report, species) {
  return report.species.some((row) => row.species === species && row.now_mol === 0);
}

/**
 * What a quotient that is no number comes from.
 * @param {Report} report
 * @param {ReactionReport} reaction
 */
function absence(report, reaction) {
  /** @param {string} species */
  const isMissing = (species) => isAbsent(report, species) && !report.species.some((row) => row.species === species && PURE.includes(row.phase));
  /**
   * @param {number} side
   * @param {string} otherwise
   */
  const absent = (side, otherwise) => reaction.terms
    .filter(({ nu, species }) => Math.sign(nu) === side && isMissing(species))
    .map(({ species }) => `no ${speciesName(species)}`).join(' and ') || otherwise;
  const stuck = report.rest?.outcome === 'nothing can move';
  switch (reaction.q) {
    case 'zero': return `There is ${absent(1, 'a product missing')}, so Q is zero${stuck ? '' : ': the reaction can only move forward'}.`;
    case 'infinite': return `There is ${absent(-1, 'a reactant missing')}, so Q is infinite${stuck ? '' : ': the reaction can only move in reverse'}.`;
    case 'undetermined': return `There is ${absent(-1, 'a reactant missing')} and ${absent(1, 'a product missing')}, so Q has no value.`;
    default: return '';
  }
}

/**
 * Where the volume is held, the pressure moves with the reaction.
 * @param {Report} report
 */
function pressureAtRest({ pressure_pa: now, rest }) {
  const then = rest?.pressure_pa;
  if (now === null || then === undefined || then === null || Math.abs(then - now) < 1e-9 * now) return '';
  const shown = pair(now / PASCAL_PER_BAR, then / PASCAL_PER_BAR);
  return `At this volume the pressure goes from ${shown.now} to ${shown.rest}${NO_BREAK}bar(a).`;
}

/**
 * How the way to rest ends, where it ends otherwise than with Q = K.
 * @param {Report} report
 */
function ending(report) {
  const gone = report.species.filter(({ exhausted }) => exhausted).map(({ species }) => speciesName(species)).join(' and ');
  switch (report.rest?.outcome) {
    case 'phase exhausted': return `It goes on until ${gone || 'a phase'} is used up; Q does not reach K.`;
    case 'ran to its limit': return `The composition does not change Q, so it runs until ${gone || 'something'} is used up.`;
    case 'any extent is at rest': return 'Q equals K at every extent: the mixture rests wherever it is.';
    case 'nothing can move': return report.reactions[0]?.verdict === 'cannot tell' ? 'As it stands, nothing can move.' : '';
    case 'has no limit': return 'Nothing that is known in amount stops the reaction: it goes on as long as the ample phases last.';
    default: return '';
  }
}
