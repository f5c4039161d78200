/** Lines against two axes, with marks, and with what lies outside the data shaded. */

import { createSvg } from '../dom.js';
import { fixed } from '../format.js';
import { linear, ticks } from './axes.js';
import { path } from './lines.js';

const HEIGHT = 280;
const MARGIN = { left: 52, right: 16, top: 14, bottom: 46 };
/** Told apart by their strokes as well as by their labels. */
export const DASHES = ['', '7 4', '2 3', '10 3 2 3', '1 5', '12 5'];

/**
 * @typedef {object} PlotLine
 * @property {string} name
 * @property {(number | null)[]} y     one for each x; null where there is none
 * @property {boolean} [thin]
 */
/**
 * @typedef {object} PlotScene
 * @property {number[]} x
 * @property {PlotLine[]} lines
 * @property {{ x: string, y: string }} labels
 * @property {{ x: number, y: number, label: string, kind: 'now' | 'rest' | 'point' }[]} marks
 * @property {[number, number] | null} data   the range of x that the data cover
 * @property {{ title: string, description: string, id: string }} words
 */
/**
 * @typedef {object} Plot
 * @property {SVGSVGElement} svg
 * @property {(at: number) => void} point     moves the cursor to the x of this place
 * @property {(pixel: number) => number} nearest   the place whose x is nearest to a pixel
 */

/**
 * @param {PlotScene} scene
 * @param {number} width   pixels
 * @returns {Plot}
 */
export function drawPlot(scene, width) {
  const [from, to] = [Math.min(...scene.x), Math.max(...scene.x)];
  const all = [...scene.lines.flatMap(({ y }) => y.filter((value) => value !== null)), ...scene.marks.filter(({ x }) => x >= from && x <= to).map(({ y }) => y)];
  const [least, most] = all.length === 0 ? [0, 1] : [Math.min(...all), Math.max(...all)];
  const room = most > least ? 0.06 * (most - least) : Math.max(1e-9, Math.abs(most) * 0.1);
  const floor = HEIGHT - MARGIN.bottom;
  const x = linear([from, to], [MARGIN.left, width - MARGIN.right]);
  const y = linear([least - room, most + room], [floor, MARGIN.top]);
  const cursor = createSvg('line', { class: 'cursor', x1: -10, x2: -10, y1: MARGIN.top, y2: floor });
  const svg = createSvg('svg', { class: 'plot-svg', viewBox: `0 0 ${width} ${HEIGHT}`, role: 'img', 'aria-labelledby': `${scene.words.id}-title ${scene.words.id}-text` },
    createSvg('title', { id: `${scene.words.id}-title` }, scene.words.title),
    createSvg('desc', { id: `${scene.words.id}-text` }, scene.words.description),
    ...outside(scene, { from, to, x, floor }),
    ...axes(scene, { from, to, low: least - room, high: most + room, x, y, floor, width }),
    ...scene.lines.flatMap((line, index) => drawLine(scene, line, index, x, y, width)),
    ...scene.marks.filter((mark) => mark.x >= from && mark.x <= to).flatMap((mark) => drawMark(mark, x(mark.x), y(mark.y), width)),
    cursor,
  );
  return {
    svg,
    point(at) {
      const place = x(scene.x[at] ?? from);
      cursor.setAttribute('x1', String(place));
      cursor.setAttribute('x2', String(place));
    },
    nearest(pixel) {
      let best = 0;
      scene.x.forEach((value, index) => {
        if (Math.abs(x(value) - pixel) < Math.abs(x(scene.x[best] ?? from) - pixel)) best = index;
      });
      return best;
    },
  };
}

/**
 * @param {PlotScene} scene
 * @param {{ from: number, to: number, x: (value: number) => number, floor: number }} frame
 */
