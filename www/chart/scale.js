/** A scale with a band on it, the interval of a figure, and the figure itself as a mark. */

import { createSvg } from '../dom.js';
import { fixed } from '../format.js';
import { linear, ticks } from './axes.js';

const HEIGHT = 96;
const MARGIN = { left: 16, right: 16 };
const LINE = 52;
const LABEL_ROOM = 130;

/**
 * @typedef {object} ScaleScene
 * @property {number} value                          the figure; zero is rest
 * @property {[number | null, number | null]} ends   its 95 % interval; an end that is null is open
 * @property {number | null} band                    the half-width around zero that counts as rest
 * @property {string} unit
 * @property {{ value: string, zero: string }} labels
 * @property {string} title
 * @property {string} description
 */

/**
 * @param {ScaleScene} scene
 * @param {number} width   pixels
 */
export function drawScale(scene, width) {
  const { value, ends, band } = scene;
  const reach = 1.15 * Math.max(band ?? 0, Math.abs(value), ...ends.map((end) => Math.abs(end ?? value)), 1e-12);
  const x = linear([-reach, reach], [MARGIN.left, width - MARGIN.right]);
  const along = ticks(-reach, reach, width < 420 ? 4 : 8);
  const [low, high] = [ends[0] === null ? -reach : ends[0], ends[1] === null ? reach : ends[1]];
  // The figure's label stands on the side away from rest, unless the border is too near.
  const left = value < 0 ? x(value) > LABEL_ROOM : x(value) > width - LABEL_ROOM;
  return createSvg('svg', { class: 'scale-svg', viewBox: `0 0 ${width} ${HEIGHT}`, role: 'img', 'aria-labelledby': 'scale-svg-title scale-svg-text' },
    createSvg('title', { id: 'scale-svg-title' }, scene.title),
    createSvg('desc', { id: 'scale-svg-text' }, scene.description),
    ...(band === null ? [] : [createSvg('rect', { class: 'band', x: x(-band), width: Math.max(1, x(band) - x(-band)), y: LINE - 22, height: 44 })]),
    createSvg('line', { class: 'axis', x1: MARGIN.left, x2: width - MARGIN.right, y1: LINE, y2: LINE }),
    ...along.values.flatMap((tick) => [
      createSvg('line', { class: 'axis', x1: x(tick), x2: x(tick), y1: LINE, y2: LINE + 5 }),
      createSvg('text', { class: 'tick', x: x(tick), y: LINE + 38, 'text-anchor': 'middle' }, `${fixed(tick, along.decimals)}${tick === along.values.at(-1) ? ` ${scene.unit}` : ''}`),
    ]),
    createSvg('line', { class: 'zero', x1: x(0), x2: x(0), y1: LINE - 30, y2: LINE + 22 }),
    createSvg('text', { class: 'flag rest', x: x(0), y: 12, 'text-anchor': value < 0 ? 'start' : 'end' }, scene.labels.zero),
    createSvg('line', { class: 'interval', x1: x(low), x2: x(high), y1: LINE, y2: LINE }),
    ...[[ends[0], low, -1], [ends[1], high, 1]].map(([end, at, side]) => drawEnd(x(Number(at)), end === null, Number(side))),
    createSvg('circle', { class: 'now-mark', cx: x(value), cy: LINE, r: 6 }),
    createSvg('text', { class: 'flag now', x: x(value), y: LINE - 16, 'text-anchor': left ? 'end' : 'start' }, scene.labels.value),
  );
}

/**
 * A closed end is a stroke across, an open one an arrowhead.
 * @param {number} at
 * @param {boolean} open
 * @param {number} side
 */
function drawEnd(at, open, side) {
  return open
    ? createSvg('path', { class: 'open-end', d: `M${at - 8 * side} ${LINE - 7}L${at} ${LINE}L${at - 8 * side} ${LINE + 7}` })
    : createSvg('line', { class: 'interval', x1: at, x2: at, y1: LINE - 8, y2: LINE + 8 });
}
