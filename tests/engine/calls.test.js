import assert from 'node:assert/strict';
import { readFile } from 'node:fs/promises';
import { test } from 'node:test';
import { startedEngine } from './engine.js';

const engine = startedEngine();
const OPTIONS = /** @type {const} */ ({ language: 'en', units: 'as typed' });

/** @param {string} name */
const example = async (name) =>
  JSON.parse(await readFile(new URL(`../../www/examples/${name}.json`, import.meta.url), 'utf8'));

/**
 * Fails on anything that is no plain datum: undefined, a Map, no number, infinity.
 * @param {unknown} value
 * @param {string} path
 */
function assertPlain(value, path) {
  assert.notEqual(value, undefined, path);
  if (typeof value === 'number') assert.ok(Number.isFinite(value), `${path} is ${value}`);
  if (value === null || typeof value !== 'object') return;
  assert.ok(Array.isArray(value) || Object.getPrototypeOf(value) === Object.prototype, path);
  for (const [name, inner] of Object.entries(value)) assertPlain(inner, `${path}.${name}`);
}

test('check gives a report of plain, finite data', async () => {
  for (const name of ['low-temperature-shift', 'chlorine-recovery']) {
    const answer = engine.check(await example(name), OPTIONS);
    assert.equal(answer.ok, true, name);
    assertPlain(answer, name);
    assert.equal(answer.report.rest?.outcome, 'rest');
  }
});

test('check gives every problem with its place in UTF-16 units', async () => {
  const question = await example('low-temperature-shift');
  question.temperature = '−300 °C';
  question.pressure = '𝟐 bars';
  const answer = engine.check(question, OPTIONS);
  assert.equal(answer.ok, false);
  if (answer.ok) return;
  assertPlain(answer, 'refusal');
  assert.deepEqual(answer.problems.map((problem) => problem.field), ['temperature', 'pressure']);
  for (const { span, field } of answer.problems) {
    assert.ok(span && span.end <= question[field].length && span.start < span.end, field);
  }
});

test('nothing that a page can hand over throws', () => {
  const circle = /** @type {Record<string, unknown>} */ ({});
  circle.reactions = [{ equation: Number.NaN }];
  const odd = [undefined, null, 7, 'case', [], {}, () => 1, Symbol('s'), new Map([['format', 1]]), circle, { format: 1n }];
  for (const thing of odd) {
    const answer = engine.check(/** @type {any} */ (thing), OPTIONS);
    assert.equal(answer.ok, false, String(thing));
  }
});

test('balance, constant, species and version answer as the contract says', () => {
  const balanced = engine.balance('NH3(g) + O2(g) = NO(g) + H2O(g)');
  assert.ok(balanced.ok);
  assert.equal(balanced.equation, '4 NH3(g) + 5 O2(g) = 4 NO(g) + 6 H2O(g)');
  assert.deepEqual(balanced.terms.map((term) => term.nu), [-4, -5, 4, 6]);
  assert.equal(balanced.already_balanced, false);

  const constant = /** @type {any} */ (engine.constant('2 SO2(g) + O2(g) = 2 SO3(g)', '700 K'));
  assertPlain(constant, 'constant');
  // log10 K of SO2 + 1/2 O2 = SO3 at 700 K is 2.456 in the NIST-JANAF tables, 4th edition.
  assert.ok(Math.abs(constant.constant.log10_k - 2 * 2.456) < 0.02);

  const found = /** @type {any} */ (engine.species('carbon monoxide', null));
  assert.equal(found.species[0].species, 'CO(g)');
  assert.equal(found.species[0].found_by, 'name');
  assertPlain(found, 'species');
  assert.equal(/** @type {any} */ (engine.species('C0', null)).species.length, 0);
  const cold = /** @type {any} */ (engine.species('SO2(g)', { temperature: '-40 °C' }));
  assert.ok(Math.abs(cold.species[0].outside_by_k - 65) < 1e-9);
  assertPlain(engine.version(), 'version');
});

test('a species has a sheet, and a book of one\'s own stands before the library', () => {
  const plain = /** @type {any} */ (engine.sheet('quartz', { temperature: '600 °C' }));
  assertPlain(plain, 'sheet');
  assert.equal(plain.sheet.species, 'SiO2(s, quartz)');
  // Alpha to beta quartz at 847 K, 728 J/mol in the NIST-JANAF tables, 4th edition.
  assert.equal(plain.sheet.transitions.length, 1);
  assert.ok(Math.abs(plain.sheet.transitions[0].enthalpy_j_per_mol - 728) < 1);
  assert.equal(plain.sheet.curve.gibbs_j_per_mol.length, plain.sheet.curve.temperature_k.length);

  const book = { species: [{
    species: 'SO3(g)', source: 'Invented works', enthalpy: '-395 ± 1 kJ/mol', entropy: '257 J/(mol K)',
    heat_capacity: [{ from: '298.15 K', to: '1000 K', terms: { 1: '60' } }],
  }] };
  const looked = engine.book(book);
  assert.ok(looked.ok);
  assert.equal(looked.species[0]?.u_gibbs_j_per_mol, 500);
  const own = /** @type {any} */ (engine.sheet('SO3(g)', { book }));
  assert.equal(own.sheet.own, true);
  assert.ok(Math.abs(own.sheet.instead_of.enthalpy_j_per_mol + 765) < 100);
  const refused = engine.book({ species: [{ species: 'SO3(g)', source: '', heat_capacity: [] }] });
  assert.equal(refused.ok, false);
});

/** @import { BareProblem } from '../../dist/shiftgauge.js' */

/**
 * A bare problem of A = B in the gas; ln K = ln 3 makes three quarters B.
 * @returns {BareProblem}
 */
const bare = () => ({
  species: [
    { name: 'A', phase: 'g', amount_mol: 1 },
    { name: 'B', phase: 'g', amount_mol: 0 },
  ],
  reactions: [{ nu: [-1, 1], ln_k: Math.log(3) }],
  temperature_k: 500,
  hold: 'pressure',
  pressure_pa: 100000,
});

test('the two primitives answer on bare numbers', () => {
  const rest = /** @type {any} */ (engine.rest(bare()));
  assert.equal(rest.outcome, 'rest');
  assert.ok(Math.abs(rest.species[1].amount_mol - 0.75) < 1e-15);
  assertPlain(rest, 'rest');
  const affinities = /** @type {any} */ (engine.affinities(bare()));
  assert.deepEqual(affinities.affinities, [{ affinity_over_rt: null, q: 'zero' }]);
  const none = /** @type {any} */ (engine.rest({ ...bare(), pressure_pa: Number.NaN }));
  assert.equal(none.problems[0].code, 'number-not-finite');
});

test('the same case gives the same bits again', async () => {
  const question = await example('chlorine-recovery');
  assert.deepEqual(engine.check(question, OPTIONS), engine.check(question, OPTIONS));
});
