//! What is known of each species: Δ_fH°, S°, C°p(T), where it holds, how well, and from where.
//!
//! The tables lie beside this file as tab-separated text: `species.tsv` (one line a species, its
//! atoms in Hill's order among the cells), `heat.tsv` (one line a range of temperature),
//! `measured.tsv` (one line a constant in water) and `sources.tsv`. Nothing is parsed before it is
//! asked for. `tests/reference/library.py` made them from published data and checks them.
//!
//! Conventions: p° = 1 bar; H° of the elements in their reference states is zero at 298.15 K; the
//! reference state is one for all temperatures (rhombic sulfur, graphite, iron), so tables that
//! change it, as some do for sulfur above 882 K, agree for balanced reactions only.
//!
//! Dissolved species, `(aq)`: the standard state is the ideal solution of 1 mol/kg. Δ_fG°, S° and
//! C°p of the hydrogen ion are zero. Where a constant of `measured.tsv` ties a species, a reaction
//! goes by it, and the record stands for sheets and for `Combination::of_species`. Key values of
//! CODATA come first; other ions have Δ_fG° and S° of the CRC table, from which Δ_fH° follows;
//! neutral molecules have Henry's constants with the gas, or the NBS tables. Where a measured constant tells more than tables of single species do
//! (ammonium, sulfite, hydrogen fluoride, witherite), the record is formed by that constant, and
//! its sources say so. C°p is constant: the range is 0 to 100 °C where it is published and 15 to
//! 35 °C where it is not, and there it is zero or that of the reaction's other side. Carbonic acid
//! is CO2(aq), ammonium hydroxide NH3(aq), sulfurous acid SO2(aq): one molecule, one record. There
//! is no S^2-(aq), as no sound constant for it exists.
//!
//! NASA TM-4513 was made with R = 8.314510 J/(mol K). C°p/R and S°/R follow from spectra and do
//! not depend on R, so they are kept; H° is known in J/mol, so its constant is set anew for the
//! exact R. The rest differs by 6e−6 relative.
//!
//! ```
//! use shiftgauge::library;
//! use shiftgauge::reaction::Phase;
//! assert_eq!(library::find("S", Some(Phase::Solid), None).len(), 2); // rhombic and monoclinic
//! assert_eq!(library::named("quicklime")[0].formula, "CaO");
//! assert_eq!(library::find("SO4^2-", None, None)[0].id, "SO4^2-.aq");
//! ```

mod basis;
mod book;
mod combination;
mod element;
mod find;
mod hazard;
mod known;
mod measured;
mod own;
mod polynomial;
mod read;
mod record;
mod search;
mod table;
mod temperature;
mod usual;

pub use book::Book;
pub use combination::Change;
pub use combination::Combination;
pub use combination::STOICHIOMETRIC_LIMIT;
pub use find::{all, count, find, formulas, named, one};
pub use hazard::hazards;
pub use known::Known;
pub use measured::Measured;
pub use measured::all_measured;
pub use measured::measured;
pub use own::FIGURES_AGREE_J_PER_MOL;
pub use own::HEAT_STEP;
pub use own::OwnFigures;
pub use own::OwnHeat;
pub use record::Properties;
pub use record::Reach;
pub use record::Record;
pub use record::Transition;
pub use record::UncertaintyKind;
pub use search::{Found, FoundBy};
pub use table::citation;
pub use temperature::TEMPERATURE_LIMITS_K;
pub use temperature::Temperature;
pub use usual::likely;
