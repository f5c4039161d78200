/** Cases opened and sent: examples, files, links, and the case before this one. */

import { byId } from '../dom.js';
import { saveText } from '../files.js';
import { EXAMPLES } from '../examples.js';
import { hashOf } from '../link.js';
import { keep, recall } from '../recall.js';
import { caseFromText, caseToText, emptyCase } from '../state.js';

/** @import { Case } from '../shiftgauge.js' */

const button = byId('cases-button', HTMLButtonElement);
const panel = byId('cases', HTMLElement);
const linkText = byId('case-link-text', HTMLInputElement);

/**
 * What this view asks of whoever runs the page.
 * @typedef {object} Actions
 * @property {() => Case} current
 * @property {(question: Case, said: string) => void} open
 * @property {(message: string, alarm?: boolean) => void} tell
 */

/** @param {Actions} actions */
export function connect(actions) {
  button.addEventListener('click', () => show(panel.hidden === true));
  panel.addEventListener('keydown', ({ key }) => {
    if (key !== 'Escape') return;
    show(false);
    button.focus();
  });
  for (const start of document.querySelectorAll('[data-example]')) {
    if (!(start instanceof HTMLButtonElement)) continue;
    start.addEventListener('click', () => {
      const question = start.dataset.example === 'empty' ? emptyCase() : EXAMPLES[start.dataset.example ?? ''];
      if (question) replace(structuredClone(question), `Opened: ${start.textContent?.trim() ?? ''}.`, actions);
    });
  }
  byId('case-save', HTMLButtonElement).addEventListener('click', () => save(actions));
  byId('case-link', HTMLButtonElement).addEventListener('click', () => void link(actions));
  byId('case-before', HTMLButtonElement).addEventListener('click', () => openText(recall('before') ?? '', 'Back to the case before.', actions));
  byId('case-open', HTMLInputElement).addEventListener('change', ({ target }) => {
    if (!(target instanceof HTMLInputElement)) return;
    const file = target.files?.[0];
    target.value = '';
    if (file) void openFile(file, actions);
  });
  document.addEventListener('dragover', (event) => event.preventDefault());
  document.addEventListener('drop', (event) => {
    const file = event.dataTransfer?.files[0];
    if (!file) return;
    event.preventDefault();
    void openFile(file, actions);
  });
}

export function render() {
  byId('case-before', HTMLButtonElement).hidden = recall('before') === null;
  linkText.hidden = true;
}

/** @param {boolean} open */
function show(open) {
  panel.hidden = !open;
  button.setAttribute('aria-expanded', String(open));
}

/**
 * @param {Case} question
 * @param {string} said
 * @param {Actions} actions
 */
function replace(question, said, actions) {
  keep('before', caseToText(actions.current()));
  show(false);
  actions.open(question, said);
}

/**
 * @param {File} file
 * @param {Actions} actions
 */
async function openFile(file, actions) {
  try {
    openText(file.size > 1e6 ? ' '.repeat(1_000_001) : await file.text(), `Opened ${file.name}.`, actions);
  } catch {
    actions.tell(`${file.name} could not be read: perhaps it is a folder. Nothing was changed.`, true);
  }
}

/**
 * Opens a case that came as text, or says why not and changes nothing.
 * @param {string} text
 * @param {string} said
 * @param {Actions} actions
 */
export function openText(text, said, actions) {
  const found = caseFromText(text);
  if (found.ok) replace(found.question, `${said} The case that stood here is under Cases.`, actions);
  else actions.tell(found.message, true);
}

/** @param {Actions} actions */
function save({ current, tell }) {
  const question = current();
  const name = `${question.title.toLowerCase().normalize('NFKD').replace(/[^a-z0-9]+/g, '-').replace(/^-+|-+$/g, '').slice(0, 60) || 'case'}.json`;
  saveText(name, caseToText(question));
  tell(`Saved as ${name}.`);
}

/** @param {Actions} actions */
async function link({ current, tell }) {
  const address = window.location.href.replace(/#.*$/, '') + await hashOf(JSON.stringify(current()));
  linkText.value = address;
  linkText.hidden = false;
  linkText.select();
  try {
    await navigator.clipboard.writeText(address);
    tell('The link is on the clipboard.');
  } catch {
    tell('Copy the link from its field under Cases.');
  }
}
