/** The chart of rest over one setting, for several settings of another: what is asked, what is drawn. */

import { NO_BREAK, significant, speciesName, temperature, temperatureIn, temperatureUnit } from './format.js';

/** @import { Report, SweepAnswer, SweepRequest, Wanted } from './shiftgauge.js' */
/** @import { PlotScene } from './chart/plot.js' */
/** @import { Told } from './plot-figure.js' */
/** @import { Answered } from './state.js' */
/** @typedef {'temperature' | 'pressure'} Along */

const POINTS = 121;
const PASCAL_PER_BAR = 1e5;
/** How far a chart goes to both sides of now. */
const SPAN_K = 150;
const LOWEST_K = 50;
/** The lines drawn until the user names others: factors of the pressure, steps of the temperature. */
const PRESSURE_FACTORS = [0.5, 1, 2];
const TEMPERATURE_STEPS_K = [-25, 0, 25];

/**
 * The temperatures of a chart: around now, as far as the data go.
 * @param {Report} report
 */
export function span({ temperature_k: now, reactions }) {
  const [low, high] = reactions[0]?.source.range_k ?? [now - SPAN_K, now + SPAN_K];
  return { from: Math.max(Math.min(low, now), now - SPAN_K, LOWEST_K), to: Math.min(Math.max(high, now), now + SPAN_K) };
}

/** @param {Report} report */
export function pressureMatters({ species, pressure_pa: pressure }) {
  return pressure !== null && species.some(({ phase, nu }) => phase === 'g' && nu !== 0);
}

/**
 * The settings that the lines stand for until the user names others; none where the lines would all be one.
 * @param {Answered} answered
 * @param {Along} along
 */
export function usualLines({ report, answered }, along) {
  const { pressure_pa: pressure, temperature_k: now, reactions } = report;
  if (!pressureMatters(report) || pressure === null) return [];
  if (along === 'pressure') {
    const unit = temperatureUnit(answered.temperature);
    return TEMPERATURE_STEPS_K.map((step) => temperature(now + step, unit, 0).replaceAll(NO_BREAK, ' ').replace('−', '-').replace(',', ''));
  }
  if (reactions[0]?.delta_nu_gas === 0) return [];
  return PRESSURE_FACTORS.map((factor) => `${Number(((factor * pressure) / PASCAL_PER_BAR).toPrecision(3))} bar`);
}

/**
 * @param {Answered} answered
 * @param {Wanted} show
 * @param {Along} along
 * @param {string[]} lines   settings of the other knob, as text
 * @returns {SweepRequest}
 */
export function restRequest({ report }, show, along, lines) {
  const { pressure_pa: pressure } = report;
  if (along === 'pressure' && pressure !== null) {
    return {
      x: { knob: 'pressure', from: `${pressure / 5} Pa`, to: `${pressure * 4} Pa`, count: POINTS },
      lines: lines.length === 0 ? null : { knob: 'temperature', values: lines },
      show,
    };
  }
  const { from, to } = span(report);
  return {
    x: { knob: 'temperature', from: `${from} K`, to: `${to} K`, count: POINTS },
    lines: lines.length === 0 ? null : { knob: 'pressure', values: lines },
    show,
  };
}

/**
 * @param {Answered} answered
 * @param {Extract<SweepAnswer, { ok: true }>} answer
 * @returns {{ scene: PlotScene, told: Told }}
 */
export function restScene({ report, answered }, { sweep: { x, lines, show, data_range_k: data, now } }) {
  const unit = temperatureUnit(answered.temperature);
  const byPressure = x.knob === 'pressure';
  /** @param {number} value */
  const place = (value) => (byPressure ? value / PASCAL_PER_BAR : temperatureIn(value, unit));
  const { title, factor, yUnit } = figure(show, report);
  const xs = x.values.map(place);
  const measured = measuredNow(report, show);
  const beyond = data !== null && !byPressure && x.values.some((kelvin) => kelvin < data[0] || kelvin > data[1]);
  const labels = { x: byPressure ? 'pressure, bar absolute' : `temperature, ${unit}`, y: yUnit };
  return {
    scene: {
      x: xs,
      lines: lines.map(({ name, y }) => ({ name, y: y.map((value) => (value === null ? null : value * factor)) })),
      labels,
      marks: now.x === null ? [] : [
        ...(now.y === null ? [] : [{ x: place(now.x), y: now.y * factor, label: 'rest', kind: /** @type {const} */ ('rest') }]),
        ...(measured === null ? [] : [{ x: place(now.x), y: measured * factor, label: 'now', kind: /** @type {const} */ ('now') }]),
      ],
      data: byPressure || data === null ? null : [place(data[0]), place(data[1])],
      words: {
        id: 'chart-rest',
        title,
        description: `${title}${forEach(lines.map(({ name }) => name), report)}.${measured === null ? '' : ' The dot is the reading, the diamond where it would rest.'}${beyond ? ' Shaded: outside the range of the data.' : ''}`,
      },
    },
    told: {
      head: byPressure ? 'pressure' : 'temperature',
      x: (at) => (byPressure ? `${significant(xs[at] ?? 0, 4)}${NO_BREAK}bar` : temperature(x.values[at] ?? 0, unit, 0)),
      y: (value) => `${significant(value, 4)}${NO_BREAK}${yUnit}`,
      unit: yUnit,
      plain: [{ head: labels.x, value: (at) => xs[at] ?? 0 }],
    },
  };
}

/**
 * @param {Wanted} show
 * @param {Report} report
 */
function figure({ what, species }, { balance }) {
  const of = speciesName(species ?? '');
  if (what === 'amount') return { title: `Amount of ${of} at rest`, factor: 1, yUnit: 'mol' };
  if (what === 'fraction') return { title: `Fraction of ${of} at rest`, factor: 100, yUnit: '%' };
  return { title: `Conversion of ${of} ${balance === null ? 'from now to rest' : 'from the feed to rest'}`, factor: 100, yUnit: '%' };
}

/**
 * The same number in the reading, where it has one.
 * @param {Report} report
 * @param {Wanted} show
 */
function measuredNow({ species, balance, conversions }, { what, species: name }) {
  const row = species.find((one) => one.species === name);
  if (what === 'fraction') return row?.now_fraction ?? null;
  if (what === 'amount') return row?.now_mol ?? null;
  return balance === null ? null : conversions.find((one) => one.species === name)?.feed_to_now ?? null;
}

/**
 * @param {string[]} names
 * @param {Report} report
 */
function forEach(names, { reactions }) {
  if (names.length > 1) return `, a line each for ${names.slice(0, -1).join(', ')} and ${names.at(-1)}`;
  if (names[0] !== undefined && names[0] !== '') return ` at ${names[0]}`;
  return reactions[0]?.delta_nu_gas === 0 ? ', the same at every pressure' : '';
}
