/** The species of the reaction with their phases, as far as they are understood. */

/** @import { State } from './state.js' */

/**
 * A species without its phase; the name of a form, as in `C(s, graphite)`, stays.
 * @param {string} text
 */
export const withoutPhase = (text) => text.trim().replace(/\((?:g|l|s|aq)\)$/, '');

/** An ion is not a gas here, whether or not the library has it. */
const CHARGED = /[+-]\)?$/;

/**
 * As the engine understood this equation when it last answered, else as they are written; a phase that is
 * not known yet is null.
 * @param {State} state
 * @returns {{ species: string, phase: string | null }[] | null}   null where the equation cannot be read
 */
export function understoodSpecies({ balance, report, answered, question }) {
  if (report !== null && answered?.reactions[0]?.equation === question.reactions[0]?.equation) {
    return (report.reactions[0]?.terms ?? []).map(({ species }) => ({
      species: withoutPhase(species),
      phase: /\((g|l|s|aq)(?:, [^()]*)?\)$/.exec(species)?.[1] ?? null,
    }));
  }
  if (balance?.ok !== true) return null;
  return balance.terms.map(({ species, phase }) => ({ species: withoutPhase(species), phase: phase ?? (CHARGED.test(species) ? 'aq' : null) }));
}
