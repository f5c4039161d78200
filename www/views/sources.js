/** K in its forms, each with its unit and standard state, and where it comes from. */

import { byId, create } from '../dom.js';
import { NO_BREAK, fromLog10, molarEnergy, unit } from '../format.js';

/** @import { Form } from '../shiftgauge.js' */
/** @import { State } from '../state.js' */

const forms = byId('constant-forms', HTMLElement);
const source = byId('source-text', HTMLElement);

/** @param {State} state */
export function render({ report }) {
  const reaction = report?.reactions[0];
  if (reaction === undefined) return;
  const thermal = reaction.enthalpy_standard_j_per_mol;
  forms.replaceChildren(
    ...reaction.forms.map((form) => figure(label(form), `${fromLog10(form.log10, 4)}${form.name === 'K' || form.unit === '' ? '' : NO_BREAK + unit(form.unit)}`)),
    figure('ΔG° of the reaction', molarEnergy(reaction.gibbs_standard_j_per_mol)),
    ...(thermal === null ? [] : [figure('ΔH° of the reaction', molarEnergy(thermal))]),
  );
  source.textContent = typeof reaction.source === 'string' ? reaction.source : reaction.source?.text ?? '';
}

/** @param {Form} form */
function label(form) {
  return form.name === 'K' ? 'K (p° = 1 bar)' : form.name;
}

/**
 * @param {string} name
 * @param {string} value
 */
function figure(name, value) {
  return create('div', {}, create('dt', {}, name), create('dd', {}, value));
}
