/** The chart of ln K against 1/T, which is nearly straight: its slope is −ΔH°/R. */

import { NO_BREAK, fixed, significant, temperature, temperatureIn, temperatureUnit } from './format.js';
import { ticks } from './chart/axes.js';
import { span } from './plot-rest.js';

/** @import { Report, SweepAnswer, SweepRequest } from './shiftgauge.js' */
/** @import { PlotScene } from './chart/plot.js' */
/** @import { Told } from './plot-figure.js' */
/** @import { TemperatureUnit } from './format.js' */
/** @import { Answered } from './state.js' */

const POINTS = 121;

/**
 * @param {Report} report
 * @returns {SweepRequest}
 */
export function constantRequest(report) {
  const { from, to } = reach(report);
  return { x: { knob: 'temperature', from: `${from} K`, to: `${to} K`, count: POINTS }, lines: null, show: { what: 'ln_k' } };
}

/**
 * The temperatures of the chart: those around now, T* where there is one, and the points of a fit.
 * @param {Report} report
 */
function reach(report) {
  const { from, to } = span(report);
  const reaction = report.reactions[0];
  const wanted = [...(reaction?.source.fit?.points ?? []).map((point) => point.temperature_k), ...(reaction?.t_star_k ? [reaction.t_star_k] : [])];
  return { from: Math.min(from, ...wanted.map((kelvin) => kelvin - 5)), to: Math.max(to, ...wanted.map((kelvin) => kelvin + 5)) };
}

/**
 * @param {Answered} answered
 * @param {Extract<SweepAnswer, { ok: true }>} answer
 * @returns {{ scene: PlotScene, told: Told } | null}
 */
export function constantScene({ report, answered }, { sweep: { x, lines, data_range_k: data, u_ln_k: u } }) {
  const reaction = report.reactions[0];
  if (reaction === undefined) return null;
  const unit = temperatureUnit(answered.temperature);
  const { ln_q: level, t_star_k: tStar } = reaction;
  const points = reaction.source.fit?.points ?? [];
  const xs = x.values.map((kelvin) => 1000 / kelvin);
  const beyond = data !== null && x.values.some((kelvin) => kelvin < data[0] || kelvin > data[1]);
  return {
    scene: {
      x: xs,
      lines: [
        { name: 'ln K', y: lines[0]?.y ?? [], broken: true },
        ...[-2, 2].filter(() => u.some((one) => one !== null && one > 0)).map((times) => ({
          name: times > 0 ? '95 % band' : '', head: `ln K ${times > 0 ? '+' : '−'} 2u`, thin: true,
          y: xs.map((_, at) => (u[at] === null || u[at] === undefined || lines[0]?.y[at] === null ? null : (lines[0]?.y[at] ?? 0) + times * u[at])),
        })),
        ...(level === null ? [] : [{ name: 'ln Q now', y: xs.map(() => level), thin: true }]),
      ],
      labels: { x: `1000${NO_BREAK}K/T`, y: 'ln K' },
      above: { label: unit, ticks: temperatureTicks(x.values, unit) },
      marks: [
        { x: 1000 / report.temperature_k, y: reaction.ln_k, label: 'K now', kind: 'now' },
        ...(tStar === null || level === null ? [] : [{ x: 1000 / tStar, y: level, label: 'T*', kind: /** @type {const} */ ('rest') }]),
        ...points.map((point) => ({ x: 1000 / point.temperature_k, y: point.ln_k, label: '', kind: /** @type {const} */ ('point') })),
      ],
      data: data === null ? null : [1000 / data[1], 1000 / data[0]],
      words: {
        id: 'chart-k',
        title: 'ln K against 1/T',
        description: [
          'ln K against 1/T: the slope is −ΔH°/R.',
          level === null ? '' : tStar === null ? 'K does not meet Q here.' : `K meets Q at T* = ${temperature(tStar, unit, 1)}.`,
          u.some((one) => one !== null) ? 'The thin lines beside it are its interval of 95 %.' : '',
          points.length === 0 ? '' : 'The small rings are the points that K comes from.',
          beyond ? 'Shaded and dashed: outside the range of the data.' : '',
        ].filter(Boolean).join(' '),
      },
    },
    told: {
      head: 'temperature',
      x: (at) => `${temperature(x.values[at] ?? 0, unit, 0)} (1000${NO_BREAK}K/T = ${fixed(xs[at] ?? 0, 3)})`,
      y: (value) => significant(value, 5),
      unit: '',
      plain: [
        { head: `temperature, ${unit}`, value: (at) => temperatureIn(x.values[at] ?? 0, unit) },
        { head: '1000 K/T', value: (at) => xs[at] ?? 0 },
      ],
    },
  };
}

/**
 * Round temperatures, at the places that they have on the axis of 1/T.
 * @param {number[]} kelvins
 * @param {TemperatureUnit} unit
 */
function temperatureTicks(kelvins, unit) {
  const ends = [Math.min(...kelvins), Math.max(...kelvins)].map((kelvin) => temperatureIn(kelvin, unit));
  const { values, decimals } = ticks(ends[0] ?? 0, ends[1] ?? 0, 7);
  const perKelvin = unit === '°F' ? 1.8 : 1;
  return values.map((value) => ({ x: 1000 / ((value - temperatureIn(0, unit)) / perKelvin), text: fixed(value, decimals) }));
}
