//! Products of powers over any range, and their logarithm with little rounding.
//!
//! The logarithm of a product of amounts is needed near a root, where it nearly cancels ln K. A
//! sum of logarithms would carry the rounding of each of them (1e-13 where amounts are near
//! 1e-300). Here the mantissas are multiplied, the exponents of two are added as whole numbers, and
//! one logarithm is taken of a number near one.

// The small functions of this room that the solver calls are inlined by order: a build for size
// would keep them apart, and a call costs more than they do.

/// ln 2 with 33 bits, so that its product with a whole number below 2^20 is exact.
const LN_2_HIGH: f64 = f64::from_bits(0x3FE6_2E42_FEE0_0000);
/// ln 2 − `LN_2_HIGH`.
const LN_2_LOW: f64 = 1.908_214_929_270_587_7e-10;
/// ln 2 less the double nearest to it.
pub const LN_2_TAIL: f64 = 2.319_046_813_846_299_6e-17;

const MANTISSA: u64 = (1 << 52) - 1;
const ONE: u64 = 1023 << 52;

/// Splits a positive finite number into a mantissa from 1 up to 2 and its exponent of two.
///
/// ```
/// use shiftgauge::numeric::split;
/// assert_eq!(split(12.0), (1.5, 3));
/// assert_eq!(split(5e-324), (1.0, -1074));
/// ```
#[inline(always)]
#[must_use]
pub fn split(x: f64) -> (f64, i32) {
    let bits = x.to_bits();
    let exponent = (bits >> 52) as i32;
    if exponent == 0 {
        let bits = (x * 18_014_398_509_481_984.0).to_bits(); // 2^54
        return (f64::from_bits(bits & MANTISSA | ONE), (bits >> 52) as i32 - 1023 - 54);
    }
    (f64::from_bits(bits & MANTISSA | ONE), exponent - 1023)
}

/// x 2^exponent, exact unless the result is below 2.2e-308; above the range it is infinite.
#[inline(always)]
#[must_use]
pub fn times_power_of_two(x: f64, exponent: i32) -> f64 {
    if (-1022..=1023).contains(&exponent) {
        return x * f64::from_bits(((exponent + 1023) as u64) << 52);
    }
    libm::scalbn(x, exponent)
}

/// A positive number as a ratio of two products of mantissas and a power of two.
///
/// ```
/// use shiftgauge::numeric::Scaled;
/// // (1e300)^3 / (1e-300)^2 has a logarithm though no double holds it.
/// let product = Scaled::ONE.times(1e300, 3).times(1e-300, -2);
/// assert!((product.ln_less(0.0) - 3453.877639491068).abs() < 1e-11);
/// ```
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct Scaled {
    over: f64,
    under: f64,
    exponent: i64,
}

impl Scaled {
    /// The number one.
    pub const ONE: Scaled = Scaled { over: 1.0, under: 1.0, exponent: 0 };

    /// Multiplies by a positive finite x to a whole power.
    ///
    /// The powers of one product, taken without sign, must add to less than 500.
    #[inline(always)]
    #[must_use]
    pub fn times(mut self, x: f64, power: i32) -> Scaled {
        let (mantissa, exponent) = split(x);
        self.exponent += i64::from(power) * i64::from(exponent);
        let raised = match power.unsigned_abs() {
            1 => mantissa,
            2 => mantissa * mantissa,
            3 => mantissa * mantissa * mantissa,
            count => whole_power(mantissa, count),
        };
        if power < 0 {
            self.under *= raised;
        } else {
            self.over *= raised;
        }
        self
    }

    /// Multiplies by another product.
    #[must_use]
    pub fn and(mut self, other: Scaled) -> Scaled {
        self.over *= other.over;
        self.under *= other.under;
        self.exponent += other.exponent;
        self
    }

    /// Multiplies by a whole power of two.
    #[inline(always)]
    #[must_use]
    pub fn times_two_to(mut self, exponent: i64) -> Scaled {
        self.exponent += exponent;
        self
    }

    /// The logarithm less a number: ln(self) − y.
    ///
    /// Where the two nearly cancel the result is good to a few units of 1e-16, however large they
    /// are, as long as the exponent is below 2^20.
    #[inline(always)]
    #[must_use]
    pub fn ln_less(self, y: f64) -> f64 {
        let exponent = self.exponent as f64;
        (exponent * LN_2_HIGH - y) + (exponent * LN_2_LOW + libm::log(self.over / self.under))
    }
}

fn whole_power(mut base: f64, mut count: u32) -> f64 {
    let mut raised = 1.0;
    while count > 0 {
        if count & 1 == 1 {
            raised *= base;
        }
        base *= base;
        count >>= 1;
    }
    raised
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn the_parts_of_ln_2_belong_together() {
        assert_eq!(LN_2_HIGH + LN_2_LOW, std::f64::consts::LN_2);
        assert_eq!(LN_2_HIGH.to_bits() & ((1 << 20) - 1), 0);
    }

    #[test]
    fn powers_of_every_sign_and_size_multiply() {
        for power in -9..=9 {
            let product = Scaled::ONE.times(1.7, power).times(1e-310, 1).times(1e-310, -1);
            let expected = f64::from(power) * libm::log(1.7);
            assert!((product.ln_less(0.0) - expected).abs() < 1e-14, "{power}");
        }
    }

    #[test]
    fn a_power_of_two_is_applied_beyond_the_range_of_one_double() {
        assert_eq!(times_power_of_two(5e-324, 2000), libm::scalbn(5e-324, 2000));
        assert_eq!(times_power_of_two(1.5, -3), 0.1875);
    }
}
