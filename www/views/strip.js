/**
 * Keeps the answer at the lower edge of a narrow screen: its sentence shows, its numbers hang below
 * the edge until scrolled to, and a keyboard on the screen does not cover it.
 */

import { byId } from '../dom.js';

const root = document.documentElement;
const answer = byId('answer', HTMLElement);

function measure() {
  const shown = ['out-of-date', 'sentence'].map((id) => byId(id, HTMLElement).getBoundingClientRect().bottom);
  const box = answer.getBoundingClientRect();
  const visible = Math.max(...shown) - box.top + 10;
  root.style.setProperty('--hang', `${Math.max(0, Math.round(box.height - visible))}px`);
  root.style.setProperty('--strip', `${Math.round(visible)}px`);
}

function measureKeyboard() {
  const view = window.visualViewport;
  if (!view) return;
  const covered = view.scale > 1.01 ? 0 : Math.max(0, window.innerHeight - view.height - view.offsetTop);
  root.style.setProperty('--keyboard', `${Math.round(covered)}px`);
}

new ResizeObserver(measure).observe(answer);
window.visualViewport?.addEventListener('resize', measureKeyboard);
window.visualViewport?.addEventListener('scroll', measureKeyboard);

export function render() {
  measure();
}
