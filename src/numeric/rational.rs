//! Exact fractions, for stoichiometric numbers.

use std::cmp::Ordering;
use std::fmt;

/// Why an exact fraction could not be formed.
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
pub enum RationalError {
    /// A numerator or denominator does not fit in an `i128`.
    Overflow,
    /// The denominator is zero.
    DivisionByZero,
    /// The text is not a number of a kind that is read.
    NotANumber,
}

/// An exact fraction of two whole numbers, in lowest terms, with a positive denominator.
///
/// Text is read as `3`, `0.5`, `1,5`, `.5`, `1/2`, `½`, `1 1/2`, `1½`, each with an optional sign,
/// and shown as `3`, `1/2` or `-3/2`. A result that does not fit is [`RationalError::Overflow`],
/// never a wrapped number.
///
/// ```
/// use shiftgauge::numeric::Rational;
/// let half: Rational = "0,5".parse().unwrap();
/// let third = Rational::new(1, 3).unwrap();
/// assert_eq!(half.plus(third).unwrap().to_string(), "5/6");
/// assert!(third < half);
/// ```
#[derive(Debug, Clone, Copy, PartialEq, Eq, Hash)]
pub struct Rational {
    numerator: i128,
    denominator: i128,
}

type Exact = Result<Rational, RationalError>;

impl Rational {
    /// Zero.
    pub const ZERO: Rational = Rational { numerator: 0, denominator: 1 };
    /// One.
    pub const ONE: Rational = Rational { numerator: 1, denominator: 1 };

    /// `numerator / denominator` in lowest terms.
    ///
    /// # Errors
    /// A zero denominator; a part whose magnitude in lowest terms is above `i128::MAX`.
    pub fn new(numerator: i128, denominator: i128) -> Exact {
        if denominator == 0 {
            return Err(RationalError::DivisionByZero);
        }
        let (top, bottom) = (numerator.unsigned_abs(), denominator.unsigned_abs());
        let divisor = greatest_common_divisor(top, bottom);
        let reduced = |part: u128| i128::try_from(part / divisor);
        let (Ok(top), Ok(bottom)) = (reduced(top), reduced(bottom)) else {
            return Err(RationalError::Overflow);
        };
        let negative = (numerator < 0) != (denominator < 0);
        Ok(Rational { numerator: if negative { -top } else { top }, denominator: bottom })
    }

    /// A whole number.
    #[must_use]
    pub fn whole(number: i64) -> Rational {
        Rational { numerator: i128::from(number), denominator: 1 }
    }

    /// The numerator, which carries the sign.
    #[must_use]
    pub fn numerator(self) -> i128 {
        self.numerator
    }

    /// The denominator, at least one.
    #[must_use]
    pub fn denominator(self) -> i128 {
        self.denominator
    }

    /// Whether it is zero.
    #[must_use]
    pub fn is_zero(self) -> bool {
        self.numerator == 0
    }

    /// Whether it is below zero.
    #[must_use]
    pub fn is_negative(self) -> bool {
        self.numerator < 0
    }

    /// The same magnitude with the other sign.
    #[must_use]
    pub fn negated(self) -> Rational {
        Rational { numerator: -self.numerator, ..self }
    }

    /// The magnitude.
    #[must_use]
    pub fn magnitude(self) -> Rational {
        if self.is_negative() { self.negated() } else { self }
    }

    /// The sum.
    ///
    /// # Errors
    /// Overflow.
    pub fn plus(self, other: Rational) -> Exact {
        let divisor = common(self.denominator, other.denominator);
        let (left, right) = (other.denominator / divisor, self.denominator / divisor);
        let top = checked(self.numerator.checked_mul(left))?;
        let addend = checked(other.numerator.checked_mul(right))?;
        let bottom = checked(self.denominator.checked_mul(left))?;
        Rational::new(checked(top.checked_add(addend))?, bottom)
    }

    /// The difference.
    ///
    /// # Errors
    /// Overflow.
    pub fn minus(self, other: Rational) -> Exact {
        self.plus(other.negated())
    }

    /// The product.
    ///
    /// # Errors
    /// Overflow.
    pub fn times(self, other: Rational) -> Exact {
        let across = common(self.numerator, other.denominator);
        let back = common(other.numerator, self.denominator);
        let top = (self.numerator / across).checked_mul(other.numerator / back);
        let bottom = (self.denominator / back).checked_mul(other.denominator / across);
        Rational::new(checked(top)?, checked(bottom)?)
    }

    /// The quotient.
    ///
    /// # Errors
    /// A divisor of zero; overflow.
    pub fn over(self, divisor: Rational) -> Exact {
        self.times(Rational::new(divisor.denominator, divisor.numerator)?)
    }

    /// The nearest double, within two units in its last place; always finite.
    #[must_use]
    pub fn to_f64(self) -> f64 {
        self.numerator as f64 / self.denominator as f64
    }
}

impl From<i32> for Rational {
    fn from(number: i32) -> Rational {
        Rational::whole(i64::from(number))
    }
}

impl PartialOrd for Rational {
    fn partial_cmp(&self, other: &Rational) -> Option<Ordering> {
        Some(self.cmp(other))
    }
}

impl Ord for Rational {
    /// Compares whole parts, then the reciprocals of what is left, so that nothing can overflow.
    fn cmp(&self, other: &Rational) -> Ordering {
        let (mut a, mut b) = (self.numerator, self.denominator);
        let (mut c, mut d) = (other.numerator, other.denominator);
        loop {
            let by_whole = a.div_euclid(b).cmp(&c.div_euclid(d));
            let (left, right) = (a.rem_euclid(b), c.rem_euclid(d));
            if by_whole != Ordering::Equal || left == 0 || right == 0 {
                return by_whole.then(left.signum().cmp(&right.signum()));
            }
            (a, b, c, d) = (d, right, b, left);
        }
    }
}

impl fmt::Display for Rational {
    fn fmt(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
        match self.denominator {
            1 => write!(f, "{}", self.numerator),
            bottom => write!(f, "{}/{bottom}", self.numerator),
        }
    }
}

fn checked(value: Option<i128>) -> Result<i128, RationalError> {
    value.ok_or(RationalError::Overflow)
}

/// The greatest common divisor of two stored parts, whose magnitudes fit in an `i128`.
fn common(a: i128, b: i128) -> i128 {
    let divisor = greatest_common_divisor(a.unsigned_abs(), b.unsigned_abs());
    i128::try_from(divisor).unwrap_or(1)
}

/// Euclid's algorithm; at least one, so that it can be divided by.
pub(super) fn greatest_common_divisor(mut a: u128, mut b: u128) -> u128 {
    while b != 0 {
        if let (Ok(small), Ok(other)) = (u64::try_from(a), u64::try_from(b)) {
            return u128::from(in_one_word(small, other));
        }
        (a, b) = (b, a % b);
    }
    a.max(1)
}

/// The same in one machine word, which nearly every call fits in and which is many times faster.
fn in_one_word(mut a: u64, mut b: u64) -> u64 {
    while b != 0 {
        (a, b) = (b, a % b);
    }
    a.max(1)
}
