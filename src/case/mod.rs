//! The case file, the report, and the run from one to the other.
//!
//! A case is walked by hand ([`Value`] to a question, every problem at once), run through the rooms
//! above, and answered with a [`Report`]: plain data, SI, every number finite.

mod amounts;
mod answer;
mod ask;
mod asker;
mod bare;
mod blocks;
mod calls;
mod constant_of;
mod convert;
mod inputs;
mod judgement;
mod judgement_report;
mod missing;
mod node;
mod notes;
mod nudges;
mod participants;
mod question;
mod read;
mod read_constant;
mod read_reading;
mod reading_remarks;
mod refusal;
mod report;
mod report_amounts;
mod run;
mod setting;
mod shown;
mod steps;
mod sweep;
mod target;
mod value;
mod verdict;

pub use bare::{AffinitiesAnswer, AffinityReport, RestAnswer, affinities, rest};
pub use calls::{
    Balanced, BalancedTerm, Checked, ConstantAnswer, ConstantReport, SpeciesAnswer, SpeciesMatch,
    Version, balance, check, constant, species, version,
};
pub use convert::{Converted, convert};
pub use judgement_report::{BandReport, BetterRow, BudgetRow, JudgementReport};
pub use nudges::{ChangeReport, NudgeReport};
pub use refusal::{Answer, ProblemReport, Refusal, SpanReport};
pub use report::{
    FitPoint, FitReport, FormReport, KReport, NoteReport, ReactionReport, RecordReport, Report,
    SourceReport, StepReport, TermReport,
};
pub use report_amounts::{
    BalanceReport, ChargeReport, Conversion, CurveReport, ElementReport, Limit, MissingReport,
    RestReport, RestoredReport, SaturationReport, SpeciesReport, ValleyReport,
};
pub use sweep::{AxisReport, LineReport, NowReport, ShowReport, SweepReport, Swept, sweep};
pub use target::{SettingReport, TargetReport, Targeted, target};
pub use value::Value;
