/** The working, line by line under the number it leads to; the numbers of the answer lead here. */

import { byId, create } from '../dom.js';
import { formulaWriter } from '../formulas.js';

/** @import { State } from '../state.js' */

const HEADINGS = [
  ['k', 'The constant K'],
  ['q', 'The quotient Q'],
  ['gibbs', 'ΔG of the reaction'],
  ['t_star', 'T*, where this analysis would be at equilibrium'],
  ['rest', 'The state at rest'],
];

const groups = byId('working-lines', HTMLElement);

/** @param {State} state */
export function render({ report }) {
  if (report === null) return;
  const write = formulaWriter(report);
  let number = 1;
  groups.replaceChildren(...HEADINGS.flatMap(([about, heading]) => {
    const steps = report.steps.filter((step) => step.about === about);
    if (steps.length === 0) return [];
    const first = number;
    number += steps.length;
    return [
      create('h3', { id: `working-${about}`, tabindex: '-1' }, heading ?? ''),
      create('ol', { start: String(first) }, ...steps.map(({ text }) => create('li', {}, write(text)))),
    ];
  }));
}
