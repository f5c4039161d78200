/** Problems at their fields, with a list of all of them at the answer. */

import { byId, create } from '../dom.js';
import { findField } from '../find-field.js';
import { reveal } from '../folds.js';

/** @import { Problem } from '../shiftgauge.js' */
/** @import { State } from '../state.js' */

const form = byId('inputs', HTMLFormElement);
const list = byId('problem-list', HTMLElement);
const banner = byId('out-of-date', HTMLElement);

/** @param {State} state */
export function render({ problems, report, current, trapped }) {
  clear();
  const placed = problems.map((problem, index) => ({ problem, field: place(problem, index) }));
  list.hidden = placed.length === 0;
  list.replaceChildren(...placed.map(({ problem, field }) => create('li', {}, ...inList(problem, field))));
  banner.hidden = current;
  banner.replaceChildren(...(current ? [] : [say(problems.length, report !== null, trapped !== '')]));
  const first = placed.find(({ field }) => field !== null);
  if (!current && first?.field) banner.append(goButton('Show', first.problem, first.field));
}

/**
 * @param {number} count
 * @param {boolean} hasOld
 * @param {boolean} trapped
 * @returns {HTMLElement}
 */
function say(count, hasOld, trapped) {
  const old = hasOld ? ['Out of date', create('span', { class: 'aside' }, ', from before the last change'), '. '] : [];
  const counted = `${count === 1 ? 'One thing' : `${count} things`} to put right.`;
  return create('span', {}, ...old, count > 0 ? counted : trapped ? 'The engine stopped on this case.' : '');
}

function clear() {
  for (const message of document.querySelectorAll('.problem')) message.remove();
  for (const field of document.querySelectorAll('[aria-invalid]')) {
    field.removeAttribute('aria-invalid');
    field.removeAttribute('aria-errormessage');
    const ids = (field.getAttribute('aria-describedby') ?? '').split(' ').filter((id) => id !== '' && !id.startsWith('problem-'));
    if (ids.length > 0) field.setAttribute('aria-describedby', ids.join(' '));
    else field.removeAttribute('aria-describedby');
  }
}

/**
 * Puts the message beside its field.
 * @param {Problem} problem
 * @param {number} index
 * @returns {HTMLElement | null}
 */
function place(problem, index) {
  const field = findField(problem.field);
  if (field === null) return null;
  const id = `problem-${index}`;
  const message = create('p', { class: 'problem', id }, create('strong', {}, lineOf(problem, field) + problem.message), ' ', problem.hint);
  reveal(field.querySelector('summary') ?? field);
  if (isControl(field)) {
    if (problem.span !== null && field instanceof HTMLInputElement) message.append(' ', goButton('Show', problem, field));
    field.setAttribute('aria-invalid', 'true');
    field.setAttribute('aria-describedby', `${field.getAttribute('aria-describedby') ?? ''} ${id}`.trim());
    const row = field.closest('.row, .entry, label') ?? field;
    let after = row;
    while (after.nextElementSibling?.classList.contains('problem')) after = after.nextElementSibling;
    after.after(message);
  } else {
    (field.querySelector(':scope > h2, :scope > legend, :scope > details > summary') ?? field).after(message);
  }
  return field;
}

/**
 * Where a field holds many lines, the line that is meant.
 * @param {Problem} problem
 * @param {HTMLElement} field
 */
function lineOf({ field: path }, field) {
  const line = field instanceof HTMLTextAreaElement ? /\[(\d+)\](?:\[\d+\])?$/.exec(path)?.[1] : undefined;
  return line === undefined ? '' : `Line ${Number(line) + 1}: `;
}

/**
 * @param {Problem} problem
 * @param {HTMLElement | null} field
 * @returns {(Node | string)[]}
 */
function inList(problem, field) {
  if (field === null) return [create('strong', {}, problem.message), ' ', problem.hint, ...takeOutButton(problem)];
  return [goButton(`${nameOf(field)}:`, problem, field), ' ', problem.message];
}

/**
 * What the page has no field for can still be taken out of the case.
 * @param {Problem} problem
 * @returns {Node[]}
 */
function takeOutButton({ field }) {
  if (field === '') return [];
  const button = create('button', { type: 'button', class: 'go', 'aria-label': `Take ${field} out of the case` }, 'Take it out');
  button.addEventListener('click', () => takeOut(field));
  return [document.createTextNode(' '), button];
}

/** @type {(field: string) => void} */
let takeOut = () => {};

/**
 * Asks whoever runs the page to take out of the case what stands at a path.
 * @param {{ takeOut: (field: string) => void }} actions
 */
export function connect(actions) {
  takeOut = actions.takeOut;
}

/** @param {HTMLElement} field */
function nameOf(field) {
  const labels = isControl(field) ? field.labels ?? [] : [];
  const label = [...labels].map((one) => one.textContent?.trim() ?? '').find((text) => text !== '');
  return label ?? field.getAttribute('aria-label') ?? field.querySelector('h2, legend, .name')?.textContent ?? 'Here';
}

/**
 * A button that goes to the field and marks the place in its text.
 * @param {string} label
 * @param {Problem} problem
 * @param {HTMLElement} field
 */
function goButton(label, problem, field) {
  const button = create('button', { type: 'button', class: 'go' }, label);
  button.addEventListener('click', () => {
    reveal(field);
    field.focus();
    field.scrollIntoView({ block: 'nearest' });
    if (field instanceof HTMLInputElement && problem.span !== null) field.setSelectionRange(problem.span.start, problem.span.end);
  });
  return button;
}

/**
 * @param {Element} element
 * @returns {element is HTMLInputElement | HTMLSelectElement | HTMLTextAreaElement}
 */
function isControl(element) {
  return element instanceof HTMLInputElement || element instanceof HTMLSelectElement || element instanceof HTMLTextAreaElement;
}

// Enter in a field must not send the form anywhere.
form.addEventListener('submit', (event) => event.preventDefault());
