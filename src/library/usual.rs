//! Which phases of a substance a temperature leaves likely.

use super::known::Known;
use super::record::Reach;
use super::record::UncertaintyKind;
use super::temperature::Temperature;
use crate::reaction::Phase;

/// A vapour whose pressure over its own liquid or solid stays below this share of p° is not what a
/// formula without a phase means: 0.1 Pa, the pressure of a good vacuum pump. Common practice, no
/// source.
const LEAST_PRESSURE: f64 = 1e-6;

/// The records of one formula that are likely at a temperature: without liquids and solids out of
/// their range where another is in it, without vapours of less than 0.1 Pa over what is left, and
/// without pairs of ions in water where there is a solid.
///
/// ```
/// use shiftgauge::library::{Book, Temperature, likely};
/// let lime = Book::default().find("CaO", None, None); // as a solid, and as a hot vapour
/// let at = Temperature::new(1170.0).unwrap();
/// assert_eq!((lime.len(), likely(lime.clone(), at).len()), (2, 1));
/// ```
#[must_use]
pub fn likely(mut records: Vec<Known>, at: Temperature) -> Vec<Known> {
    let in_range = |record: &Known| record.reach(at) == Reach::InRange;
    if records.iter().any(|record| record.phase != Phase::Aqueous && in_range(record)) {
        records.retain(|record| {
            let keeps_its_place = matches!(record.phase, Phase::Gas | Phase::Aqueous);
            keeps_its_place || in_range(record)
        });
    }
    if records.iter().any(|record| record.phase == Phase::Solid) {
        let is_pair = |record: &Known| {
            record.phase == Phase::Aqueous && record.u_kind == UncertaintyKind::Measured
        };
        records.retain(|record| !is_pair(record));
    }
    let condensed = |record: &&Known| matches!(record.phase, Phase::Liquid | Phase::Solid);
    let lowest = records.iter().filter(condensed).map(|record| record.gibbs_over_rt(at));
    let Some(lowest) = lowest.reduce(f64::min) else { return records };
    let least = libm::log(LEAST_PRESSURE);
    records
        .retain(|record| record.phase != Phase::Gas || lowest - record.gibbs_over_rt(at) > least);
    records
}
