/** Rest over temperature or pressure, and ln K against 1/T; worked out once the answer stands. */

import { sweep } from '../engine.js';
import { byId, create } from '../dom.js';
import { NO_BREAK, fixed, significant, speciesName, temperature, temperatureUnit } from '../format.js';
import { numbersOfRest } from '../numbers-of-rest.js';
import { plotFigure } from '../plot-figure.js';

/** @import { Case, Report, SweepRequest, Wanted } from '../shiftgauge.js' */
/** @import { State } from '../state.js' */
/** @import { TemperatureUnit } from '../format.js' */

const POINTS = 121;
/** How far a chart goes to both sides of now. */
const SPAN_K = 150;
const section = byId('charts', HTMLElement);
const show = byId('chart-show', HTMLSelectElement);
const along = byId('chart-along', HTMLSelectElement);
const rest = plotFigure(byId('chart-rest', HTMLElement));
const constant = plotFigure(byId('chart-k', HTMLElement));
const idle = window.requestIdleCallback?.bind(window) ?? ((/** @type {() => void} */ run) => window.setTimeout(run, 30));

/** @type {{ report: Report, answered: Case } | null} */
let shown = null;
let turn = 0;
const fold = /** @type {HTMLDetailsElement} */ (section.querySelector('details'));
fold.addEventListener('toggle', later);

for (const control of [show, along]) control.addEventListener('change', later);

/** @param {State} state */
export function render({ report, answered, current }) {
  section.hidden = report === null || report.rest === null || report.rest.outcome === 'has no limit';
  if (section.hidden || report === null || answered === null || !current) return;
  if (shown?.report === report) return;
  shown = { report, answered };
  offer(report);
  later();
}

/** What can be shown: the conversion of each reactant that is there, the fraction of each gas or liquid. */
function offer(/** @type {Report} */ report) {
  const before = show.value;
  const options = numbersOfRest(report);
  show.replaceChildren(...options.map(({ value, text }) => create('option', { value }, text)));
  if (options.some(({ value }) => value === before)) show.value = before;
}

function later() {
  turn += 1;
  const mine = turn;
  idle(() => {
    if (mine === turn && fold.open) draw();
  });
}

function draw() {
  if (shown === null) return;
  const { report, answered } = shown;
  const unit = temperatureUnit(answered.temperature);
  const [what = 'conversion', ...name] = show.value.split(' ');
  byId('chart-rest', HTMLElement).hidden = show.value === '';
  if (show.value !== '') drawRest(report, answered, unit, /** @type {Wanted} */ ({ what, species: name.join(' ') }));
  drawConstant(report, answered, unit);
}

/** @param {number} kelvin */
const inUnit = (kelvin, /** @type {TemperatureUnit} */ unit) => (unit === 'K' ? kelvin : unit === '°F' ? kelvin * 1.8 - 459.67 : kelvin - 273.15);

/** @param {Report} report */
function span({ temperature_k: now, reactions }) {
  const [low, high] = reactions[0]?.source.range_k ?? [now - SPAN_K, now + SPAN_K];
  return { from: Math.max(Math.min(low, now), now - SPAN_K, 50), to: Math.min(Math.max(high, now), now + SPAN_K) };
}

/** @param {Report} report */
function request(report, /** @type {Wanted} */ wanted) {
  const { temperature_k: now, pressure_pa: pressure } = report;
  const hasGas = report.species.some(({ phase, nu }) => phase === 'g' && nu !== 0);
  const several = hasGas && pressure !== null && report.reactions[0]?.delta_nu_gas !== 0;
  if (along.value === 'pressure' && hasGas && pressure !== null) {
    return /** @type {SweepRequest} */ ({
      x: { knob: 'pressure', from: `${pressure / 5} Pa`, to: `${pressure * 4} Pa`, count: POINTS },
      lines: { knob: 'temperature', values: [-25, 0, 25].map((step) => `${now + step} K`) },
      show: wanted,
    });
  }
  const { from, to } = span(report);
  return /** @type {SweepRequest} */ ({
    x: { knob: 'temperature', from: `${from} K`, to: `${to} K`, count: POINTS },
    lines: several ? { knob: 'pressure', values: [0.5, 1, 2].map((factor) => `${pressure * factor} Pa`) } : null,
    show: wanted,
  });
}

/**
 * @param {Report} report
 * @param {Case} answered
 * @param {TemperatureUnit} unit
 * @param {Wanted} wanted
 */
