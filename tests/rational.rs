//! Exact fractions: reading, showing, order, and the named outcomes.

use shiftgauge::numeric::{Rational, RationalError, null_space, rank};

fn read(text: &str) -> Result<String, RationalError> {
    text.parse::<Rational>().map(|number| number.to_string())
}

#[test]
fn numbers_are_read_exactly() {
    let rows = [
        ("3", "3"),
        ("0.5", "1/2"),
        ("1,5", "3/2"),
        (".5", "1/2"),
        ("½", "1/2"),
        ("1½", "3/2"),
        ("1 ½", "3/2"),
        ("1/2", "1/2"),
        ("1 1/2", "3/2"),
        ("1⁄3", "1/3"),
        ("6/4", "3/2"),
        ("⅔", "2/3"),
        ("0.947", "947/1000"),
        ("-3/2", "-3/2"),
        ("−2", "-2"),
        ("+4", "4"),
        ("0.0", "0"),
        ("007", "7"),
    ];
    for (text, expected) in rows {
        assert_eq!(read(text).as_deref(), Ok(expected), "{text}");
    }
}

#[test]
fn what_is_no_number_has_a_name() {
    use RationalError::{DivisionByZero, NotANumber, Overflow};
    let long = "9".repeat(60);
    let rows = [
        ("", NotANumber),
        ("x", NotANumber),
        ("1.", NotANumber),
        ("1.2.3", NotANumber),
        ("1/2/3", NotANumber),
        ("2 2", NotANumber),
        ("1/0", DivisionByZero),
        (long.as_str(), Overflow),
        ("0.0000000000000000000000000000000000000000000000000001", Overflow),
    ];
    for (text, expected) in rows {
        assert_eq!(read(text), Err(expected), "{text}");
    }
}

#[test]
fn arithmetic_is_exact_and_overflow_is_named() {
    let big = Rational::new(i128::MAX, 1).unwrap();
    let third = Rational::new(1, 3).unwrap();
    assert_eq!(big.plus(Rational::ONE), Err(RationalError::Overflow));
    assert_eq!(big.times(third).and_then(|part| part.over(third)), Ok(big));
    assert_eq!(Rational::new(i128::MIN, 1), Err(RationalError::Overflow));
    assert_eq!(Rational::new(i128::MIN, 2).unwrap().to_string(), (i128::MIN / 2).to_string());
    assert_eq!(Rational::ONE.over(Rational::ZERO), Err(RationalError::DivisionByZero));
    assert_eq!(Rational::new(2, -4).unwrap().to_string(), "-1/2");
    assert_eq!(Rational::new(3, 8).unwrap().to_f64(), 0.375);
}

#[test]
fn order_holds_even_where_cross_products_would_overflow() {
    let max = i128::MAX;
    let ordered = [
        Rational::new(-max, 3).unwrap(),
        Rational::new(-1, 2).unwrap(),
        Rational::new(-1, max).unwrap(),
        Rational::ZERO,
        Rational::new(1, max).unwrap(),
        Rational::new(1, max - 1).unwrap(),
        Rational::new(max - 2, max - 1).unwrap(),
        Rational::new(max - 1, max).unwrap(),
        Rational::ONE,
        Rational::new(max, max - 1).unwrap(),
    ];
    for (low, left) in ordered.iter().enumerate() {
        for (high, right) in ordered.iter().enumerate() {
            assert_eq!(left.cmp(right), low.cmp(&high), "{left} against {right}");
        }
    }
}

#[test]
fn a_matrix_times_its_null_space_is_zero() {
    let mut state = 0x9E37_79B9_7F4A_7C15_u64;
    let mut next = move || {
        state ^= state << 13;
        state ^= state >> 7;
        state ^= state << 17;
        Rational::new(i128::from(state % 13) - 6, i128::from(state / 16 % 3) + 1).unwrap()
    };
    for case in 0..200 {
        let (height, width) = (1 + case % 5, 1 + case % 7);
        let matrix: Vec<Vec<Rational>> =
            (0..height).map(|_| (0..width).map(|_| next()).collect()).collect();
        let basis = null_space(&matrix, width).unwrap();
        assert_eq!(rank(&matrix).unwrap() + basis.len(), width, "case {case}");
        for (vector, row) in basis.iter().flat_map(|v| matrix.iter().map(move |r| (v, r))) {
            let sum = vector
                .iter()
                .zip(row)
                .fold(Rational::ZERO, |sum, (x, a)| sum.plus(x.times(*a).unwrap()).unwrap());
            assert!(sum.is_zero(), "case {case}");
        }
    }
}
