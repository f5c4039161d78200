/** What the case was before: every step can be taken back, and forward again, also after a reload. */

const MOST_STEPS = 100;
const MOST_KEPT_SIGNS = 300_000;
/** Typing in one field is one step, until it pauses this long. */
const PAUSE_MS = 1200;

/** @typedef {{ text: string, at: number, where: string }} Step */

/**
 * @param {{ load: () => string | null, store: (text: string) => void }} shelf   where the steps outlive a reload
 * @param {() => number} [now]
 */
export function createHistory({ load, store }, now = () => Date.now()) {
  /** @type {Step[]} */
  let steps = [];
  let index = -1;
  restore();

  function restore() {
    try {
      const found = JSON.parse(load() ?? 'null');
      if (!Array.isArray(found?.texts) || !found.texts.every((/** @type {unknown} */ text) => typeof text === 'string')) return;
      steps = found.texts.map((/** @type {string} */ text) => ({ text, at: 0, where: '' }));
      index = Math.min(steps.length - 1, Math.max(-1, Number(found.index) || 0));
    } catch {
      // What was kept is no history: a new one begins.
    }
  }

  function keep() {
    let first = 0;
    let signs = steps.reduce((sum, { text }) => sum + text.length, 0);
    while (signs > MOST_KEPT_SIGNS && first < index) {
      signs -= steps[first]?.text.length ?? 0;
      first += 1;
    }
    store(JSON.stringify({ texts: steps.slice(first).map(({ text }) => text), index: index - first }));
  }

  /** @param {number} step */
  function move(step) {
    const found = steps[index + step];
    if (found === undefined) return null;
    index += step;
    for (const one of steps) one.where = '';
    keep();
    return found.text;
  }

  return {
    /**
     * Takes down the case as it stands now.
     * @param {string} text
     * @param {string} where   the field that was typed in; empty for anything else
     */
    note(text, where) {
      const last = steps[index];
      if (last?.text === text) return;
      steps.length = index + 1;
      const continues = last !== undefined && index > 0 && where !== '' && last.where === where && now() - last.at < PAUSE_MS;
      if (continues) steps[index] = { text, at: now(), where };
      else steps.push({ text, at: now(), where });
      if (steps.length > MOST_STEPS) steps.shift();
      index = steps.length - 1;
      keep();
    },
    back: () => move(-1),
    forward: () => move(1),
    canGoBack: () => index > 0,
    canGoForward: () => index < steps.length - 1,
  };
}
