/** A small chooser of units beside each quantity; it changes the unit's text and nothing else. */

import { create } from './dom.js';
import { unitOf, withUnit } from './unit-text.js';

/** What the words of a chooser mean, where the word alone does not say. */
/** @type {Record<string, string>} */
const MEANINGS = { missing: 'missing: found from K' };

/**
 * @param {HTMLInputElement} field
 */
export function attach(field) {
  const units = (field.dataset.units ?? '').split('|');
  const chooser = create('select', { class: 'unit', 'aria-label': 'Unit' }, create('option', { value: '' }, 'Unit'));
  for (const unit of units) chooser.append(create('option', { value: unit }, MEANINGS[unit] ?? unit));
  const around = create('span', { class: 'quantity' });
  field.replaceWith(around);
  around.append(field, chooser);
  /** What stands in the field now is what the list opens at. */
  const show = () => { chooser.value = unitOf(field.value, units); };
  for (const kind of ['focus', 'pointerdown']) chooser.addEventListener(kind, show);
  chooser.addEventListener('input', (event) => {
    event.stopPropagation();
    if (chooser.value === '') return;
    field.value = withUnit(field.value, chooser.value, units);
    field.dispatchEvent(new Event('input', { bubbles: true }));
  });
  chooser.addEventListener('change', (event) => event.stopPropagation());
  nameChooser(field);
}

/**
 * Names the chooser of a field after it, for those who hear the page.
 * @param {HTMLInputElement} field
 */
export function nameChooser(field) {
  const label = field.getAttribute('aria-label') ?? field.labels?.[0]?.textContent?.trim() ?? '';
  field.nextElementSibling?.setAttribute('aria-label', `Unit of ${label.replace(/, value$/, '') || 'this row'}`);
}

/** Gives every quantity that the page itself has a chooser; rows get theirs as they come. */
export function attachAll() {
  for (const field of document.querySelectorAll('input[data-units]')) {
    if (field instanceof HTMLInputElement) attach(field);
  }
}
