/** Hands one state to every view; no view knows another. */

/** @import { State } from './state.js' */
/** @typedef {{ render: (state: State) => void }} View */

/**
 * @param {readonly View[]} views
 * @param {State} state
 */
export function render(views, state) {
  for (const view of views) view.render(state);
}
