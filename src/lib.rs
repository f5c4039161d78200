//! Shiftgauge: where a reaction stops, and whether it has got there.
//!
//! A room may use the rooms above it in this list and none below; a test holds them to it.
//!
//! | room | purpose |
//! | --- | --- |
//! | [`problem`] | an error is data: code, arguments, field, span; the sentences |
//! | [`quantity`] | text to SI and back: numbers with units and tolerance |
//! | [`numeric`] | no chemistry: roots, linear algebra, exact rationals, sums in ln space |
//! | [`reaction`] | elements, formulas, species names, equations, balancing |
//! | [`library`] | what is known of each species, with ranges and sources |
//! | [`constant`] | K at a temperature, and its forms |
//! | [`mixture`] | readings to amounts and activities |
//! | [`equilibrium`] | Q, affinities, rest |
//! | [`advice`] | what the numbers mean for the plant |
//! | [`case`] | the case file, the report, and the run from one to the other |
//! | [`rounds`] | many readings judged by one case |

pub mod advice;
#[cfg(feature = "bench")]
pub mod bench;
pub mod case;
pub mod constant;
pub mod equilibrium;
pub mod library;
pub mod mixture;
pub mod numeric;
pub mod problem;
pub mod quantity;
pub mod reaction;
pub mod rounds;
#[cfg(target_arch = "wasm32")]
mod web;
