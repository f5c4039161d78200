/** The sheet of one species: figures, range, uncertainty, sources, and its curves against temperature. */

import { byId, create } from './dom.js';
import { sheet as askSheet } from './engine.js';
import { NO_BREAK, fixed, significant, speciesName } from './format.js';
import { plotFigure } from './plot-figure.js';

/** @import { Asked, Sheet, UncertaintyKind } from './shiftgauge.js' */

const root = byId('sheet', HTMLElement);
const property = byId('sheet-property', HTMLSelectElement);
const figure = plotFigure(byId('sheet-figure', HTMLElement));

/** @type {Sheet | null} */
let shown = null;
/** @type {(sheet: Sheet) => void} */
let useOwn = () => {};

property.addEventListener('change', draw);
byId('sheet-own', HTMLButtonElement).addEventListener('click', () => {
  if (shown !== null) useOwn(shown);
});

/** @param {{ useOwn: (sheet: Sheet) => void }} actions */
export function connect(actions) {
  ({ useOwn } = actions);
}

/** @type {Record<UncertaintyKind, string>} */
const WAYS = {
  element: 'zero by definition: the reference state of its element',
  atct: 'stated by the Active Thermochemical Tables',
  codata: 'stated by the CODATA key values',
  sources: 'half of what two sources differ by',
  class: 'judged by its class: no second source is known, or what is known agrees better than that',
  measured: 'that of the measured equilibrium and of the other species in it',
  own: 'stated with your own figures',
};

/** @type {Record<string, { column: keyof Sheet['curve'], label: string, scale: number, unit: string }>} */
const CURVES = {
  gibbs: { column: 'gibbs_j_per_mol', label: 'G°, kJ/mol', scale: 1e-3, unit: 'kJ/mol' },
  enthalpy: { column: 'enthalpy_j_per_mol', label: 'H°, kJ/mol', scale: 1e-3, unit: 'kJ/mol' },
  entropy: { column: 'entropy_j_per_mol_k', label: 'S°, J/(mol K)', scale: 1, unit: 'J/(mol K)' },
  heat: { column: 'heat_capacity_j_per_mol_k', label: 'C°p, J/(mol K)', scale: 1, unit: 'J/(mol K)' },
};

/**
 * @param {string} species
 * @param {Asked} asked
 */
export function showSheet(species, asked) {
  const answer = askSheet(species, asked);
  root.hidden = !answer.ok;
  if (!answer.ok) return;
  shown = answer.sheet;
  const sheet = answer.sheet;
  byId('sheet-heading', HTMLElement).textContent = speciesName(sheet.species);
  byId('sheet-names', HTMLElement).textContent = [...sheet.names, sheet.cas === '' ? '' : `CAS ${sheet.cas}`, sheet.own ? 'from my own book' : ''].filter(Boolean).join(', ');
  byId('sheet-figures', HTMLElement).replaceChildren(...figures(sheet).map(([name, value]) => create('div', {}, create('dt', {}, name), create('dd', {}, value))));
  byId('sheet-uncertainty', HTMLElement).textContent = `u(ΔfG°) at 298.15 K: ${perMole(sheet.u_gibbs_j_per_mol)}, ${WAYS[sheet.u_from]}.`;
  byId('sheet-measured', HTMLElement).textContent = measured(sheet);
  byId('sheet-instead', HTMLElement).textContent = instead(sheet);
  byId('sheet-sources', HTMLElement).replaceChildren(...sheet.sources.map((text) => create('li', {}, text)));
  figure.clear('');
  draw();
  byId('sheet-heading', HTMLElement).focus({ preventScroll: true });
  root.scrollIntoView({ block: 'nearest' });
}

/** @param {number} joule */
const perMole = (joule) => `${significant(joule / 1000, 2)}${NO_BREAK}kJ/mol`;

/**
 * @param {Sheet} sheet
 * @returns {[string, string][]}
 */
