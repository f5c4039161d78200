//! The report: what `check` answers, as plain data in SI, every number finite.

use std::borrow::Cow;

use serde::Serialize;

use super::judgement_report::JudgementReport;
use super::nudges::NudgeReport;
use super::participants::Participant;
use super::report_amounts::{
    BalanceReport, ChargeReport, Conversion, MissingReport, RestReport, SaturationReport,
    SpeciesReport, ValleyReport,
};
use super::species::MeasuredReport;

/// Everything that is known of one case.
#[derive(Debug, Clone, Serialize)]
pub struct Report {
    /// The temperature of the reading.
    pub temperature_k: f64,
    /// The absolute pressure, where one is known.
    pub pressure_pa: Option<f64>,
    /// The volume of the gas on the basis below, where one is known.
    pub volume_m3: Option<f64>,
    /// The ionic strength; null where no solution is read.
    pub ionic_strength_mol_per_kg: Option<f64>,
    /// The charges of the solution; null where none is read.
    pub charge_balance: Option<ChargeReport>,
    /// The activity of the water in the solution; null where none is read.
    pub water_activity: Option<f64>,
    /// How far the solution is from being saturated with a solid of the reaction.
    pub saturation: Vec<SaturationReport>,
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
    /// One small change of each knob, and what it does to rest.
    pub nudges: Vec<NudgeReport>,
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

/// Where K comes from.
#[derive(Debug, Clone, Serialize)]
pub struct SourceReport {
    /// In one sentence.
    pub text: String,
    /// The range of temperature that all of it covers, where there is one.
    pub range_k: Option<[f64; 2]>,
    /// How far outside its range the reading lies, if it does.
    pub extrapolated_by_k: Option<f64>,
    /// One for each record of the library that K rests on.
    pub records: Vec<RecordReport>,
    /// The measured equilibria of the library that K rests on.
    pub measured: Vec<MeasuredUse>,
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
    /// How many times it enters K: its stoichiometric number, unless measured equilibria stand in.
    pub nu: f64,
    /// The sources in full.
    pub sources: Vec<Cow<'static, str>>,
    /// The range of temperature.
    pub range_k: [f64; 2],
    /// Standard uncertainty of ΔfG° at 298.15 K.
    pub u_gibbs_j_per_mol: f64,
    /// How it was got: `element`, `atct`, `codata`, `sources`, `class` or `own`.
    pub u_from: &'static str,
    /// Whether it is the user's own.
    pub own: bool,
}

/// A measured equilibrium that K rests on.
#[derive(Debug, Clone, Serialize)]
pub struct MeasuredUse {
    /// How many times it enters K.
    pub times: f64,
    /// The equilibrium, as fields of their own.
    #[serde(flatten)]
    pub measured: MeasuredReport,
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
