/** What stands around the lines of a chart: axes with round ticks, and shades where the data end. */

import { createSvg } from '../dom.js';
import { fixed } from '../format.js';
import { ticks } from './axes.js';

/** @import { PlotScene } from './plot.js' */

export const HEIGHT = 290;
export const MARGIN = { left: 52, right: 16, top: 16, bottom: 46 };
const TOP_AXIS = 26;

/**
 * @typedef {object} Frame
 * @property {number} from   the ends of x and y
 * @property {number} to
 * @property {number} low
 * @property {number} high
 * @property {(value: number) => number} x
 * @property {(value: number) => number} y
 * @property {number} ceiling   pixels
 * @property {number} floor
 * @property {number} width
 */

/**
 * Where the drawing's upper edge lies: lower where a second axis stands above it.
 * @param {PlotScene} scene
 */
export const ceilingOf = ({ above }) => (above === undefined ? MARGIN.top : MARGIN.top + TOP_AXIS);

/**
 * @param {PlotScene} scene
 * @param {Frame} frame
 */
export function outside({ data }, { from, to, x, ceiling, floor }) {
  if (data === null) return [];
  const [low, high] = [Math.min(...data), Math.max(...data)];
  /** @type {[number, number][]} */
  const shades = [[from, Math.min(low, to)], [Math.max(high, from), to]];
  return shades.filter(([start, end]) => end > start).map(([start, end]) => createSvg('rect', {
    class: 'outside', x: x(start), width: x(end) - x(start), y: ceiling, height: floor - ceiling,
  }));
}

/**
 * @param {PlotScene} scene
 * @param {Frame} frame
 */
export function axes({ labels, above }, { from, to, low, high, x, y, ceiling, floor, width }) {
  const along = ticks(from, to, width < 420 ? 4 : 7);
  const up = ticks(low, high, 5);
  return [
    createSvg('line', { class: 'axis', x1: MARGIN.left, x2: width - MARGIN.right, y1: floor, y2: floor }),
    createSvg('line', { class: 'axis', x1: MARGIN.left, x2: MARGIN.left, y1: ceiling, y2: floor }),
    ...along.values.map((value) => createSvg('text', { class: 'tick', x: x(value), y: floor + 18, 'text-anchor': 'middle' }, fixed(value, along.decimals))),
    createSvg('text', { class: 'tick', x: width - MARGIN.right, y: floor + 38, 'text-anchor': 'end' }, `${labels.x} →`),
    ...up.values.flatMap((value) => [
      createSvg('line', { class: 'grid', x1: MARGIN.left, x2: width - MARGIN.right, y1: y(value), y2: y(value) }),
      createSvg('text', { class: 'tick', x: MARGIN.left - 6, y: y(value) + 4, 'text-anchor': 'end' }, fixed(value, up.decimals)),
    ]),
    createSvg('text', { class: 'tick', x: 0, y: floor + 38 }, `${labels.y} ↑`),
    ...(above === undefined ? [] : secondAxis(above, x, ceiling, width)),
  ];
}

/**
 * The same places in another quantity, above the drawing.
 * @param {NonNullable<PlotScene['above']>} above
 * @param {(value: number) => number} x
 * @param {number} ceiling
 * @param {number} width
 */
function secondAxis({ ticks: places, label }, x, ceiling, width) {
  /** Ticks crowd where the other quantity is stretched: one that has no room is left out. */
  let free = MARGIN.left - 4;
  const roomy = [...places].sort((a, b) => a.x - b.x).filter((place) => {
    const half = 4 * place.text.length;
    if (x(place.x) - half < free || x(place.x) + half > width) return false;
    free = x(place.x) + half + 6;
    return true;
  });
  return [
    createSvg('line', { class: 'axis', x1: MARGIN.left, x2: width - MARGIN.right, y1: ceiling, y2: ceiling }),
    createSvg('text', { class: 'tick', x: 0, y: ceiling - 8 }, label),
    ...roomy.flatMap((place) => [
      createSvg('line', { class: 'axis', x1: x(place.x), x2: x(place.x), y1: ceiling - 5, y2: ceiling }),
      createSvg('text', { class: 'tick', x: x(place.x), y: ceiling - 9, 'text-anchor': 'middle' }, place.text),
    ]),
  ];
}
