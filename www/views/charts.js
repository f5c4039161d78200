/** Rest over temperature or pressure, and ln K against 1/T; worked out once the answer stands. */

import { sweep } from '../engine.js';
import { byId, create } from '../dom.js';
import { numbersOfRest } from '../numbers-of-rest.js';
import { constantRequest, constantScene } from '../plot-constant.js';
import { plotFigure } from '../plot-figure.js';
import { pressureMatters, restRequest, restScene, usualLines } from '../plot-rest.js';

/** @import { Problem, SweepAnswer, Wanted } from '../shiftgauge.js' */
/** @import { Along } from '../plot-rest.js' */
/** @import { Answered, State } from '../state.js' */

const section = byId('charts', HTMLElement);
const show = byId('chart-show', HTMLSelectElement);
const along = byId('chart-along', HTMLSelectElement);
const lines = byId('chart-lines', HTMLInputElement);
const problem = byId('chart-problem', HTMLElement);
const rest = plotFigure(byId('chart-rest', HTMLElement));
const constant = plotFigure(byId('chart-k', HTMLElement));
const idle = window.requestIdleCallback?.bind(window) ?? ((/** @type {() => void} */ run) => window.setTimeout(run, 30));

/** @type {Answered | null} */
let shown = null;
let turn = 0;
/** Whether the lines are those that the user named; another reaction or axis takes the usual ones again. */
let named = false;
const fold = /** @type {HTMLDetailsElement} */ (section.querySelector('details'));
fold.addEventListener('toggle', later);

show.addEventListener('change', later);
along.addEventListener('change', () => {
  named = false;
  offerLines();
  later();
});
lines.addEventListener('input', () => {
  named = true;
  later();
});

/** @param {State} state */
export function render({ report, answered, current }) {
  section.hidden = report === null || report.rest === null || report.rest.outcome === 'has no limit';
  if (section.hidden || report === null || answered === null || !current) return;
  if (shown?.report === report) return;
  if (shown?.report.reactions[0]?.equation !== report.reactions[0]?.equation) named = false;
  shown = { report, answered };
  offer(shown);
  offerLines();
  later();
}

/** @param {Answered} answered */
function offer({ report }) {
  const before = show.value;
  const options = numbersOfRest(report);
  show.replaceChildren(...options.map(({ value, text }) => create('option', { value }, text)));
  if (options.some(({ value }) => value === before)) show.value = before;
  for (const option of along.options) if (option.value === 'pressure') option.disabled = !pressureMatters(report);
  if (!pressureMatters(report)) along.value = 'temperature';
}

function offerLines() {
  if (shown === null) return;
  const usual = usualLines(shown, way());
  byId('chart-lines-row', HTMLElement).hidden = usual.length === 0;
  byId('chart-lines-name', HTMLElement).textContent = way() === 'pressure' ? 'a line for each temperature' : 'a line for each pressure';
  if (!named) lines.value = usual.join('; ');
}

const way = () => /** @type {Along} */ (along.value);

function later() {
  turn += 1;
  const mine = turn;
  idle(() => {
    if (mine === turn && fold.open) draw();
  });
}

function draw() {
  if (shown === null) return;
  drawRest(shown);
  const answer = sweep(shown.answered, constantRequest(shown.report));
  if (!answer.ok) return constant.clear(sayAll(answer.problems));
  const found = constantScene(shown, answer);
  if (found !== null) constant.show(found.scene, found.told, nearestToNow(answer));
}

/** @param {Answered} answered */
function drawRest(answered) {
  byId('chart-rest', HTMLElement).hidden = show.value === '';
  if (show.value === '') return;
  const [what = '', ...name] = show.value.split(' ');
  const settings = usualLines(answered, way()).length === 0 ? [] : lines.value.split(';').map((text) => text.trim()).filter((text) => text !== '');
  const answer = sweep(answered.answered, restRequest(answered, /** @type {Wanted} */ ({ what, species: name.join(' ') }), way(), settings));
  const wrong = answer.ok ? [] : answer.problems.filter(({ field }) => field.startsWith('lines'));
  problem.hidden = wrong.length === 0;
  problem.textContent = sayAll(wrong.slice(0, 1));
  if (wrong.length > 0) lines.setAttribute('aria-invalid', 'true');
  else lines.removeAttribute('aria-invalid');
  if (!answer.ok) return rest.clear(wrong.length > 0 ? '' : sayAll(answer.problems));
  const { scene, told } = restScene(answered, answer);
  rest.show(scene, told, nearestToNow(answer));
}

/** @param {Extract<SweepAnswer, { ok: true }>} answer */
function nearestToNow({ sweep: { x, now } }) {
  const distances = x.values.map((value) => Math.abs(value - (now.x ?? 0)));
  return distances.indexOf(Math.min(...distances));
}

/** @param {Problem[]} problems */
const sayAll = (problems) => problems.map(({ message, hint }) => `${message} ${hint}`).join(' ');
