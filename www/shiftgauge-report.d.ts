/**
 * The report of the engine: what `check` gives. Every number is SI and finite; the unit is in the name.
 */

import type { MeasuredEquilibrium, UncertaintyKind } from './shiftgauge-library.js';

export interface Term {
  species: string;
  phase: string | null;
  nu: number;
}

export interface Form {
  name: 'K' | 'Kp' | 'Kc' | 'Kx';
  unit: string;
  log10: number;
  value: number | null;
}

export type Verdict = 'forward' | 'reverse' | 'at rest' | 'cannot tell';

export interface SourceReport {
  text: string;
  range_k: [number, number] | null;
  extrapolated_by_k: number | null;
  /** One for each record of the library that K rests on. */
  records: RecordReport[];
  /** The measured equilibria of the library that K rests on, and how many times each. */
  measured: (MeasuredEquilibrium & { times: number })[];
  /** The straight line of ln K against 1/T, where K is from points. */
  fit: {
    points: { temperature_k: number; ln_k: number; residual: number }[];
    enthalpy_j_per_mol: number;
    u_enthalpy_j_per_mol: number | null;
    bends: boolean;
  } | null;
}

export interface RecordReport {
  species: string;
  name: string;
  /** How many times it enters K. */
  nu: number;
  sources: string[];
  range_k: [number, number];
  u_gibbs_j_per_mol: number;
  u_from: UncertaintyKind;
  own: boolean;
}

/** An interval of 95 %; an end that is null is open. */
export type Interval = [number | null, number | null];

/** How near to rest counts as at rest. */
export type Band = { kind: 'temperature'; half_width_k: number } | { kind: 'conversion'; half_width: number };

/** What one input with a tolerance does to the affinity. */
export interface BudgetRow {
  /** The field's path; empty for data of the library or of a line. */
  input: string;
  name: string;
  share_of_variance: number;
  affinity_over_rt: number;
  approach_k: number | null;
}

/** The verdict with its uncertainty; u_… is a standard uncertainty. */
export interface Judgement {
  /** Null where there is no reading. */
  verdict: Verdict | null;
  leaning: 'forward' | 'reverse' | null;
  why: string;
  u_ln_q: number | null;
  u_affinity_over_rt: number | null;
  u_gibbs_j_per_mol: number | null;
  u_approach_k: number | null;
  affinity_interval_over_rt: Interval | null;
  approach_interval_k: Interval | null;
  band: Band | null;
  /** The extent to rest as a share of the whole range of the extent. */
  missing_conversion: number | null;
  u_missing_conversion: number | null;
  missing_conversion_interval: Interval | null;
  /** The largest share first. */
  budget: BudgetRow[];
  /** Whether the figures change in proportion to the inputs within their tolerances. */
  linear: boolean;
  /** What to measure better, where the verdict cannot be told. */
  better: { input: string; name: string; text: string }[];
}

export interface ReactionReport extends Judgement {
  equation: string;
  terms: { species: string; nu: number }[];
  delta_nu_gas: number;
  ln_k: number;
  log10_k: number;
  u_ln_k: number | null;
  forms: Form[];
  gibbs_standard_j_per_mol: number;
  enthalpy_standard_j_per_mol: number | null;
  entropy_standard_j_per_mol_k: number | null;
  heat_capacity_j_per_mol_k: number | null;
  q: 'finite' | 'zero' | 'infinite' | 'undetermined';
  ln_q: number | null;
  affinity_over_rt: number | null;
  gibbs_j_per_mol: number | null;
  t_star_k: number | null;
  approach_k: number | null;
  shortfall_k: number | null;
  approach_note: string | null;
  extent_mol: number | null;
  extent_min_mol: number | null;
  extent_max_mol: number | null;
  source: SourceReport;
}

