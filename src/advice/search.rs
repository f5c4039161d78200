//! Sampling a range, and the lowest point between samples.

use super::sweep::evenly;

/// Ends more than this factor apart are sampled evenly in the logarithm.
const DECADE: f64 = 10.0;

/// A number at so many settings from one end to the other, in that order.
pub(super) fn sampled(
    number: &mut impl FnMut(f64) -> Option<f64>,
    from: f64,
    to: f64,
    count: usize,
) -> Vec<(f64, Option<f64>)> {
    let mut settings = evenly(from, to, count);
    let wide = from > 0.0 && to > 0.0 && (from / to > DECADE || to / from > DECADE);
    if wide {
        let last = settings.len() - 1;
        let logarithms = evenly(libm::log(from), libm::log(to), count);
        for place in 1..last {
            settings[place] = libm::exp(logarithms[place]);
        }
    }
    settings.into_iter().map(|x| (x, number(x))).collect()
}

/// The inverse of the golden ratio.
const GOLDEN: f64 = 0.618_033_988_749_894_9;
/// Golden sections shrink a bracket to 1e-8 of itself in 38 steps; below that the rounding of a
/// smooth function hides its lowest point.
const SECTIONS: u32 = 40;

/// The lowest point of a function between `low` and `high`, seen to be low at `middle`, and the
/// function there; where the function has no value it counts as high.
///
/// Golden section: J. Kiefer, Proc. Amer. Math. Soc. 4 (1953) 502.
pub(super) fn lowest_between(
    mut function: impl FnMut(f64) -> Option<f64>,
    low: f64,
    middle: f64,
    high: f64,
) -> (f64, f64) {
    let mut value = |x: f64| function(x).unwrap_or(f64::MAX);
    let (mut a, mut b) = (low, high);
    let mut best = (middle, value(middle));
    let (mut c, mut d) = (b - GOLDEN * (b - a), a + GOLDEN * (b - a));
    let (mut at_c, mut at_d) = (value(c), value(d));
    for _ in 0..SECTIONS {
        for (x, at) in [(c, at_c), (d, at_d)] {
            if at < best.1 {
                best = (x, at);
            }
        }
        if at_c < at_d {
            (b, d, at_d) = (d, c, at_c);
            c = b - GOLDEN * (b - a);
            at_c = value(c);
        } else {
            (a, c, at_c) = (c, d, at_d);
            d = a + GOLDEN * (b - a);
            at_d = value(d);
        }
    }
    best
}
