//! The report: what `check` answers, as plain data in SI, every number finite.

use serde::Serialize;

use super::judgement_report::JudgementReport;
use super::participants::Participant;

/// Everything that is known of one case.
#[derive(Debug, Clone, Serialize)]
pub struct Report {
    /// The temperature of the reading.
    pub temperature_k: f64,
    /// The absolute pressure, where one is known.
    pub pressure_pa: Option<f64>,
    /// The volume of the gas on the basis below, where one is known.
    pub volume_m3: Option<f64>,
    /// The ionic strength; null while no solution is read.
    pub ionic_strength_mol_per_kg: Option<f64>,
    /// One for each reaction.
    pub reactions: Vec<ReactionReport>,
    /// The total amount that the amounts below stand for.
    pub basis_mol: f64,
    /// What the basis is: `one mole of wet gas`, `amounts`, `flows for one second`.
    pub basis: &'static str,
    /// One for each species, those of the reaction first.
    pub species: Vec<SpeciesReport>,
    /// The state at rest; null where no reading is given.
    pub rest: Option<RestReport>,
    /// How much of each reactant is converted on the way to rest.
    pub conversions: Vec<Conversion>,
    /// The entry that was found from K; null where none was missing.
    pub missing: Option<MissingReport>,
    /// What the feed says of the gas; null without a feed.
    pub balance: Option<BalanceReport>,
    /// G along the reaction; null where it has no drawing.
    pub valley: Option<ValleyReport>,
    /// The working, line by line.
    pub steps: Vec<StepReport>,
    /// What was assumed, converted or extrapolated, and cautions.
    pub notes: Vec<NoteReport>,
}

/// What is known of one reaction.
#[derive(Debug, Clone, Serialize)]
pub struct ReactionReport {
    /// The equation as understood, phases written out.
    pub equation: String,
    /// Its species with their stoichiometric numbers.
    pub terms: Vec<TermReport>,
    /// The change in the number of gas molecules.
    pub delta_nu_gas: f64,
    /// K and what goes with it, as fields of their own.
    #[serde(flatten)]
    pub constant: KReport,
    /// `finite`, `zero`, `infinite` or `undetermined`.
    pub q: &'static str,
    /// ln Q where Q is finite.
    pub ln_q: Option<f64>,
    /// A/RT = ln K − ln Q.
    pub affinity_over_rt: Option<f64>,
    /// ΔG = −A.
    pub gibbs_j_per_mol: Option<f64>,
    /// The verdict and what the tolerances make of it, as fields of their own.
    #[serde(flatten)]
    pub judgement: JudgementReport,
    /// The temperature where K equals Q.
    pub t_star_k: Option<f64>,
    /// T − T*.
    pub approach_k: Option<f64>,
    /// Positive when the bed falls short.
    pub shortfall_k: Option<f64>,
    /// Why there is no T*, or that there are several.
    pub approach_note: Option<String>,
    /// The extent from now to rest.
    pub extent_mol: Option<f64>,
    /// The least extent that the amounts allow; null where nothing limits it.
    pub extent_min_mol: Option<f64>,
    /// The greatest extent that the amounts allow; null where nothing limits it.
    pub extent_max_mol: Option<f64>,
    /// Where K comes from.
    pub source: SourceReport,
}

/// K at one temperature and what goes with it; p° = 1 bar.
#[derive(Debug, Clone, Serialize)]
pub struct KReport {
    /// ln K.
    pub ln_k: f64,
    /// log10 K.
    pub log10_k: f64,
    /// Standard uncertainty of ln K, where one is known.
    pub u_ln_k: Option<f64>,
    /// The numbers people call K.
    pub forms: Vec<FormReport>,
    /// ΔG°.
    pub gibbs_standard_j_per_mol: f64,
    /// ΔH°.
    pub enthalpy_standard_j_per_mol: Option<f64>,
    /// ΔS°.
    pub entropy_standard_j_per_mol_k: Option<f64>,
    /// ΔCp°.
    pub heat_capacity_j_per_mol_k: Option<f64>,
}

/// A species of an equation.
#[derive(Debug, Clone, Serialize)]
pub struct TermReport {
    /// The species with its phase.
    pub species: String,
    /// Its stoichiometric number, negative on the left.
    pub nu: f64,
}

