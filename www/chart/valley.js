/**
 * The valley: G along the reaction, to scale. The walls stand where something runs out, the floor
 * is rest (a diamond), the dot is now.
 */

import { createSvg } from '../dom.js';
import { amountUnit, fixed } from '../format.js';
import { linear, ticks } from './axes.js';
import { heightAt, path } from './lines.js';

/** @import { Curve } from '../shiftgauge.js' */

const HEIGHT = 300;
const MARGIN = { left: 46, right: 14, top: 30, bottom: 44 };
const FLAG_NOW = 76;
const FLAG_REST = 44;
/** A flag's text needs about this many pixels beside its pole. */
const FLAG_ROOM = 64;

/**
 * @typedef {object} Scene
 * @property {Curve} curve
 * @property {'G' | 'A'} energy       Gibbs energy, or Helmholtz energy at constant volume
 * @property {number} now             extent, mol
 * @property {number | null} rest     extent, mol
 * @property {[number, number] | null} within   where rest could lie within the tolerances, mol
 * @property {{ at: number, label: string }[]} walls
 * @property {string} arrow           the direction's arrow
 * @property {string} title
 * @property {string} description
 */

/**
 * @param {Scene} scene
 * @param {number} width   pixels
 * @returns {SVGSVGElement}
 */
export function drawValley(scene, width) {
  const { extent_mol: xs, gibbs_over_rt: ys } = scene.curve;
  const [from, to] = [xs[0] ?? 0, xs[xs.length - 1] ?? 0];
  const floor = HEIGHT - MARGIN.bottom;
  const highest = Math.max(...ys, Number.MIN_VALUE);
  const x = linear([from, to], [MARGIN.left, width - MARGIN.right]);
  const y = linear([0, highest], [floor, MARGIN.top]);
  const points = xs.map((value, index) => /** @type {[number, number]} */ ([x(value), y(ys[index] ?? 0)]));
  const now = { x: x(scene.now), y: y(heightAt(xs, ys, scene.now)) };
  const line = path(points);
  return createSvg('svg', { class: 'valley-svg', viewBox: `0 0 ${width} ${HEIGHT}`, role: 'img', 'aria-labelledby': 'valley-svg-title valley-svg-text' },
    createSvg('title', { id: 'valley-svg-title' }, scene.title),
    createSvg('desc', { id: 'valley-svg-text' }, scene.description),
    createSvg('path', { class: 'ground', d: `${line}L${x(to)} ${floor}L${x(from)} ${floor}Z` }),
    ...axis(x, y, { from, to, highest, floor, width, energy: scene.energy }),
    ...scene.walls.filter(({ at }) => at >= from && at <= to).flatMap((wall) => drawWall(x(wall.at), wall.label, floor, width)),
    ...drawWithin(scene.within, [from, to], x, floor),
    createSvg('path', { class: 'curve', d: line }),
    ...(scene.rest === null ? [] : drawRest(x(scene.rest), y(heightAt(xs, ys, scene.rest)), now.x, width)),
    ...drawNow(now, scene.rest === null ? now.x : x(scene.rest), scene.arrow, width),
  );
}

/**
 * @param {(value: number) => number} x
 * @param {(value: number) => number} y
 * @param {{ from: number, to: number, highest: number, floor: number, width: number, energy: string }} frame
 */
