/** The inverse question: which setting of one knob gives a wanted number at rest. */

import { target } from '../engine.js';
import { byId, create } from '../dom.js';
import { findField } from '../find-field.js';
import { reveal } from '../folds.js';
import { NO_BREAK, formula, significant, speciesName, temperature, temperatureUnit } from '../format.js';
import { numbersOfRest } from '../numbers-of-rest.js';

/** @import { Case, Goal, Report, Setting } from '../shiftgauge.js' */
/** @import { State } from '../state.js' */

const section = byId('target', HTMLElement);
const knob = byId('target-knob', HTMLSelectElement);
const what = byId('target-what', HTMLSelectElement);
const value = byId('target-value', HTMLInputElement);
const from = byId('target-from', HTMLInputElement);
const to = byId('target-to', HTMLInputElement);
const problem = byId('target-problem', HTMLElement);
const said = byId('target-answer', HTMLElement);
const settings = byId('target-settings', HTMLElement);
const FIELDS = { value, from, to };

/** @type {{ report: Report, answered: Case } | null} */
let shown = null;
let touched = false;
let rangeTouched = false;

byId('target-ask', HTMLButtonElement).addEventListener('click', ask);
what.addEventListener('change', () => shown !== null && !touched && propose(shown.report));
value.addEventListener('input', () => { touched = true; });
for (const field of [from, to]) field.addEventListener('input', () => { rangeTouched = true; });
knob.addEventListener('change', () => shown && range(shown.report, shown.answered));
for (const field of Object.values(FIELDS)) {
  field.addEventListener('keydown', ({ key }) => {
    if (key === 'Enter') ask();
  });
}

/** @param {State} state */
export function render({ report, answered, current }) {
  section.hidden = report === null || report.rest === null || report.rest.outcome === 'has no limit';
  if (section.hidden || report === null || answered === null || !current || shown?.report === report) return;
  shown = { report, answered };
  fill(knob, [
    ['temperature', 'the temperature'],
    ...(report.pressure_pa !== null && report.species.some(({ phase, nu }) => phase === 'g' && nu !== 0) ? [['pressure', 'the pressure']] : []),
    ...report.species.filter(({ now_mol: now }) => now !== null).map(({ species }) => [`amount of ${species}`, `the amount of ${speciesName(species)}`]),
  ]);
  fill(what, numbersOfRest(report).map(({ value: name, text }) => [name, text]));
  if (!touched) propose(report);
  if (!rangeTouched) range(report, answered);
  said.textContent = '';
  settings.replaceChildren();
  problem.hidden = true;
}

/**
 * @param {HTMLSelectElement} select
 * @param {string[][]} options
 */
function fill(select, options) {
  const before = select.value;
  select.replaceChildren(...options.map(([name = '', text = '']) => create('option', { value: name }, text)));
  if (options.some(([name]) => name === before)) select.value = before;
}

/**
 * A number to aim at until the user writes one: 98 % converted, or a little more than now.
 * @param {Report} report
 */
function propose({ species }) {
  const [kind, ...name] = what.value.split(' ');
  const fraction = species.find((one) => one.species === name.join(' '))?.rest_fraction ?? null;
  value.value = kind === 'conversion' || fraction === null ? '98 %' : `${significant(fraction * 90, 2)} %`;
}

/**
 * A range to look in, around now.
 * @param {Report} report
 * @param {Case} answered
 */
function range({ temperature_k: now, pressure_pa: pressure, reactions }, answered) {
  const unit = temperatureUnit(answered.temperature);
  const [low, high] = reactions[0]?.source.range_k ?? [now - 200, now + 200];
  /** @type {Record<string, [string, string]>} */
  const ranges = {
    temperature: [temperature(Math.max(low, now - 200), unit, 0), temperature(Math.min(high, now + 200), unit, 0)],
    pressure: [`${significant((pressure ?? 1e5) / 5e5, 3)} bar`, `${significant((pressure ?? 1e5) / 2e4, 3)} bar`],
  };
  [from.value, to.value] = ranges[knob.value] ?? ['0.001', '10'];
}

function ask() {
  if (shown === null) return;
  const [kind = '', ...species] = what.value.split(' ');
  const goal = /** @type {Goal} */ ({
    knob: knob.value, from: from.value, to: to.value, value: value.value, reach: { what: kind, species: species.join(' ') },
  });
  for (const field of Object.values(FIELDS)) field.removeAttribute('aria-invalid');
  const answer = target(shown.answered, goal);
  problem.hidden = answer.ok;
  if (!answer.ok) {
    said.textContent = '';
    settings.replaceChildren();
    const [first] = answer.problems;
    problem.replaceChildren(create('strong', {}, first?.message ?? ''), ` ${first?.hint ?? ''}`);
    for (const { field } of answer.problems) FIELDS[/** @type {keyof typeof FIELDS} */ (field)]?.setAttribute('aria-invalid', 'true');
    return;
  }
  said.textContent = formula(answer.target.why);
  settings.replaceChildren(...answer.target.settings.map(row));
}

/** @param {Setting} setting */
function row(setting) {
  const item = create('li', {}, `${setting.text} `);
  const field = { temperature: 'temperature', pressure: 'pressure' }[knob.value];
  if (field === undefined) return item;
  const text = field === 'temperature' ? setting.text.replace(/ \(.*/, '') : `${setting.text}(a)`;
  const button = create('button', { type: 'button' }, 'Put it into the case');
  button.addEventListener('click', () => {
    const input = findField(field);
    if (!(input instanceof HTMLInputElement)) return;
    reveal(input);
    input.value = text.replaceAll(NO_BREAK, ' ').replace('−', '-');
    input.dispatchEvent(new Event('input', { bubbles: true }));
    input.focus();
  });
  item.append(button);
  return item;
}