impl TermReport {
    /// The participants with a stoichiometric number.
    pub(super) fn list(participants: &[Participant]) -> Vec<TermReport> {
        let reacting = participants.iter().filter(|participant| participant.nu != 0.0);
        let term = |one: &Participant| TermReport { species: one.species.text(), nu: one.nu };
        reacting.map(term).collect()
    }
}

/// One form of K.
#[derive(Debug, Clone, Serialize)]
pub struct FormReport {
    /// `K`, `Kp`, `Kc` or `Kx`.
    pub name: &'static str,
    /// The unit the number would carry.
    pub unit: String,
    /// Its decimal logarithm.
    pub log10: f64,
    /// The number; null where a double does not hold it.
    pub value: Option<f64>,
}

/// One end of the extent.
#[derive(Debug, Clone, Serialize)]
pub struct Limit {
    /// `min` or `max`.
    pub side: &'static str,
    /// What runs out there.
    pub species: Vec<String>,
}

/// Where K comes from.
#[derive(Debug, Clone, Serialize)]
pub struct SourceReport {
    /// In one sentence.
    pub text: String,
    /// The range of temperature that all of it covers, where there is one.
    pub range_k: Option<[f64; 2]>,
    /// How far outside its range the reading lies, if it does.
    pub extrapolated_by_k: Option<f64>,
    /// One for each species that the library gave.
    pub records: Vec<RecordReport>,
    /// The line through points, where K is from points.
    pub fit: Option<FitReport>,
}

/// A straight line of ln K against 1/T through points.
#[derive(Debug, Clone, Serialize)]
pub struct FitReport {
    /// The points, for the reaction as written and p° = 1 bar.
    pub points: Vec<FitPoint>,
    /// ΔH° of the line.
    pub enthalpy_j_per_mol: f64,
    /// Its standard uncertainty; null for two points without tolerances.
    pub u_enthalpy_j_per_mol: Option<f64>,
    /// Whether the points bend away from a straight line: ΔH° is then not constant.
    pub bends: bool,
}

/// A point of K.
#[derive(Debug, Clone, Serialize)]
pub struct FitPoint {
    /// Its temperature.
    pub temperature_k: f64,
    /// ln K.
    pub ln_k: f64,
    /// ln K less that of the line.
    pub residual: f64,
}

/// A record of the library, as cited.
#[derive(Debug, Clone, Serialize)]
pub struct RecordReport {
    /// The species with its phase.
    pub species: String,
    /// Its name.
    pub name: String,
    /// The published sources.
    pub sources: Vec<&'static str>,
    /// The range of temperature.
    pub range_k: [f64; 2],
    /// Standard uncertainty of ΔfG° at 298.15 K.
    pub u_gibbs_j_per_mol: f64,
}

/// A species now and at rest.
#[derive(Debug, Clone, Serialize)]
pub struct SpeciesReport {
    /// The species with its phase.
    pub species: String,
    /// `g`, `l`, `s` or `aq`.
    pub phase: &'static str,
    /// Its stoichiometric number, zero for an inert.
    pub nu: f64,
    /// The amount now; null for an ample phase.
    pub now_mol: Option<f64>,
    /// The amount at rest; null for an ample phase, or where nothing was solved.
    pub rest_mol: Option<f64>,
    /// ln of the amount at rest, also where the amount itself underflows.
    pub rest_ln_mol: Option<f64>,
    /// Rest minus now.
    pub change_mol: Option<f64>,
    /// The fraction of its phase now.
    pub now_fraction: Option<f64>,
    /// The fraction of its phase at rest.
    pub rest_fraction: Option<f64>,
    /// ln of the activity now.
    pub now_ln_activity: Option<f64>,
    /// ln of the activity at rest.
    pub rest_ln_activity: Option<f64>,
    /// φ or γ: 1 for an ideal mixture.
    pub activity_coefficient: f64,
    /// The partial pressure now, for a gas.
    pub partial_pressure_pa: Option<f64>,
    /// Whether it is used up at rest.
    pub exhausted: bool,
}

