/** A chart in the page: its drawing, a slider as the cursor, the values under it, and a table behind. */

import { drawPlot } from './chart/plot.js';
import { create, part } from './dom.js';

/** @import { Plot, PlotScene } from './chart/plot.js' */

/**
 * @typedef {object} Told
 * @property {(at: number) => string} x          the value of x at a place, with its unit
 * @property {(value: number) => string} y       a value of y, with its unit
 * @property {string} head                       the heading of x in the table
 * @property {string} unit                       of y; empty where it has none
 * @property {{ head: string, value: (at: number) => number }[]} plain   x in bare numbers, for a spreadsheet
 */

/** Digits of a number that goes to a spreadsheet. */
const PLAIN_DIGITS = 7;

/**
 * Makes a chart of the parts of this figure.
 * @param {HTMLElement} root
 */
export function plotFigure(root) {
  const drawing = part(root, 'drawing', HTMLElement);
  const words = part(root, 'words', HTMLElement);
  const slider = part(root, 'cursor', HTMLInputElement);
  const values = part(root, 'values', HTMLElement);
  const table = part(root, 'table', HTMLElement);
  const copy = part(root, 'copy', HTMLButtonElement);
  /** @type {{ scene: PlotScene, told: Told } | null} */
  let shown = null;
  /** @type {Plot | null} */
  let plot = null;
  let width = 0;
  /** Whether the user has moved the cursor; until then it stands at now. */
  let moved = false;

  function draw() {
    if (shown === null || width === 0) return;
    plot = drawPlot(shown.scene, Math.max(260, width));
    drawing.replaceChildren(plot.svg);
    move();
  }

  function move() {
    if (shown === null) return;
    const { scene, told } = shown;
    const at = Math.min(Number(slider.value), scene.x.length - 1);
    plot?.point(at);
    const each = scene.lines.map(({ name, head = name, y }) => {
      const value = y[at] ?? null;
      return `${head === '' ? '' : `${head}: `}${value === null ? 'none' : told.y(value)}`;
    });
    values.textContent = `${told.x(at)} – ${each.join('; ')}`;
    slider.setAttribute('aria-valuetext', values.textContent);
  }

  /** About twenty places, and the last. */
  function rows() {
    if (shown === null) return [];
    const { scene, told } = shown;
    const step = Math.max(1, Math.round(scene.x.length / 20));
    const places = scene.x.map((_, at) => at).filter((at) => at % step === 0 || at === scene.x.length - 1);
    const head = [told.head, ...scene.lines.map(({ name, head = name }) => head || scene.labels.y)];
    return [head, ...places.map((at) => [told.x(at), ...scene.lines.map(({ y }) => {
      const value = y[at] ?? null;
      return value === null ? '–' : told.y(value);
    })])];
  }

  /** Every place in bare numbers, the units in the heading, as a spreadsheet takes it. */
  function plainRows() {
    if (shown === null) return [];
    const { scene, told } = shown;
    /** @param {number | null | undefined} value */
    const plain = (value) => (value === null || value === undefined ? '' : String(Number(value.toPrecision(PLAIN_DIGITS))));
    const head = [...told.plain.map((column) => column.head), ...scene.lines.map(({ name, head = name }) => [head, told.unit].filter(Boolean).join(', '))];
    return [head, ...scene.x.map((_, at) => [...told.plain.map(({ value }) => plain(value(at))), ...scene.lines.map(({ y }) => plain(y[at]))])];
  }

  new ResizeObserver(([entry]) => {
    const found = Math.round(entry?.contentRect.width ?? 0);
    if (found === width || found === 0) return;
    width = found;
    draw();
  }).observe(drawing);
  slider.addEventListener('input', () => {
    moved = true;
    move();
  });
  for (const kind of /** @type {const} */ (['pointermove', 'pointerdown'])) {
    drawing.addEventListener(kind, (event) => {
      if (plot === null) return;
      const box = plot.svg.getBoundingClientRect();
      moved = true;
      slider.value = String(plot.nearest(((event.clientX - box.left) / box.width) * Math.max(260, width)));
      move();
    });
  }
  copy.addEventListener('click', async () => {
    const text = plainRows().map((row) => row.join('\t')).join('\n').replaceAll('\u00a0', ' ');
    try {
      await navigator.clipboard.writeText(text);
      copy.textContent = 'Copied, for a spreadsheet';
    } catch {
      copy.textContent = 'This browser does not allow copying here';
    }
  });

  return {
    /**
     * Takes the chart away and says why: an old one must not stand in the place of one that is not there.
     * @param {string} why
     */
    clear(why) {
      shown = null;
      plot = null;
      moved = false;
      root.classList.add('is-empty');
      drawing.replaceChildren();
      table.replaceChildren();
      values.textContent = '';
      words.textContent = why;
    },
    /**
     * @param {PlotScene} scene
     * @param {Told} told
     * @param {number} at   the place nearest to now
     */
    show(scene, told, at) {
      shown = { scene, told };
      root.classList.remove('is-empty');
      slider.max = String(scene.x.length - 1);
      if (!moved) slider.value = String(at);
      words.textContent = scene.words.description;
      copy.textContent = 'Copy every point';
      const [head, ...body] = rows();
      table.replaceChildren(
        create('thead', {}, create('tr', {}, ...(head ?? []).map((cell) => create('th', { scope: 'col' }, cell)))),
        create('tbody', {}, ...body.map(([x, ...cells]) => create('tr', {}, create('th', { scope: 'row' }, x ?? ''), ...cells.map((cell) => create('td', {}, cell))))));
      draw();
    },
  };
}
