/** A number called K in its other forms, for comparing with a book. */

import { convert } from '../engine.js';
import { byId, create } from '../dom.js';
import { fixed, fromLog10, molarEnergy, significant, unit } from '../format.js';

/** @import { ConstantKind } from '../shiftgauge.js' */
/** @import { State } from '../state.js' */

const tool = byId('convert', HTMLDetailsElement);
const value = byId('convert-value', HTMLInputElement);
const kind = byId('convert-kind', HTMLSelectElement);
const pressureUnit = byId('convert-unit', HTMLSelectElement);
const temperature = byId('convert-temperature', HTMLInputElement);
const equation = byId('convert-equation', HTMLInputElement);
const problem = byId('convert-problem', HTMLElement);
const forms = byId('convert-forms', HTMLElement);
const FIELDS = { value, temperature, equation, pressure_unit: pressureUnit, kind };

for (const field of Object.values(FIELDS)) field.addEventListener('input', show);

/** The case's own reaction, temperature and K are there to begin with. */
export function render(/** @type {State} */ { report, answered }) {
  const reaction = report?.reactions[0];
  if (reaction === undefined || answered === null || tool.open) return;
  equation.value = reaction.equation;
  temperature.value = answered.temperature.replace(/\s*(±|\+\/-).*?(?=[°KC])/, ' ');
  value.value = significant(reaction.log10_k, 6).replace('−', '-');
  kind.value = 'log10 K';
  pressureUnit.value = '';
  show();
}

function show() {
  for (const field of Object.values(FIELDS)) field.removeAttribute('aria-invalid');
  const answer = convert({
    equation: equation.value, value: value.value, kind: /** @type {ConstantKind} */ (kind.value),
    pressure_unit: pressureUnit.value === '' ? null : pressureUnit.value, temperature: temperature.value,
  });
  problem.hidden = answer.ok;
  if (!answer.ok) {
    const [first] = answer.problems;
    problem.replaceChildren(create('strong', {}, first?.message ?? ''), ` ${first?.hint ?? ''}`);
    for (const { field } of answer.problems) FIELDS[/** @type {keyof typeof FIELDS} */ (field)]?.setAttribute('aria-invalid', 'true');
    forms.replaceChildren();
    return;
  }
  const rows = [
    ...answer.forms.map(({ name, unit: text, log10 }) => [text === '1' ? name : `${name} in ${unit(text)}`, fromLog10(log10, 5)]),
    ['log10 K', fixed(answer.ln_k / Math.LN10, 5)], ['ln K', fixed(answer.ln_k, 5)], ['pK', fixed(answer.pk, 5)], ['ΔG°', molarEnergy(answer.gibbs_j_per_mol)],
  ];
  forms.replaceChildren(...rows.map(([name = '', text = '']) => create('div', {}, create('dt', {}, name), create('dd', {}, text))));
}
