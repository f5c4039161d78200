/**
 * The engine as the page sees it: the calls of the built `shiftgauge.js` and the plain data that
 * goes in and comes out. Every number is SI and finite; the unit is in the name.
 */

/** What a value of K is given as. */
export type ConstantKind = 'K' | 'Kp' | 'Kc' | 'Kx' | 'log10 K' | 'ln K' | 'pK' | 'gibbs';

/** Where K comes from; fields of other sources pass through unread. */
export interface ConstantSource {
  from: string;
  for?: string;
  value?: string;
  kind?: ConstantKind;
  pressure_unit?: string;
  at?: string;
  enthalpy?: string;
  heat_capacity?: string;
  approach?: string;
  points?: [string, string][];
  terms?: Record<string, string>;
  [other: string]: unknown;
}

export interface Entry {
  species: string;
  value: string;
  /** What the analyser counts in with this species. */
  includes?: string;
}

export type Water =
  | { fraction: string }
  | { per_dry: string }
  | { dew_point: string; pressure?: string }
  | 'from_feed';

export interface Block {
  entries: Entry[];
  [other: string]: unknown;
}

export interface GasBlock extends Block {
  basis: 'wet' | 'dry';
  water: Water | null;
  /** What the sample lost when it was cooled. */
  lost?: string[];
}

/** Neither a volume nor a mass of water stands for 1 kg of water. */
export interface SolutionBlock extends Block {
  volume: string | null;
  water: string | null;
}

export interface Feed {
  gas: GasBlock | null;
  [other: string]: unknown;
}

export interface Reading {
  gas: GasBlock | null;
  liquid: Block | null;
  solution: SolutionBlock | null;
  solids: Block | null;
}

/** One question; the saved file is this, as JSON. */
export interface Case {
  format: string;
  title: string;
  note: string;
  reactions: { equation: string; constant: ConstantSource }[];
  temperature: string;
  pressure: string | null;
  atmosphere: string;
  hold: 'pressure' | 'volume';
  volume: string | null;
  band: string;
  reading: Reading;
  feed: Feed | null;
  [other: string]: unknown;
}

export interface Problem {
  code: string;
  field: string;
  span: { start: number; end: number } | null;
  arguments: unknown;
  message: string;
  hint: string;
}

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
  /** One for each species that the library gave. */
  records: RecordReport[];
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
  sources: string[];
  range_k: [number, number];
  u_gibbs_j_per_mol: number;
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

export type Refusal = { ok: false; problems: Problem[] };
export type CheckAnswer = { ok: true; report: Report } | Refusal;
export type BalanceAnswer =
  | { ok: true; equation: string; terms: Term[]; already_balanced: boolean }
  | Refusal;

export interface ConstantReport {
  equation: string;
  terms: { species: string; nu: number }[];
  temperature_k: number;
  ln_k: number;
  log10_k: number;
  u_ln_k: number | null;
  forms: Form[];
  gibbs_standard_j_per_mol: number;
  enthalpy_standard_j_per_mol: number | null;
  entropy_standard_j_per_mol_k: number | null;
  heat_capacity_j_per_mol_k: number | null;
  range_k: [number, number] | null;
  extrapolated_by_k: number | null;
}
export type ConstantAnswer = { ok: true; constant: ConstantReport } | Refusal;

export interface SpeciesMatch {
  species: string;
  formula: string;
  phase: 'g' | 'l' | 's' | 'aq';
  form: string | null;
  names: string[];
  cas: string;
  range_k: [number, number];
  sources: string[];
  enthalpy_of_formation_j_per_mol: number;
  entropy_j_per_mol_k: number;
  u_gibbs_j_per_mol: number;
}
export interface SpeciesAnswer {
  ok: true;
  species: SpeciesMatch[];
  /** A formula of the library that is near, where nothing matches. */
  near: string | null;
}

export type Knob = 'temperature' | 'pressure' | 'volume' | `amount of ${string}`;

