/** Runs the page in one direction: event, case, check, render. */

import { balance, check, isSupported, restartEngine, startEngine, versionLine } from './engine.js';
import { byId } from './dom.js';
import { listen } from './events.js';
import { firstCase } from './examples.js';
import { foldAll, foldWhereNarrow } from './folds.js';
import { createMemory } from './memory.js';
import { forget, keep, recall } from './recall.js';
import { textFromHash } from './link.js';
import { keepOffline } from './offline/keep.js';
import { render } from './render.js';
import { caseFromText, caseToText, createState, withoutField } from './state.js';
import { attachAll } from './units.js';
import { connect as connectSheet } from './species-sheet.js';
import * as book from './views/book.js';
import * as cases from './views/cases.js';
import * as certainty from './views/certainty.js';
import * as charts from './views/charts.js';
import * as compare from './views/compare.js';
import * as convert from './views/convert.js';
import * as extras from './views/extras.js';
import * as nudges from './views/nudges.js';
import * as target from './views/target.js';
import * as conditions from './views/conditions.js';
import * as constant from './views/constant.js';
import * as feed from './views/feed.js';
import * as gas from './views/gas.js';
import * as heading from './views/heading.js';
import * as kept from './views/kept.js';
import * as keys from './views/keys.js';
import * as ledger from './views/ledger.js';
import * as library from './views/library.js';
import * as notes from './views/notes.js';
import * as own from './views/own.js';
import * as paste from './views/paste.js';
import * as problems from './views/problems.js';
import * as reaction from './views/reaction.js';
import * as record from './views/record.js';
import * as solids from './views/solids.js';
import * as solution from './views/solution.js';
import * as sources from './views/sources.js';
import * as spoken from './views/spoken.js';
import * as standing from './views/standing.js';
import * as strip from './views/strip.js';
import * as undo from './views/undo.js';
import * as valley from './views/valley.js';
import * as verdict from './views/verdict.js';
import * as working from './views/working.js';

/** @import { Case } from './shiftgauge.js' */
/** @import { State } from './state.js' */

const inputs = [heading, reaction, constant, conditions, gas, solids, solution, feed];
const views = [...inputs, verdict, valley, certainty, ledger, nudges, extras, charts, target, compare, convert, sources, notes, working, problems, spoken, cases, kept, keys, undo, record, strip, library, book];
const notice = byId('notice', HTMLElement);
foldWhereNarrow();

const state = createState(
  /** @type {State} */ ({ question: firstCase(), report: null, answered: null, problems: [], balance: null, current: false, pinned: null, trapped: recall('stopped') ?? '' }),
  (changed) => {
    byId('results', HTMLElement).hidden = changed.report === null;
    byId('results', HTMLElement).classList.toggle('is-old', !changed.current);
    render(views, changed);
  },
);

/**
 * @param {string} message
 * @param {boolean} [alarm]
 */
function tell(message, alarm = false) {
  notice.classList.toggle('alarm', alarm);
  notice.textContent = message;
  notice.hidden = message === '';
}

/** @param {Case} question */
function fill(question) {
  for (const input of inputs) input.fill(question);
}

/** Reads the whole form; what the case holds beyond it is kept. */
function readForm() {
  return inputs.reduce((question, input) => input.read(question), state.get().question);
}

/** The case that was tried last, as text. */
let tried = '';

const memory = createMemory(tell);

/** Answers the case as the form reads now. */
function answer() {
  const question = readForm();
  const text = caseToText(question);
  if (text === tried) {
    // Leaving a field also counts as a change; what is being pressed must not be replaced by it.
    render(inputs, state.get());
    return;
  }
  tried = text;
  memory.keepCase(text);
  if (text === state.get().trapped) {
    state.set({ question, current: false, problems: [] });
    return;
  }
  try {
    const understood = balance(question.reactions[0]?.equation ?? '');
    const answered = check(question);
    state.set(answered.ok
      ? { question, balance: understood, report: answered.report, answered: question, problems: [], current: true }
      : { question, balance: understood, problems: answered.problems, current: false });
    if (state.get().trapped !== '') {
      forget('stopped');
      state.set({ trapped: '' });
    }
  } catch (thrown) {
    stopped(question, text, thrown);
  }
}