/// How the state of rest was found.
#[derive(Debug, Clone, Serialize)]
pub struct RestReport {
    /// Its temperature.
    pub temperature_k: f64,
    /// Its pressure.
    pub pressure_pa: Option<f64>,
    /// Its volume.
    pub volume_m3: Option<f64>,
    /// How the search ended.
    pub outcome: &'static str,
    /// The steps it took.
    pub iterations: u32,
    /// The affinity over RT that is left; zero at an exhausted phase.
    pub residual: f64,
}

/// How much of a reactant is converted.
#[derive(Debug, Clone, Serialize)]
pub struct Conversion {
    /// The reactant.
    pub species: String,
    /// From the feed to now; null without a feed.
    pub feed_to_now: Option<f64>,
    /// From now to rest.
    pub now_to_rest: Option<f64>,
    /// From the feed to rest; null without a feed.
    pub feed_to_rest: Option<f64>,
}

/// The entry that was found from K.
#[derive(Debug, Clone, Serialize)]
pub struct MissingReport {
    /// The species.
    pub species: String,
    /// A fraction of the gas as analysed, or an amount in mol like those of the other lines.
    pub value: f64,
    /// Whether the value is a fraction.
    pub is_fraction: bool,
    /// Its standard uncertainty.
    pub u_value: f64,
}

/// The gas behind a feed, by the balance of the elements.
#[derive(Debug, Clone, Serialize)]
pub struct BalanceReport {
    /// By what share the gas shrinks from the feed to the reading; negative where it grows.
    pub contraction: f64,
    /// The largest difference of an element, as a share of what is fed.
    pub closes_within: f64,
    /// One for each element that balances in the gas.
    pub elements: Vec<ElementReport>,
    /// What the analysis does not show and the balance found.
    pub restored: Vec<RestoredReport>,
}

/// One element in the feed and behind it.
#[derive(Debug, Clone, Serialize)]
pub struct ElementReport {
    /// Its symbol.
    pub element: &'static str,
    /// Atoms of it in the feed, mol on the feed's basis.
    pub feed_mol: f64,
    /// Atoms of it behind, mol on the feed's basis.
    pub reading_mol: f64,
}

/// A species that the balance found.
#[derive(Debug, Clone, Serialize)]
pub struct RestoredReport {
    /// The species with its phase.
    pub species: String,
    /// Its fraction of the wet gas.
    pub fraction: f64,
}

/// The energy along the extent, from one limit to the other.
#[derive(Debug, Clone, Serialize)]
pub struct ValleyReport {
    /// `G` at constant pressure, `A` (Helmholtz energy) at constant volume.
    pub energy: &'static str,
    /// Where the mixture is now; always zero.
    pub extent_now_mol: f64,
    /// The left end of the drawing.
    pub extent_min_mol: f64,
    /// The right end of the drawing.
    pub extent_max_mol: f64,
    /// What runs out at each end.
    pub limits: Vec<Limit>,
    /// Extents on the basis, rising.
    pub extent_mol: Vec<f64>,
    /// The energy above its lowest value, over RT, on the same basis.
    pub gibbs_over_rt: Vec<f64>,
    /// A closer look around now and rest, where they are near each other.
    pub near: Option<CurveReport>,
}

/// Points of a curve.
#[derive(Debug, Clone, Serialize)]
pub struct CurveReport {
    /// Extents on the basis, rising.
    pub extent_mol: Vec<f64>,
    /// The energy above its value at rest, over RT.
    pub gibbs_over_rt: Vec<f64>,
}

impl From<crate::advice::Curve> for CurveReport {
    fn from(curve: crate::advice::Curve) -> Self {
        Self { extent_mol: curve.extent_mol, gibbs_over_rt: curve.energy_over_rt }
    }
}

/// A line of the working.
#[derive(Debug, Clone, Serialize)]
pub struct StepReport {
    /// The line.
    pub text: String,
    /// Which number of the answer it leads to: `k`, `q`, `gibbs`, `t_star` or `rest`.
    pub about: &'static str,
}

/// A note.
#[derive(Debug, Clone, Serialize)]
pub struct NoteReport {
    /// `assumption`, `conversion`, `warning` or `caution`.
    pub level: &'static str,
    /// Which note.
    pub code: &'static str,
    /// The note.
    pub text: String,
}