export interface SpeciesReport {
  /** With its phase, such as `CO2(g)` or `C(s, graphite)`. */
  species: string;
  phase: 'g' | 'l' | 's' | 'aq';
  /** Zero for an inert. */
  nu: number;
  /** Null for a phase that is there in ample amount. */
  now_mol: number | null;
  rest_mol: number | null;
  rest_ln_mol: number | null;
  change_mol: number | null;
  now_fraction: number | null;
  rest_fraction: number | null;
  /** For a solute. */
  now_mol_per_kg: number | null;
  rest_mol_per_kg: number | null;
  now_ln_activity: number | null;
  rest_ln_activity: number | null;
  activity_coefficient: number;
  partial_pressure_pa: number | null;
  exhausted: boolean;
}

export type Outcome =
  | 'rest'
  | 'phase exhausted'
  | 'ran to its limit'
  | 'any extent is at rest'
  | 'nothing can move'
  | 'has no limit';

/** Points of the energy over RT above its lowest value, against the extent on the report's basis. */
export interface Curve {
  extent_mol: number[];
  gibbs_over_rt: number[];
}

/** The energy along the reaction from wall to wall, and a closer look where now and rest are near. */
export interface Valley extends Curve {
  /** Gibbs energy at constant pressure, Helmholtz energy (A) at constant volume. */
  energy: 'G' | 'A';
  extent_now_mol: number;
  extent_min_mol: number;
  extent_max_mol: number;
  limits: { side: 'min' | 'max'; species: string[] }[];
  near: Curve | null;
}

/** One small change of one knob, and what it does to rest. */
export interface Nudge {
  knob:
    | 'temperature'
    | 'pressure'
    | 'volume'
    | 'add'
    | 'remove'
    | 'inert at constant pressure'
    | 'inert at constant volume'
    | 'dilution';
  /** What is added or taken away. */
  species: string | null;
  name: string;
  step: number;
  unit: 'K' | 'Pa' | 'm3' | 'mol' | '1';
  direction: 'forward' | 'reverse' | 'none';
  /** Which way a very small step would move it. */
  local_direction: 'forward' | 'reverse' | 'none';
  extent_change_mol: number | null;
  /** The same as a share of the whole range of the extent. */
  conversion_change: number | null;
  derivative: number | null;
  change: { species: string; rest_mol: number; change_mol: number }[];
  why: string;
}

/** The gas behind a feed, by the balance of the elements. */
export interface Balance {
  /** By what share the gas shrinks; negative where it grows. */
  contraction: number;
  closes_within: number;
  elements: { element: string; feed_mol: number; reading_mol: number }[];
  /** What the analysis does not show and the balance found. */
  restored: { species: string; fraction: number }[];
}

export interface Step {
  text: string;
  /** Which number of the answer the line leads to. */
  about: 'k' | 'q' | 'gibbs' | 't_star' | 'rest';
}

export interface Note {
  level: 'assumption' | 'conversion' | 'warning' | 'caution';
  code: string;
  text: string;
}

export interface Report {
  temperature_k: number;
  pressure_pa: number | null;
  volume_m3: number | null;
  ionic_strength_mol_per_kg: number | null;
  charge_balance: {
    positive_eq_per_kg: number;
    negative_eq_per_kg: number;
    difference: number;
  } | null;
  water_activity: number | null;
  /** log10(Q/K) of dissolving one of a solid; above zero it may precipitate. */
  saturation: { species: string; saturation_index: number }[];
  reactions: ReactionReport[];
  basis_mol: number;
  /** What the amounts stand for, in words. */
  basis: string;
  species: SpeciesReport[];
  rest: {
    temperature_k: number;
    pressure_pa: number | null;
    volume_m3: number | null;
    outcome: Outcome;
    iterations: number;
    residual: number;
  } | null;
  conversions: {
    species: string;
    feed_to_now: number | null;
    now_to_rest: number | null;
    feed_to_rest: number | null;
  }[];
  /** The entry that was found from K. */
  missing: { species: string; value: number; is_fraction: boolean; u_value: number } | null;
  /** Null without a feed. */
  balance: Balance | null;
  valley: Valley | null;
  nudges: Nudge[];
  steps: Step[];
  notes: Note[];
}
