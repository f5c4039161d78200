import assert from 'node:assert/strict';
import { test } from 'node:test';
import { wordAt } from '../../www/word.js';

/** The cursor stands where the bar is. */
const WORDS = [
  ['CO| + H2O = CO2 + H2', 'CO'],
  ['CO + H2|O = CO2 + H2', 'H2O'],
  ['CO + H2O = CO2 + H2|', 'H2'],
  ['2 SO2 + O2| = 2 SO3', 'O2'],
  ['2 SO2 + O2 = 2 SO3|', 'SO3'],
  ['1/2 N2| + 1.5 H2 -> NH3', 'N2'],
  ['½ N2| + 3/2 H2 = NH3', 'N2'],
  ['carbon mon|', 'carbon mon'],
  ['CaO + carbon dioxide| <=> CaCO3', 'carbon dioxide'],
  ['CaSO4 = Ca^2+| + SO4^2-', 'Ca^2+'],
  ['NH4+| + OH- = NH3 + H2O', 'NH4+'],
  ['CaCO3|=CaO+CO2', 'CaCO3'],
  ['CO |+ H2O = CO2', 'CO'],
  ['|', ''],
  ['CO + |', ''],
];
for (const [marked = '', word = ''] of WORDS) {
  test(`in “${marked}” the word is “${word}”`, () => {
    const cursor = marked.indexOf('|');
    const text = marked.replace('|', '');
    const found = wordAt(text, cursor);
    assert.equal(found.text, word);
    assert.equal(text.slice(found.start, found.end), word, 'and that is what is replaced');
  });
}
