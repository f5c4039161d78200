/** The valley's drawing with its words: drawn anew for every report and every width. */

import { drawValley } from '../chart/valley.js';
import { byId, choose, chosen } from '../dom.js';
import { NO_BREAK, amountUnit, speciesName, significant } from '../format.js';

/** @import { Report, Valley } from '../shiftgauge.js' */
/** @import { State } from '../state.js' */

const drawing = byId('valley-drawing', HTMLElement);
const heading = byId('valley-heading', HTMLElement);
const words = byId('valley-text', HTMLElement);
const choice = byId('valley-choice', HTMLElement);
const ARROWS = { forward: '→', reverse: '←', 'at rest': '⇌', 'cannot tell': '?' };
const NARROWEST_PX = 240;

/** Where now and rest stand closer than this part of the valley, the closer look comes first. */
const CLOSE = 0.06;

/** @type {Report | null} */
let shown = null;
let width = 0;
let userChose = false;

new ResizeObserver(([entry]) => {
  const found = Math.round(entry?.contentRect.width ?? 0);
  if (found === width || found === 0) return;
  width = found;
  draw();
}).observe(drawing);
for (const radio of document.querySelectorAll('input[name="valley-part"]')) {
  radio.addEventListener('change', () => {
    userChose = true;
    draw();
  });
}

/** @param {State} state */
export function render({ report }) {
  shown = report;
  drawing.closest('section')?.toggleAttribute('hidden', report?.rest === null);
  draw();
}

function draw() {
  if (shown === null) return;
  const { valley } = shown;
  const reaction = shown.reactions[0];
  const near = valley?.near ?? null;
  if (near === null) choose('valley-part', 'whole');
  else if (!userChose) choose('valley-part', isClose(shown) ? 'near' : 'whole');
  if (valley === null || valley === undefined || reaction === undefined || valley.extent_max_mol <= valley.extent_min_mol) {
    choice.hidden = true;
    drawing.replaceChildren();
    words.textContent = 'There is no valley to draw: the reaction has nowhere to go from here.';
    return;
  }
  choice.hidden = near === null;
  heading.textContent = `Valley: ${energyName(valley)}`;
  words.textContent = describe(shown, valley);
  if (width === 0) return;
  const curve = near !== null && chosen('valley-part') === 'near' ? near : valley;
  drawing.replaceChildren(drawValley({
    curve,
    energy: valley.energy,
    now: valley.extent_now_mol,
    rest: hasNoLimit(shown) ? null : reaction.extent_mol,
    within: within(shown, valley),
    walls: walls(valley),
    arrow: ARROWS[reaction.verdict ?? 'cannot tell'],
    title: energyName(valley),
    description: words.textContent,
  }, Math.max(NARROWEST_PX, width)));
}

/**
 * Without a limit there is no state at rest; the report's extent of zero is that of the start.
 * @param {Report} report
 */
const hasNoLimit = ({ rest }) => rest?.outcome === 'has no limit';

/** @param {Valley} valley */
function energyName({ energy }) {
  return `${energy === 'A' ? 'Helmholtz' : 'Gibbs'} energy along the reaction`;
}

/** @param {Report} report */
function isClose({ valley, reactions }) {
  const extent = reactions[0]?.extent_mol ?? 0;
  return valley !== null && Math.abs(extent) < CLOSE * (valley.extent_max_mol - valley.extent_min_mol);
}

/** @param {string} text */
const capital = (text) => text.charAt(0).toUpperCase() + text.slice(1);

/** @param {string[]} species */
const listed = (species) => species.map(speciesName).join(' and ');

/**
 * Where rest could lie within the tolerances: the interval of the missing conversion, as extents between the walls.
 * @param {Report} report
 * @param {Valley} valley
 * @returns {[number, number] | null}
 */
function within({ reactions }, { extent_min_mol: least, extent_max_mol: most }) {
  const interval = reactions[0]?.missing_conversion_interval ?? null;
  if (interval === null) return null;
  const [low, high] = interval.map((share) => (share === null ? null : share * (most - least)));
  return [Math.max(least, low ?? least), Math.min(most, high ?? most)];
}

/** @param {Valley} valley */
function walls(valley) {
  return valley.limits.map(({ side, species }) => ({
    at: side === 'min' ? valley.extent_min_mol : valley.extent_max_mol,
    label: `no ${listed(species)} left`,
  }));
}

/**
 * @param {Report} report
 * @param {Valley} valley
 */
function describe(report, valley) {
  const extent = report.reactions[0]?.extent_mol ?? null;
  /** @param {number} value */
  const mol = (value) => {
    const { factor, unit } = amountUnit(value);
    return `${significant(value * factor, 3)}${NO_BREAK}${unit}`;
  };
  const basis = `on the basis of ${report.basis}`;
  const course = extent === null ? '' : hasNoLimit(report) ? 'There is no state at rest within what is known. ' : extent === 0 ? 'Now stands at rest. '
    : `From now to rest the reaction runs ${mol(Math.abs(extent))} ${extent > 0 ? 'forward' : 'in reverse'}, ${basis}. `;
  const range = extent === null || hasNoLimit(report) ? null : within(report, valley);
  const tolerance = range === null || range[1] <= range[0] ? '' : `Within the tolerances rest lies between ${mol(range[0])} and ${mol(range[1])}, the strip on the floor. `;
  const limits = valley.limits.map(({ side, species }) => {
    const [room, way] = side === 'min' ? [-valley.extent_min_mol, 'in reverse'] : [valley.extent_max_mol, 'forward'];
    return room > 0 ? `${listed(species)} would run out at ${mol(room)} ${way}` : `without ${listed(species)} it cannot move ${way}`;
  });
  return `${course}${tolerance}${limits.length > 0 ? `${capital(limits.join('; '))}.` : ''}`.trim();
}