function outside({ data }, { from, to, x, floor }) {
  if (data === null) return [];
  const [low, high] = [Math.min(...data), Math.max(...data)];
  const shades = [[from, Math.min(low, to)], [Math.max(high, from), to]];
  return shades.filter(([start, end]) => Number(end) > Number(start)).map(([start, end]) => createSvg('rect', {
    class: 'outside', x: x(Number(start)), width: x(Number(end)) - x(Number(start)), y: MARGIN.top, height: floor - MARGIN.top,
  }));
}

/**
 * @param {PlotScene} scene
 * @param {{ from: number, to: number, low: number, high: number, x: (value: number) => number, y: (value: number) => number, floor: number, width: number }} frame
 */
function axes({ labels }, { from, to, low, high, x, y, floor, width }) {
  const along = ticks(from, to, width < 420 ? 4 : 7);
  const up = ticks(low, high, 5);
  return [
    createSvg('line', { class: 'axis', x1: MARGIN.left, x2: width - MARGIN.right, y1: floor, y2: floor }),
    createSvg('line', { class: 'axis', x1: MARGIN.left, x2: MARGIN.left, y1: MARGIN.top, y2: floor }),
    ...along.values.map((value) => createSvg('text', { class: 'tick', x: x(value), y: floor + 18, 'text-anchor': 'middle' }, fixed(value, along.decimals))),
    createSvg('text', { class: 'tick', x: width - MARGIN.right, y: floor + 38, 'text-anchor': 'end' }, `${labels.x} →`),
    ...up.values.flatMap((value) => [
      createSvg('line', { class: 'grid', x1: MARGIN.left, x2: width - MARGIN.right, y1: y(value), y2: y(value) }),
      createSvg('text', { class: 'tick', x: MARGIN.left - 6, y: y(value) + 4, 'text-anchor': 'end' }, fixed(value, up.decimals)),
    ]),
    createSvg('text', { class: 'tick', x: 0, y: floor + 38 }, `${labels.y} ↑`),
  ];
}

/**
 * @param {PlotScene} scene
 * @param {PlotLine} line
 * @param {number} index
 * @param {(value: number) => number} x
 * @param {(value: number) => number} y
 * @param {number} width
 */
function drawLine(scene, line, index, x, y, width) {
  /** @type {[number, number][][]} */
  const runs = [[]];
  line.y.forEach((value, at) => {
    if (value === null) runs.push([]);
    else runs.at(-1)?.push([x(scene.x[at] ?? 0), y(value)]);
  });
  const drawn = runs.filter((run) => run.length > 1);
  // At its right end, whichever way x runs.
  const ends = [drawn[0]?.[0], drawn.at(-1)?.at(-1)].filter((end) => end !== undefined);
  const last = ends.sort((a, b) => b[0] - a[0])[0];
  const inside = last === undefined ? [] : [createSvg('text', { class: 'line-label', x: Math.min(last[0], width - MARGIN.right) - 4, y: last[1] - 6, 'text-anchor': 'end' }, line.name)];
  return [
    ...drawn.map((run) => createSvg('path', { class: line.thin ? 'line thin' : 'line', d: path(run), 'stroke-dasharray': DASHES[index % DASHES.length] ?? '' })),
    ...(line.name === '' ? [] : inside),
  ];
}

/**
 * @param {PlotScene['marks'][number]} mark
 * @param {number} x
 * @param {number} y
 * @param {number} width
 */
function drawMark({ label, kind }, x, y, width) {
  const anchor = x > width * 0.7 ? 'end' : 'start';
  const shape = kind === 'rest'
    ? createSvg('path', { class: 'rest-mark', d: `M${x} ${y - 7}L${x + 7} ${y}L${x} ${y + 7}L${x - 7} ${y}Z` })
    : createSvg('circle', { class: kind === 'now' ? 'now-mark' : 'point-mark', cx: x, cy: y, r: kind === 'now' ? 6 : 3.5 });
  return label === '' ? [shape] : [shape, createSvg('text', { class: `flag ${kind}`, x: x + (anchor === 'end' ? -10 : 10), y: y + 4, 'text-anchor': anchor }, label)];
}
