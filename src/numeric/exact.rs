//! Sums and products whose rounding error is kept.
//!
//! The methods are T. J. Dekker, "A floating-point technique for extending the available
//! precision", Numer. Math. 18 (1971) 224, and D. E. Knuth, The Art of Computer Programming,
//! volume 2, section 4.2.2. Dekker's product is used rather than a fused multiply-add because
//! WebAssembly has no such instruction and its emulation is slow.

/// Splits a sum into its rounded value and its rounding error: a + b = sum + error exactly.
///
/// Holds for finite a and b whose sum does not overflow.
///
/// ```
/// use shiftgauge::numeric::two_sum;
/// assert_eq!(two_sum(1.0, 1e-30), (1.0, 1e-30));
/// ```
#[inline(always)]
#[must_use]
pub fn two_sum(a: f64, b: f64) -> (f64, f64) {
    let sum = a + b;
    let b_part = sum - a;
    let a_part = sum - b_part;
    (sum, (a - a_part) + (b - b_part))
}

/// Splits a product into its rounded value and its rounding error: a b = product + error exactly.
///
/// Holds while |a|, |b| and |a b| stay between 1e-140 and 1e290; outside that the error may be
/// lost, and above 1e300 it is no number, so callers scale first.
///
/// ```
/// use shiftgauge::numeric::two_product;
/// let x = 1.0 + f64::EPSILON;
/// assert_eq!(two_product(x, x), (1.0 + 2.0 * f64::EPSILON, f64::EPSILON * f64::EPSILON));
/// ```
#[inline(always)]
#[must_use]
pub fn two_product(a: f64, b: f64) -> (f64, f64) {
    let product = a * b;
    let (a_high, a_low) = halves(a);
    let (b_high, b_low) = halves(b);
    let error = ((a_high * b_high - product) + a_high * b_low + a_low * b_high) + a_low * b_low;
    (product, error)
}

/// A number as the sum of two of 26 bits each, so that their products are exact.
#[inline(always)]
fn halves(x: f64) -> (f64, f64) {
    let spread = 134_217_729.0 * x; // 2^27 + 1
    let high = spread - (spread - x);
    (high, x - high)
}

/// a b − c d to within one rounding, however much cancels; its sign and its zero are exact.
///
/// Same range as [`two_product`].
///
/// ```
/// use shiftgauge::numeric::difference_of_products;
/// // As doubles, three times 0.1 is above 0.3 by 2^-55; plain arithmetic gives twice that.
/// assert_eq!(difference_of_products(0.1, 3.0, 0.3, 1.0), f64::EPSILON / 8.0);
/// assert_eq!(0.1 * 3.0 - 0.3, f64::EPSILON / 4.0);
/// ```
#[inline(always)]
#[must_use]
pub fn difference_of_products(a: f64, b: f64, c: f64, d: f64) -> f64 {
    let (first, first_error) = two_product(a, b);
    let (second, second_error) = two_product(c, d);
    let (high, high_error) = two_sum(first, -second);
    let (low, low_error) = two_sum(first_error, -second_error);
    // The parts that are left may still cancel, so the largest is added last.
    let (middle, middle_error) = two_sum(high_error, low);
    let (sum, sum_error) = two_sum(high, middle);
    sum + (sum_error + (middle_error + low_error))
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn a_difference_far_below_the_rounding_of_its_products_is_exact() {
        let step = f64::EPSILON;
        // (1 + e)(1 − e) − 1·1 = −e²
        let found = difference_of_products(1.0 + step, 1.0 - step, 1.0, 1.0);
        assert_eq!(found, -step * step);
        assert_eq!(difference_of_products(0.3, 7.0, 7.0, 0.3), 0.0);
    }
}