function drawRest(report, answered, unit, wanted) {
  const asked = request(report, wanted);
  const answer = sweep(answered, asked);
  if (!answer.ok) return;
  const { x, lines, data_range_k: data, now } = answer.sweep;
  const byPressure = x.knob === 'pressure';
  /** @param {number} value */
  const place = (value) => (byPressure ? value / 1e5 : inUnit(value, unit));
  const factor = wanted.what === 'amount' ? 1 : 100;
  const title = wanted.what === 'fraction' ? 'Fraction' : wanted.what === 'amount' ? 'Amount' : 'Conversion';
  const end = title !== 'Conversion' ? 'at rest' : report.balance === null ? 'from now to rest' : 'from the feed to rest';
  const yUnit = wanted.what === 'amount' ? 'mol' : '%';
  /** @param {number} si */
  const setting = (si) => (byPressure ? temperature(si, unit, 0) : `${significant(si / 1e5, 3)}${NO_BREAK}bar`);
  const of = speciesName(wanted.species ?? '');
  const xs = x.values.map(place);
  rest.show({
    x: xs,
    lines: lines.map(({ value_si: si, y }) => ({ name: si === null ? '' : setting(si), y: y.map((value) => (value === null ? null : value * factor)) })),
    labels: { x: byPressure ? 'pressure, bar absolute' : `temperature, ${unit}`, y: yUnit },
    marks: now.x !== null && now.y !== null ? [{ x: place(now.x), y: now.y * factor, label: 'rest now', kind: 'rest' }] : [],
    data: byPressure || data === null ? null : [place(data[0]), place(data[1])],
    words: {
      id: 'chart-rest',
      title: `${title} of ${of} ${end}`,
      description: `${title} of ${of} ${end}, ${lines.length > 1 ? `at ${byPressure ? 'three temperatures' : 'three pressures'}` : report.reactions[0]?.delta_nu_gas === 0 ? 'the same at every pressure' : 'the rest as it stands'}.${data !== null && !byPressure && (x.values.some((kelvin) => kelvin < data[0] || kelvin > data[1])) ? ' Shaded: outside the range of the data.' : ''}`,
    },
  }, {
    head: byPressure ? 'pressure' : 'temperature',
    x: (at) => (byPressure ? `${significant(xs[at] ?? 0, 4)}${NO_BREAK}bar` : temperature(x.values[at] ?? 0, unit, 0)),
    y: (value) => `${significant(value, 4)}${NO_BREAK}${yUnit}`,
  }, Math.round(POINTS / 2));
}

/**
 * @param {Report} report
 * @param {Case} answered
 * @param {TemperatureUnit} unit
 */
function drawConstant(report, answered, unit) {
  const { from, to } = span(report);
  const reaction = report.reactions[0];
  const reciprocal = { from: 1 / to, to: 1 / from };
  const answer = sweep(answered, { x: { knob: 'temperature', from: `${from} K`, to: `${to} K`, count: POINTS }, lines: null, show: { what: 'ln_k' } });
  if (!answer.ok || reaction === undefined) return;
  const { x, lines, data_range_k: data } = answer.sweep;
  const xs = x.values.map((kelvin) => 1000 / kelvin);
  const level = reaction.ln_q;
  const points = reaction.source.fit?.points ?? [];
  constant.show({
    x: xs,
    lines: [
      { name: 'ln K', y: lines[0]?.y ?? [] },
      ...(level === null ? [] : [{ name: 'ln Q now', y: xs.map(() => level), thin: true }]),
    ],
    labels: { x: `1000${NO_BREAK}K/T`, y: 'ln K' },
    marks: [
      { x: 1000 / report.temperature_k, y: reaction.ln_k, label: 'K now', kind: 'now' },
      ...(reaction.t_star_k === null || level === null ? [] : [{ x: 1000 / reaction.t_star_k, y: level, label: 'T*', kind: /** @type {const} */ ('rest') }]),
      ...points.map((point) => ({ x: 1000 / point.temperature_k, y: point.ln_k, label: '', kind: /** @type {const} */ ('point') })),
    ],
    data: data === null ? null : [Math.max(1000 / data[1], 1000 * reciprocal.from), Math.min(1000 / data[0], 1000 * reciprocal.to)],
    words: {
      id: 'chart-k',
      title: 'ln K against 1/T',
      description: `ln K against 1/T: the slope is −ΔH°/R. K meets Q at T*${reaction.t_star_k === null ? ', which is not on this chart' : ` = ${temperature(reaction.t_star_k, unit, 1)}`}.`,
    },
  }, {
    head: 'temperature',
    x: (at) => `${temperature(x.values[at] ?? 0, unit, 0)} (1000${NO_BREAK}K/T = ${fixed(xs[at] ?? 0, 3)})`,
    y: (value) => significant(value, 5),
  }, Math.round(POINTS / 2));
}