function axis(x, y, { from, to, highest, floor, width, energy }) {
  const xUnit = amountUnit(Math.max(-from, to));
  const yUnit = amountUnit(highest);
  const along = ticks(from * xUnit.factor, to * xUnit.factor, width < 420 ? 4 : 6);
  const up = ticks(0, highest * yUnit.factor, 4);
  return [
    createSvg('line', { class: 'axis', x1: MARGIN.left, x2: width - MARGIN.right, y1: floor, y2: floor }),
    ...along.values.map((value) => createSvg('text', { class: 'tick', x: x(value / xUnit.factor), y: floor + 18, 'text-anchor': 'middle' }, fixed(value, along.decimals))),
    createSvg('text', { class: 'tick', x: width - MARGIN.right, y: floor + 37, 'text-anchor': 'end' }, `${width < 340 ? 'ξ' : 'extent ξ'} from now, ${xUnit.unit} →`),
    ...up.values.flatMap((value) => [
      createSvg('line', { class: 'grid', x1: MARGIN.left, x2: width - MARGIN.right, y1: y(value / yUnit.factor), y2: y(value / yUnit.factor) }),
      createSvg('text', { class: 'tick', x: MARGIN.left - 6, y: y(value / yUnit.factor) + 4, 'text-anchor': 'end' }, fixed(value, up.decimals)),
    ]),
    createSvg('text', { class: 'tick', x: 0, y: floor + 37 }, `${energy}/RT above rest, ${yUnit.unit} ↑`),
  ];
}

/**
 * @param {number} at
 * @param {string} label
 * @param {number} floor
 * @param {number} width
 */
function drawWall(at, label, floor, width) {
  const left = at < width / 2;
  return [
    createSvg('line', { class: 'wall', x1: at, x2: at, y1: MARGIN.top - 8, y2: floor }),
    createSvg('text', { class: 'wall-label', x: at, y: 14, 'text-anchor': left ? 'start' : 'end' }, label),
  ];
}

/**
 * A strip on the floor with a stroke at each end that is in sight.
 * @param {[number, number] | null} within
 * @param {[number, number]} ends
 * @param {(value: number) => number} x
 * @param {number} floor
 */
function drawWithin(within, [from, to], x, floor) {
  if (within === null || within[1] <= from || within[0] >= to) return [];
  const [start, end] = [x(Math.max(from, within[0])), x(Math.min(to, within[1]))];
  return [
    createSvg('rect', { class: 'within', x: start, width: Math.max(1, end - start), y: floor - 5, height: 10 }),
    ...within.filter((at) => at >= from && at <= to).map((at) => createSvg('line', { class: 'within-end', x1: x(at), x2: x(at), y1: floor - 8, y2: floor + 8 })),
  ];
}

/**
 * @param {number} at
 * @param {number} height
 * @param {number} other    where the other flag stands
 * @param {number} width
 */
function drawRest(at, height, other, width) {
  const side = flagSide(at, at >= other, width);
  return [
    createSvg('line', { class: 'pole rest', x1: at, x2: at, y1: height, y2: height - FLAG_REST }),
    createSvg('text', { class: 'flag rest', x: at + side.shift, y: height - FLAG_REST + 10, 'text-anchor': side.anchor }, 'rest'),
    createSvg('path', { class: 'rest-mark', d: `M${at} ${height - 7}L${at + 7} ${height}L${at} ${height + 7}L${at - 7} ${height}Z` }),
  ];
}

/**
 * @param {{ x: number, y: number }} now
 * @param {number} other
 * @param {string} arrow
 * @param {number} width
 */
function drawNow(now, other, arrow, width) {
  const side = flagSide(now.x, other >= now.x, width);
  const top = Math.max(MARGIN.top + 12, now.y - FLAG_NOW);
  return [
    createSvg('line', { class: 'pole now', x1: now.x, x2: now.x, y1: now.y, y2: top }),
    createSvg('text', { class: 'flag now', x: now.x + side.shift, y: top + 10, 'text-anchor': side.anchor }, arrow === '←' ? '← now' : `now ${arrow}`),
    createSvg('circle', { class: 'now-mark', cx: now.x, cy: now.y, r: 6 }),
  ];
}

/**
 * The side of its pole on which a flag's text fits: the wanted one, unless the border is too near.
 * @param {number} at
 * @param {boolean} wantsRight
 * @param {number} width
 */
function flagSide(at, wantsRight, width) {
  const right = wantsRight ? at + FLAG_ROOM < width : at - FLAG_ROOM < MARGIN.left;
  return right ? { shift: 7, anchor: 'start' } : { shift: -7, anchor: 'end' };
}