/** A number of a state of rest; conversion, fraction and amount are of a species. */
export interface Wanted {
  what: 'conversion' | 'fraction' | 'amount' | 'extent' | 'ln_k';
  species?: string | null;
}

/** A chart: rest over one knob, for several settings of another. Settings are texts with units; an
 * amount is a ratio to what else is in its phase. */
export interface SweepRequest {
  x: { knob: Knob; from: string; to: string; count: number };
  lines: { knob: Knob; values: string[] } | null;
  show: Wanted;
}
export type SweepAnswer =
  | {
      ok: true;
      sweep: {
        x: { knob: Knob; unit: 'K' | 'Pa' | 'm3' | 'mol/mol'; values: number[] };
        lines: { name: string; value_si: number | null; y: (number | null)[] }[];
        show: Wanted;
        data_range_k: [number, number] | null;
        now: { x: number | null; y: number | null };
      };
    }
  | Refusal;

/** Which setting of a knob gives a wanted number at rest. */
export interface Goal {
  knob: Knob;
  from: string;
  to: string;
  reach: Wanted;
  value: string;
}
export interface Setting {
  value_si: number;
  text: string;
  reached: number;
}
export type TargetAnswer =
  | {
      ok: true;
      target: {
        outcome: 'none' | 'one' | 'several';
        settings: Setting[];
        nearest: Setting | null;
        from_si: number;
        to_si: number;
        unit: 'K' | 'Pa' | 'm3' | 'mol/mol';
        why: string;
      };
    }
  | Refusal;

/** A number called K, to be turned into every other form. */
export interface StatedNumber {
  equation: string;
  value: string;
  kind: ConstantKind;
  pressure_unit?: string | null;
  temperature: string;
  /** Needed for Kx. */
  pressure?: string | null;
}
export type ConvertAnswer =
  | {
      ok: true;
      equation: string;
      terms: { species: string; nu: number }[];
      delta_nu_gas: number;
      temperature_k: number;
      ln_k: number;
      pk: number;
      gibbs_j_per_mol: number;
      forms: Form[];
    }
  | Refusal;

/** A problem in bare numbers, names being free; see `affinities` and `rest`. */
export interface BareProblem {
  species: { name: string; phase: 'g' | 'l' | 's' | 'aq'; amount_mol: number }[];
  reactions: { nu: number[]; ln_k: number }[];
  temperature_k: number;
  hold: 'pressure' | 'volume';
  pressure_pa?: number;
  volume_m3?: number;
}
export type AffinitiesAnswer =
  | { ok: true; affinities: { affinity_over_rt: number | null; q: ReactionReport['q'] }[] }
  | Refusal;
export type RestAnswer =
  | {
      ok: true;
      species: { name: string; amount_mol: number; ln_amount: number | null; exhausted: boolean }[];
      extents_mol: number[];
      outcome: Outcome;
      iterations: number;
      residual: number;
    }
  | Refusal;

export interface Version {
  ok: true;
  program: string;
  /** The case format that it writes. */
  format: string;
  /** How many species the library knows. */
  species: number;
}

export interface Options {
  language: 'en';
  units: 'as typed' | 'SI' | 'metric' | 'US';
}

export function check(question: Case, options: Options): CheckAnswer;
export function balance(equation: string): BalanceAnswer;
export function constant(reaction: string, temperature: string): ConstantAnswer;
export function sweep(question: Case, request: SweepRequest, options: Options): SweepAnswer;
export function target(question: Case, goal: Goal, options: Options): TargetAnswer;
export function convert(number: StatedNumber): ConvertAnswer;
export function species(text: string): SpeciesAnswer;
export function affinities(problem: BareProblem): AffinitiesAnswer;
export function rest(problem: BareProblem): RestAnswer;
export function version(): Version;
/** Lets go of a running or dead engine; the next start makes a new one. */
export function reset(): void;
export function initSync(source: { module: WebAssembly.Module | BufferSource }): unknown;
export default function initialise(source: {
  module_or_path: WebAssembly.Module | BufferSource | Response | string;
}): Promise<unknown>;