function figures(sheet) {
  const { at, range_k: [low, high], gibbs_of_formation_j_per_mol: gibbs, molar_mass_kg_per_mol: mass } = sheet;
  const there = at.temperature_k === 298.15 ? [] : /** @type {[string, string][]} */ ([
    [`G° at ${fixed(at.temperature_k, 1)}${NO_BREAK}K`, energy(at.gibbs_j_per_mol)],
    [`C°p at ${fixed(at.temperature_k, 1)}${NO_BREAK}K`, `${fixed(at.heat_capacity_j_per_mol_k, 2)}${NO_BREAK}J/(mol${NO_BREAK}K)`],
  ]);
  return [
    ['ΔfH° at 298.15 K', energy(sheet.enthalpy_of_formation_j_per_mol)],
    ['S° at 298.15 K', `${fixed(sheet.entropy_j_per_mol_k, 2)}${NO_BREAK}J/(mol${NO_BREAK}K)`],
    ...(gibbs === null ? [] : [/** @type {[string, string]} */ (['ΔfG° at 298.15 K', energy(gibbs)])]),
    ['C°p at 298.15 K', `${fixed(sheet.heat_capacity_j_per_mol_k, 2)}${NO_BREAK}J/(mol${NO_BREAK}K)`],
    ...there,
    ['Data from – to', `${kelvin(low)} – ${kelvin(high)}${NO_BREAK}K`],
    ...(mass === null ? [] : [/** @type {[string, string]} */ (['Molar mass', `${fixed(mass * 1000, 3)}${NO_BREAK}g/mol`])]),
    ...sheet.transitions.map((one) => /** @type {[string, string]} */ ([`Transition at ${fixed(one.temperature_k, 1)}${NO_BREAK}K`, energy(one.enthalpy_j_per_mol)])),
  ];
}

/**
 * To ten joules, whatever its size: a formation is the difference of large numbers.
 * @param {number} joule
 */
const energy = (joule) => `${fixed(joule / 1000, 2)}${NO_BREAK}kJ/mol`;

/** @param {number} value */
const kelvin = (value) => fixed(value, Number.isInteger(value) ? 0 : 2);

/** @param {Sheet} sheet */
function measured({ equilibrium }) {
  if (equilibrium === null) return '';
  const { equation, log10_k: value, u_log10_k: u, range_k: [low, high], source } = equilibrium;
  return `In water its ΔG° comes from a measured equilibrium: ${equation}, log10 K = ${fixed(value, 3)} at 25 °C, u ${significant(u, 2)}, from ${fixed(low, 0)} to ${fixed(high, 0)} K. ${source}`;
}

/** @param {Sheet} sheet */
function instead({ instead_of: other, at }) {
  if (other === null) return '';
  return `The library's record differs from yours by ${signed(other.enthalpy_j_per_mol / 1000)} kJ/mol in ΔfH°, by ${signed(other.entropy_j_per_mol_k)} J/(mol K) in S° and, at ${fixed(at.temperature_k, 1)} K, by ${signed(other.gibbs_j_per_mol / 1000)} kJ/mol in G°; its u(ΔfG°) is ${perMole(other.u_gibbs_j_per_mol)}.`;
}

/** @param {number} value */
const signed = (value) => (value === 0 ? '0' : `${value < 0 ? '−' : '+'}${significant(Math.abs(value), 3)}`);

function draw() {
  const curve = CURVES[property.value];
  if (shown === null || curve === undefined) return;
  const { curve: columns, range_k: [low, high], at, species } = shown;
  const kelvins = columns.temperature_k;
  /** @type {Record<string, number>} */
  const here = { gibbs: at.gibbs_j_per_mol, enthalpy: at.enthalpy_j_per_mol, entropy: at.entropy_j_per_mol_k, heat: at.heat_capacity_j_per_mol_k };
  const title = `${curve.label.split(',')[0]} of ${speciesName(species)} against temperature`;
  figure.show({
    x: kelvins,
    lines: [{ name: '', y: columns[curve.column].map((value) => value * curve.scale), broken: true }],
    labels: { x: 'temperature, K', y: curve.label },
    marks: [{ x: at.temperature_k, y: (here[property.value] ?? 0) * curve.scale, label: `${fixed(at.temperature_k, 0)} K`, kind: 'now' }],
    data: [low, high],
    words: { id: 'sheet-plot', title, description: `${title}. Shaded and dashed: outside the range of the data, with constant C°p.` },
  }, {
    head: 'temperature',
    x: (place) => `${fixed(kelvins[place] ?? 0, 1)}${NO_BREAK}K, ${fixed((kelvins[place] ?? 0) - 273.15, 1)}${NO_BREAK}°C`,
    y: (value) => `${fixed(value, 2)}${NO_BREAK}${curve.unit}`,
    unit: curve.unit,
    plain: [{ head: 'temperature, K', value: (place) => kelvins[place] ?? 0 }],
  }, kelvins.findIndex((kelvin) => kelvin >= at.temperature_k));
}
