//! Amounts and masses per second, minute, hour and day.

use super::super::measure::Measure::{AmountRate, MassRate};
use super::super::unit::Unit;
use super::amount as a;
use super::{SI, SP811};

const fn per(seconds: f64, factor: (f64, f64)) -> (f64, f64) {
    (factor.0, factor.1 * seconds)
}

/// Four rows for each unit: per s, min, h and d; an alias of the unit makes one of the rate.
macro_rules! per_time {
    ($( $measure:ident $name:literal [$($alias:literal),*] $factor:expr, $source:expr
        $(, $convention:ident)? );+ $(;)?) => {
        &[$(
            Unit::row($measure, concat!($name, "/h"), &[$(concat!($alias, "/h")),*], per(3600.0, $factor), $source)$(.$convention())?,
            Unit::row($measure, concat!($name, "/s"), &[$(concat!($alias, "/s")),*], per(1.0, $factor), $source)$(.$convention())?,
            Unit::row($measure, concat!($name, "/min"), &[$(concat!($alias, "/min")),*], per(60.0, $factor), $source)$(.$convention())?,
            Unit::row($measure, concat!($name, "/d"), &[$(concat!($alias, "/d")),*], per(86_400.0, $factor), $source)$(.$convention())?,
        )+]
    };
}

#[rustfmt::skip]
pub(in super::super) static UNITS: &[Unit] = per_time![
    AmountRate "mol" [] (1.0, 1.0), SI;
    AmountRate "mmol" [] (1.0, 1e3), SI;
    AmountRate "kmol" ["KMOL"] (1e3, 1.0), SI;
    AmountRate "lbmol" ["LBMOL"] (a::POUND_MOLE_MOL, 1.0), SP811;
    AmountRate "Nm³" ["NM3", "m3(n)"] a::NORMAL_CUBIC_METRE, a::NORMAL_GAS, by_convention;
    AmountRate "Sm³" ["SM3"] a::STANDARD_CUBIC_METRE, a::ISO13443_GAS, by_convention;
    AmountRate "scf" ["SCF"] a::STANDARD_CUBIC_FOOT, a::US_GAS, by_convention;
    AmountRate "Mscf" ["MSCF"] a::THOUSAND_CUBIC_FEET, a::US_GAS, by_convention;
    AmountRate "MMscf" ["MMSCF"] a::MILLION_CUBIC_FEET, a::US_GAS, by_convention;
    MassRate "kg" [] (1.0, 1.0), SI;
    MassRate "g" [] (1.0, 1e3), SI;
    MassRate "mg" [] (1.0, 1e6), SI;
    MassRate "t" [] (1e3, 1.0), SI;
    MassRate "lb" [] (a::POUND_KG, 1.0), SP811;
];
