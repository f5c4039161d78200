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
mod book;
mod calls;
mod constant_of;
mod constant_remarks;
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
mod read_book;
mod read_constant;
mod read_reading;
mod reading_remarks;
mod refusal;
mod report;
mod report_amounts;
mod run;
mod setting;
mod sheet;
mod shown;
mod species;
mod steps;
mod sweep;
mod target;
mod value;
mod verdict;

pub use bare::{AffinitiesAnswer, AffinityReport, RestAnswer, affinities, rest};
pub use book::{BookAnswer, KeptConstant, book};
pub use calls::{
    Balanced, BalancedTerm, Checked, ConstantAnswer, ConstantReport, Version, balance, check,
    constant, version,
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
pub use sheet::{
    CurveOfSpecies, InsteadOf, PointOfSpecies, SheetAnswer, SheetReport, TransitionReport, sheet,
};
pub use species::{MeasuredReport, SpeciesAnswer, SpeciesMatch, species};
pub use sweep::{AxisReport, LineReport, NowReport, ShowReport, SweepReport, Swept, sweep};
pub use target::{SettingReport, TargetReport, Targeted, target};
pub use value::Value;