/**
 * The engine never throws for a mistake in the case, so whatever was thrown means that this instance
 * is dead: a new one takes its place, and the case that did it is not tried again unchanged.
 * @param {Case} question
 * @param {string} text
 * @param {unknown} thrown
 */
function stopped(question, text, thrown) {
  console.error(thrown);
  keep('stopped', text);
  state.set({ question, current: false, problems: [], trapped: text });
  const sorry = 'The engine stopped on this case, which is a fault of the program. The case is still here';
  try {
    restartEngine();
    tell(`${sorry}, and the engine was started again: change a value to go on.`, true);
  } catch (again) {
    console.error(again);
    tell(`${sorry}: save it to a file, then load the page again.`, true);
  }
}

/** @type {cases.Actions} */
const actions = {
  current: readForm,
  open(question, said) {
    foldAll();
    state.set({ question, report: null, answered: null, current: false, problems: [] });
    fill(question);
    tried = '';
    answer();
    if (state.get().trapped === '') tell(said);
  },
  tell,
};

/**
 * Takes a case over that came from this one: the old answer stays in sight until the new one is there.
 * @param {Case} question
 */
function change(question) {
  state.set({ question });
  fill(question);
  answer();
}

/** @param {string | null} text   a step of the history */
function step(text) {
  const found = caseFromText(text ?? '');
  if (!found.ok) return;
  tell('');
  change(found.question);
}

/** @param {string} field   the path of something that this page has no field for */
function takeOut(field) {
  change(withoutField(readForm(), field));
  byId('sentence', HTMLElement).focus();
}

/** @param {string} hash */
async function openLink(hash) {
  try {
    const text = await textFromHash(hash);
    if (text === null) return;
    cases.openText(text, 'Opened the case in the link.', actions);
    window.history.replaceState(null, '', window.location.pathname + window.location.search);
  } catch {
    tell('The case in this link is damaged, perhaps cut short on its way. Nothing was changed.', true);
  }
}

async function start() {
  attachAll();
  if (!isSupported()) throw new Error('WebAssembly is off in this browser');
  await startEngine();
  byId('version', HTMLElement).textContent = versionLine();
  const saved = caseFromText(recall('case') ?? '');
  const question = saved.ok ? saved.question : firstCase();
  state.set({ question });
  fill(question);
  answer();
  if (state.get().trapped !== '') tell('This case stopped the engine before, which is a fault of the program. The case is still here: change a value to go on.', true);
  cases.connect(actions);
  problems.connect({ takeOut });
  compare.connect({ pin: (pinned) => state.set({ pinned }) });
  kept.connect({ current: readForm, openText: (text, said) => cases.openText(text, said, actions) });
  book.connect({ current: readForm, change, edit: own.edit });
  own.connect({ keep: book.keepSpecies });
  connectSheet({ useOwn: own.startFrom });
  paste.connect({ current: readForm, change: (question, said) => { change(question); tell(said); } });
  undo.connect({
    ...memory.history,
    back: () => step(memory.history.back()),
    forward: () => step(memory.history.forward()),
  });
  listen({
    changed() {
      tell('');
      answer();
    },
    linked: (hash) => void openLink(hash),
  });
  await openLink(window.location.hash);
  void keepOffline(standing.tell);
}

start().catch((thrown) => {
  console.error(thrown);
  const alarm = byId('no-engine', HTMLElement);
  alarm.textContent = `Shiftgauge computes in WebAssembly, which could not be started here: ${thrown instanceof Error ? thrown.message : String(thrown)}. Allow WebAssembly for this page, or try a current browser. Nothing that you type leaves this device.`;
  alarm.hidden = false;
  byId('sentence', HTMLElement).textContent = 'No answer: the engine is not running.';
});
