/** The list of cases kept on this device: keep, open, rename, delete, and take a deletion back. */

import { byId, copyTemplate, create, part } from '../dom.js';
import * as kept from '../kept.js';
import { caseToText } from '../state.js';

/** @import { Case } from '../shiftgauge.js' */
/** @import { Kept, Outcome } from '../kept.js' */
/** @import { State } from '../state.js' */

const list = byId('kept-list', HTMLElement);
const said = byId('kept-said', HTMLElement);
const name = byId('keep-name', HTMLInputElement);
const button = byId('keep-case', HTMLButtonElement);

/** @type {Record<Outcome, string>} */
const REASONS = {
  kept: '',
  full: 'There is no room left in this browser for another case, so nothing was kept: delete one here, or save this one to a file.',
  blocked: 'This browser lets the page keep nothing (its storage is blocked): save the case to a file instead.',
};

/**
 * @typedef {object} Actions
 * @property {() => Case} current
 * @property {(text: string, said: string) => void} openText
 */

/** @param {Actions} actions */
export function connect(actions) {
  button.addEventListener('click', () => keepCurrent(actions));
  name.addEventListener('keydown', ({ key }) => {
    if (key === 'Enter') keepCurrent(actions);
  });
  show(actions);
  // Another tab may keep or delete a case meanwhile.
  window.addEventListener('storage', ({ key }) => {
    if (key === null || kept.isKept(key)) show(actions);
  });
}

/** @param {State} state */
export function render({ question }) {
  name.placeholder = question.title.trim() || 'Name of this case';
}

/** @param {Actions} actions */
function keepCurrent(actions) {
  const question = actions.current();
  const wanted = name.value.trim() || question.title.trim() || 'Case without a name';
  const before = kept.read(wanted);
  const outcome = kept.write({ name: wanted, text: caseToText(question), saved: Date.now() });
  if (outcome !== 'kept') return say(REASONS[outcome]);
  name.value = '';
  show(actions);
  if (before === null) return say(`Kept as “${wanted}”.`);
  return say(`Kept as “${wanted}”, in the place of the case of that name.`, () => kept.write(before), actions);
}

/**
 * @param {string} message
 * @param {() => void} [undo]
 * @param {Actions} [actions]
 */
function say(message, undo, actions) {
  said.replaceChildren(message);
  if (undo === undefined || actions === undefined) return;
  const back = create('button', { type: 'button', id: 'kept-undo' }, 'Undo');
  back.addEventListener('click', () => {
    undo();
    show(actions);
    say('Undone.');
    button.focus();
  });
  said.append(' ', back);
}

/** @param {Actions} actions */
function show(actions) {
  const found = kept.list();
  button.disabled = found === null;
  if (found === null) say(REASONS.blocked);
  list.replaceChildren(...(found ?? []).map((one) => row(one, actions)));
}

/**
 * @param {Kept} one
 * @param {Actions} actions
 */
function row(one, actions) {
  const root = copyTemplate('kept-row-template');
  const open = part(root, 'open', HTMLButtonElement);
  const field = part(root, 'name', HTMLInputElement);
  const rename = part(root, 'rename', HTMLButtonElement);
  const remove = part(root, 'delete', HTMLButtonElement);
  open.append(one.name, ' ', create('small', {}, when(one.saved)));
  open.addEventListener('click', () => actions.openText(one.text, `Opened “${one.name}”.`));
  rename.setAttribute('aria-label', `Rename ${one.name}`);
  remove.setAttribute('aria-label', `Delete ${one.name}`);
  rename.addEventListener('click', () => {
    if (field.hidden) {
      [field.hidden, open.hidden, field.value] = [false, true, one.name];
      rename.textContent = 'Done';
      field.select();
    } else {
      take();
    }
  });
  field.addEventListener('keydown', (event) => {
    if (event.key !== 'Enter' && event.key !== 'Escape') return;
    // The key must not go on to the button that gets the focus, nor close the panel.
    event.preventDefault();
    event.stopPropagation();
    if (event.key === 'Enter') return take();
    show(actions);
    return focusRow(one.name);
  });
  remove.addEventListener('click', () => {
    kept.remove(one.name);
    show(actions);
    say(`Deleted “${one.name}”.`, () => kept.write(one), actions);
    byId('kept-undo', HTMLButtonElement).focus();
  });

  function take() {
    const wanted = field.value.trim();
    if (wanted !== '' && wanted !== one.name) {
      if (kept.read(wanted) !== null) return say(`There is a case called “${wanted}” already: nothing was renamed.`);
      const outcome = kept.write({ ...one, name: wanted });
      if (outcome !== 'kept') return say(REASONS[outcome]);
      kept.remove(one.name);
      say(`Renamed to “${wanted}”.`);
    }
    show(actions);
    return focusRow(wanted || one.name);
  }
  root.dataset.name = one.name;
  return root;
}

/** @param {string} wanted */
function focusRow(wanted) {
  for (const one of list.children) {
    if (one instanceof HTMLElement && one.dataset.name === wanted) part(one, 'rename', HTMLButtonElement).focus();
  }
}

/** @param {number} saved */
function when(saved) {
  return saved === 0 ? '' : new Date(saved).toLocaleString('en-GB', { dateStyle: 'medium', timeStyle: 'short' });
}
