/** The species that the cursor stands in, inside the text of an equation. */

/**
 * @typedef {object} Word
 * @property {string} text
 * @property {number} start
 * @property {number} end
 */

/**
 * The word of an equation that the cursor stands in, without a coefficient and a sign before it.
 * @param {string} text
 * @param {number} cursor
 * @returns {Word}
 */
export function wordAt(text, cursor) {
  // A plus belongs to the equation where a space stands before it, and to a charge otherwise.
  const breaks = /\s\+\s?|\s*(?:<?=>?|<?->|[⇌→])\s*/g;
  let [start, end] = [0, text.length];
  for (const found of text.matchAll(breaks)) {
    if (found.index + found[0].length > cursor) {
      end = found.index;
      break;
    }
    start = found.index + found[0].length;
  }
  start += /^\s*(?:[\d.,/½]+\s+)?/.exec(text.slice(start, end))?.[0].length ?? 0;
  const word = text.slice(start, end).trimEnd();
  return { text: word, start, end: start + word.length };
}
