/** A pinned answer beside the one now. */

import { byId, create } from '../dom.js';
import { NO_BREAK, decimalsFor, fixed, molarEnergy, significant, signed, speciesName, temperature, temperatureDifference, temperatureUnit } from '../format.js';

/** @import { Answered, State } from '../state.js' */

const section = byId('compare', HTMLElement);
const pin = byId('pin', HTMLButtonElement);
const unpin = byId('unpin', HTMLButtonElement);
const text = byId('compare-text', HTMLElement);
const table = byId('compare-table', HTMLElement);
const rows = byId('compare-rows', HTMLElement);
const HINT = text.textContent ?? '';

/** @type {Answered | null} */
let now = null;

/**
 * Asks whoever runs the page to keep an answer beside the one now, or to let it go.
 * @param {{ pin: (pinned: Answered | null) => void }} actions
 */
export function connect(actions) {
  pin.addEventListener('click', () => actions.pin(now));
  unpin.addEventListener('click', () => {
    actions.pin(null);
    pin.focus();
  });
}

/** @param {State} state */
export function render({ report, answered, current, pinned }) {
  now = report === null || answered === null ? null : { report, answered };
  section.hidden = now === null;
  // An answer that is out of date would be pinned under the name of a case that it does not belong to.
  pin.disabled = !current;
  draw(pinned);
}

/** @param {Answered | null} pinned */
function draw(pinned) {
  unpin.hidden = pinned === null;
  table.hidden = pinned === null;
  pin.textContent = pinned === null ? 'Pin this answer' : 'Pin the answer now instead';
  if (pinned === null || now === null) {
    text.textContent = HINT;
    return;
  }
  text.textContent = `Pinned: ${pinned.answered.title || 'a case without a title'}, ${settings(pinned)}. Now: ${settings(now)}.`;
  rows.replaceChildren(...compared(pinned, now).map(([name, ...cells]) => create('tr', {},
    create('th', { scope: 'row' }, name ?? ''), ...cells.map((cell) => create('td', {}, cell)))));
}

/** @param {Answered} one */
function settings({ answered }) {
  return [answered.temperature, answered.pressure ?? ''].filter(Boolean).join(', ');
}

/**
 * @param {Answered} before
 * @param {Answered} after
 * @returns {string[][]}
 */
function compared(before, after) {
  const unit = temperatureUnit(after.answered.temperature);
  const [a, b] = [before.report.reactions[0], after.report.reactions[0]];
  if (a === undefined || b === undefined) return [];
  /**
   * @param {string} name
   * @param {number | null} first
   * @param {number | null} second
   * @param {(value: number) => string} say
   * @param {(difference: number) => string} [sayDifference]
   */
  const line = (name, first, second, say, sayDifference = say) => [
    name, first === null ? '–' : say(first), second === null ? '–' : say(second),
    first === null || second === null ? '–' : signed(sayDifference(second - first)),
  ];
  /** @param {number} share */
  const perCent = (share) => `${significant(share * 100, 4)}${NO_BREAK}%`;
  const shared = after.report.species.flatMap(({ species, rest_fraction: rest }) => {
    const old = before.report.species.find((one) => one.species === species);
    return old === undefined || rest === null ? [] : [line(`${speciesName(species)} at rest`, old.rest_fraction, rest, perCent)];
  });
  return [
    ['verdict', a.verdict ?? '–', b.verdict ?? '–', a.verdict === b.verdict ? 'the same' : 'changed'],
    line('T − T*', a.approach_k, b.approach_k, (kelvin) => temperatureDifference(kelvin, unit)),
    line('T*', a.t_star_k, b.t_star_k, (kelvin) => temperature(kelvin, unit, 1), (kelvin) => temperatureDifference(kelvin, unit)),
    line('ΔG', a.gibbs_j_per_mol, b.gibbs_j_per_mol, molarEnergy),
    line('log10 K', a.log10_k, b.log10_k, (value) => fixed(value, Math.max(3, decimalsFor(b.log10_k - a.log10_k)))),
    ...after.report.conversions.flatMap(({ species, now_to_rest: share }) => {
      const old = before.report.conversions.find((one) => one.species === species);
      return old === undefined ? [] : [line(`${speciesName(species)} still to react`, old.now_to_rest, share, perCent)];
    }),
    ...shared,
  ];
}
