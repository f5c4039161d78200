/** Lines against two axes, with marks, and with what lies outside the data shaded. */

import { createSvg } from '../dom.js';
import { linear } from './axes.js';
import { HEIGHT, MARGIN, axes, ceilingOf, outside } from './frame.js';
import { path, spread } from './lines.js';

/** @import { Frame } from './frame.js' */

/** Told apart by their strokes as well as by their labels. */
const DASHES = ['', '7 4', '2 3', '10 3 2 3', '1 5', '12 5'];
/** Of the part of a line that lies outside the data. */
const BEYOND = '3 5';
const LABEL_HEIGHT = 14;
const LABEL_WIDTH = 84;

/**
 * @typedef {object} PlotLine
 * @property {string} name
 * @property {string} [head]           in a table, where that is another than the name
 * @property {(number | null)[]} y     one for each x; null where there is none
 * @property {boolean} [thin]
 * @property {boolean} [broken]        dashed where it lies outside the data
 */
/**
 * @typedef {object} PlotScene
 * @property {number[]} x
 * @property {PlotLine[]} lines
 * @property {{ x: string, y: string }} labels
 * @property {{ ticks: { x: number, text: string }[], label: string }} [above]   a second axis, above
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
  const frame = frameOf(scene, width);
  const { from, to, x, ceiling, floor } = frame;
  const cursor = createSvg('line', { class: 'cursor', x1: -10, x2: -10, y1: ceiling, y2: floor });
  const svg = createSvg('svg', { class: 'plot-svg', viewBox: `0 0 ${width} ${HEIGHT}`, role: 'img', 'aria-labelledby': `${scene.words.id}-title ${scene.words.id}-text` },
    createSvg('title', { id: `${scene.words.id}-title` }, scene.words.title),
    createSvg('desc', { id: `${scene.words.id}-text` }, scene.words.description),
    ...outside(scene, frame),
    ...axes(scene, frame),
    ...drawLines(scene, frame),
    ...drawMarks(scene.marks.filter((mark) => mark.x >= from && mark.x <= to), frame),
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
 * Scales that hold every line and every mark.
 * @param {PlotScene} scene
 * @param {number} width
 * @returns {Frame}
 */
function frameOf(scene, width) {
  const [from, to] = [Math.min(...scene.x), Math.max(...scene.x)];
  const all = [...scene.lines.flatMap(({ y }) => y.filter((value) => value !== null)), ...scene.marks.filter(({ x }) => x >= from && x <= to).map(({ y }) => y)];
  const [least, most] = all.length === 0 ? [0, 1] : [Math.min(...all), Math.max(...all)];
  const room = most > least ? 0.06 * (most - least) : Math.max(1e-9, Math.abs(most) * 0.1);
  const [low, high] = [least - room, most + room];
  const ceiling = ceilingOf(scene);
  const floor = HEIGHT - MARGIN.bottom;
  return {
    from, to, low, high, ceiling, floor, width,
    x: linear([from, to], [MARGIN.left, width - MARGIN.right]),
    y: linear([low, high], [floor, ceiling]),
  };
}

/**
 * @param {PlotScene} scene
 * @param {Frame} frame
 */
function drawLines(scene, { x, y, ceiling, floor, width }) {
  const drawn = scene.lines.map((line) => ({ line, runs: runsOf(scene, line) }));
  const labels = drawn.flatMap(({ line, runs }) => {
    // At its right end, whichever way x runs.
    const ends = runs.flatMap(({ points }) => points).map(([at, value]) => ({ x: x(at), y: y(value) - 6 })).sort((a, b) => b.x - a.x);
    return line.name === '' || ends[0] === undefined ? [] : [{ ...ends[0], name: line.name }];
  });
  const heights = spread(labels.map((label) => label.y), LABEL_HEIGHT, ceiling + LABEL_HEIGHT, floor - 4);
  return [
    ...drawn.flatMap(({ line, runs }, index) => runs.map(({ points, beyond }) => createSvg('path', {
      class: line.thin ? 'line thin' : 'line',
      d: path(points.map(([at, value]) => [x(at), y(value)])),
      'stroke-dasharray': beyond ? BEYOND : DASHES[index % DASHES.length] ?? '',
    }))),
    ...labels.map((label, index) => createSvg('text', { class: 'line-label', x: Math.min(label.x, width - MARGIN.right) - 4, y: heights[index] ?? label.y, 'text-anchor': 'end' }, label.name)),
  ];
}

/**
 * The parts of a line between its gaps; where it is to be broken, also where the data end.
 * @param {PlotScene} scene
 * @param {PlotLine} line
 */
function runsOf({ x, data }, { y, broken }) {
  /** @type {{ points: [number, number][], beyond: boolean }[]} */
  const runs = [];
  let open = false;
  y.forEach((value, index) => {
    if (value === null) {
      open = false;
      return;
    }
    /** @type {[number, number]} */
    const point = [x[index] ?? 0, value];
    const beyond = broken === true && data !== null && (point[0] < Math.min(...data) || point[0] > Math.max(...data));
    const run = open ? runs.at(-1) : undefined;
    if (run?.beyond === beyond) run.points.push(point);
    else {
      // The parts meet, so that the line has no hole where the data end.
      const last = run?.points.at(-1);
      runs.push({ points: last === undefined ? [point] : [last, point], beyond });
    }
    open = true;
  });
  return runs.filter(({ points }) => points.length > 1);
}

/**
 * Marks with their labels: to the right of them, but to the left where another mark or the border is near, and
 * above one another where they share a place.
 * @param {PlotScene['marks']} marks
 * @param {Frame} frame
 */
function drawMarks(marks, { x, y, ceiling, floor, width }) {
  const labelled = marks.filter(({ label }) => label !== '');
  const heights = spread(labelled.map((mark) => y(mark.y) + 4), LABEL_HEIGHT, ceiling + LABEL_HEIGHT, floor - 4);
  const share = labelled.some((one) => labelled.some((other) => other !== one && Math.abs(x(one.x) - x(other.x)) < LABEL_HEIGHT));
  return [
    ...marks.map((mark) => shape(mark.kind, x(mark.x), y(mark.y))),
    ...labelled.map((mark, index) => {
      const at = x(mark.x);
      const crowded = labelled.some((other) => other !== mark && x(other.x) - at >= LABEL_HEIGHT && x(other.x) - at < LABEL_WIDTH);
      const left = crowded || at > width - LABEL_WIDTH;
      return createSvg('text', { class: `flag ${mark.kind}`, x: at + (left ? -10 : 10), y: share ? heights[index] ?? 0 : y(mark.y) + 4, 'text-anchor': left ? 'end' : 'start' }, mark.label);
    }),
  ];
}

/**
 * @param {'now' | 'rest' | 'point'} kind
 * @param {number} x
 * @param {number} y
 */
function shape(kind, x, y) {
  if (kind === 'rest') return createSvg('path', { class: 'rest-mark', d: `M${x} ${y - 7}L${x + 7} ${y}L${x} ${y + 7}L${x - 7} ${y}Z` });
  return createSvg('circle', { class: kind === 'now' ? 'now-mark' : 'point-mark', cx: x, cy: y, r: kind === 'now' ? 6 : 3.5 });
}
