//! Laws of quantities, over seeded random ones: what is shown reads back, and nothing panics.

use shiftgauge::problem::words;
use shiftgauge::quantity::{
    Measure, PressureReference, Unit, all_units, limit, parse, read_number, show, show_like,
    show_number, show_pair,
};
use std::time::{Duration, Instant};

/// A small generator (xorshift64*, Vigna 2016), so that a failure can be run again.
struct Random(u64);

impl Random {
    fn next(&mut self) -> u64 {
        self.0 ^= self.0 >> 12;
        self.0 ^= self.0 << 25;
        self.0 ^= self.0 >> 27;
        self.0.wrapping_mul(0x2545_f491_4f6c_dd1d)
    }

    fn below(&mut self, count: usize) -> usize {
        (self.next() % count as u64) as usize
    }

    fn unit_interval(&mut self) -> f64 {
        (self.next() >> 11) as f64 / (1u64 << 53) as f64
    }

    fn pick<'a, T>(&mut self, items: &'a [T]) -> &'a T {
        &items[self.below(items.len())]
    }
}

/// A value inside the range of the unit's measure, over many decades.
fn value_si(random: &mut Random, unit: &Unit) -> f64 {
    let row = limit(unit.measure, PressureReference::Unstated);
    let top = row.maximum_si.min(1e15);
    let size = top * libm::exp10(-12.0 * random.unit_interval());
    let value = if random.below(2) == 0 { size } else { -size };
    if row.contains(value) { value } else { size }
}

#[test]
fn a_number_shown_exactly_reads_back_to_the_last_bit() {
    let mut random = Random(7);
    for _ in 0..100_000 {
        let value = f64::from_bits(random.next());
        if value.is_finite() {
            let text = show_number(value, 17);
            assert_eq!(read_number(&text).unwrap().value, value, "{text}");
        }
    }
}

#[test]
fn a_value_shown_in_any_unit_reads_back() {
    let mut random = Random(11);
    let units: Vec<&Unit> = all_units().collect();
    let mut worst: (f64, String) = (0.0, String::new());
    for _ in 0..40_000 {
        let unit = *random.pick(&units);
        let value = value_si(&mut random, unit);
        let text = show(value, unit, 17);
        let read = parse(&text, &[unit.measure]).unwrap_or_else(|e| panic!("{text}: {e:?}"));
        assert_eq!(read.unit, unit, "{text}");
        let is_si = unit.to_si(1.0) == 1.0;
        if is_si {
            assert_eq!(read.value_si, value, "{text}");
        }
        // two roundings there and two back; a temperature loses by the size of its offset
        let size = value.abs() + unit.difference_to_si(unit.zero_offset);
        let error = (read.value_si - value).abs() / size;
        assert!(error <= 4.0 * f64::EPSILON, "{text} is off by {error:e}");
        if error > worst.0 {
            worst = (error, text);
        }
    }
    println!("worst relative error {:e} at {}", worst.0, worst.1);
}

#[test]
fn a_typed_quantity_shown_as_typed_is_the_same_quantity() {
    let mut random = Random(13);
    let units: Vec<&Unit> = all_units().filter(|unit| unit.measure != Measure::Ph).collect();
    for _ in 0..40_000 {
        let unit = *random.pick(&units);
        let digits = 1 + random.below(6);
        let number = show_number(unit.from_si(value_si(&mut random, unit)), digits);
        let width = show_number(random.unit_interval() * 10.0, 2);
        let tolerance = match random.below(3) {
            0 => String::new(),
            1 => format!(" ± {width}"),
            _ => format!(" ± {width} % rel"),
        };
        let typed = format!("{number}{tolerance} {}", unit.symbol);
        // rounding may carry a value past the end of its range
        let Ok(first) = parse(&typed, &[unit.measure]) else { continue };
        let shown = show_like(&first);
        let again = parse(&shown, &[unit.measure]).unwrap_or_else(|e| panic!("{shown}: {e:?}"));
        let close = |a: f64, b: f64| (a - b).abs() <= 1e-14 * a.abs();
        assert!(close(first.value_si, again.value_si), "{typed} came back as {shown}");
        let u = |quantity: shiftgauge::quantity::Quantity| quantity.standard_uncertainty_si;
        assert_eq!(u(first).is_some(), u(again).is_some(), "{typed} came back as {shown}");
        let (a, b) = (u(first).unwrap_or(0.0), u(again).unwrap_or(0.0));
        assert!((a - b).abs() <= 1e-12 * a, "{typed} came back as {shown}: {a} {b}");
        assert_eq!(show_like(&again), shown, "{typed}");
    }
}

#[test]
fn two_numbers_apart_by_more_than_a_rounding_look_apart() {
    let mut random = Random(17);
    let units: Vec<&Unit> = all_units().filter(|unit| unit.zero_offset == 0.0).collect();
    for _ in 0..20_000 {
        let unit = *random.pick(&units);
        let a = value_si(&mut random, unit);
        let b = a * (1.0 + libm::exp10(-14.0 * random.unit_interval()) * 0.5);
        let (shown_a, shown_b) = show_pair(a, b, unit, 3);
        assert_ne!(shown_a, shown_b, "{a:e} and {b:e}");
    }
}

/// Texts from pieces that the grammar knows, pieces that it does not, and any characters at all.
fn any_text(random: &mut Random) -> String {
    let pieces = [
        "1",
        "23",
        "4.5",
        "1,234",
        " ",
        "\u{a0}",
        "\u{202f}",
        "e",
        "E-3",
        "×10",
        "^",
        "⁻³",
        "-",
        "−",
        "±",
        "+/-",
        "<",
        "≥",
        "(",
        ")",
        "rel",
        "%",
        "% rel",
        "ppm",
        "bar",
        "(g)",
        "bar(a)",
        "°C",
        "K",
        "psi",
        "pH",
        "ph ",
        "J/(mol·K)",
        "/",
        "·",
        "mol",
        "Nm³",
        "/h",
        "scfm",
        "type ",
        "class ",
        "Pt100",
        ".",
        ",",
        "'",
        "µ",
        "😀",
        "e\u{301}",
        "\0",
        "٣",
        "ß",
        "İ",
        "\u{212a}",
    ];
    let mut text = String::new();
    if random.below(2) == 0 {
        text.push_str(&likely_text(random));
    }
    for _ in 0..random.below(5) {
        if random.below(6) == 0 {
            let code = (random.next() % 0x11_0000) as u32;
            text.push(char::from_u32(code).unwrap_or('\u{fffd}'));
        } else {
            text.push_str(random.pick::<&str>(&pieces));
        }
    }
    text
}

/// A text that is nearly always a quantity of some measure.
fn likely_text(random: &mut Random) -> String {
    let bound = *random.pick(&["", "", "", "<", "≤ ", "pH "]);
    let number =
        *random.pick(&["0", "0.5", "0,02", "7.2", "1 234,5", "2e-3", "−3", "9×10⁻³", ".1"]);
    let unit =
        *random.pick(&["", " ", "%", " ppm", " bar(g)", " K", "°F", " psig", " kmol/h", "mol"]);
    let sign = *random.pick(&["", "", " ± ", "+/-"]);
    let width =
        if sign.is_empty() { "" } else { *random.pick(&["0.1", "0,2", "3", "2 rel", "1 % rel"]) };
    format!("{bound}{number}{sign}{width}{unit}")
}

#[test]
fn no_input_panics_and_every_answer_is_finite_or_a_problem_in_its_place() {
    // unoptimised code takes about six times as long
    const COUNT: usize = if cfg!(debug_assertions) { 50_000 } else { 200_000 };
    let mut random = Random(19);
    let mut read = 0;
    let mut taken = Duration::ZERO;
    for _ in 0..COUNT {
        let text = any_text(&mut random);
        let pair = [*random.pick(&Measure::ALL), *random.pick(&Measure::ALL)];
        let allowed = if random.below(2) == 0 { &pair[..] } else { &Measure::ALL[..] };
        let started = Instant::now();
        let outcome = parse(&text, allowed);
        taken += started.elapsed();
        match outcome {
            Ok(quantity) => {
                read += 1;
                assert!(quantity.value_si.is_finite(), "{text:?}");
                let u = quantity.standard_uncertainty_si.unwrap_or(0.0);
                assert!(u.is_finite() && u >= 0.0, "{text:?}");
                assert!(allowed.contains(&quantity.measure), "{text:?}");
                let shown = show_like(&quantity);
                assert!(parse(&shown, allowed).is_ok(), "{text:?} came back as {shown:?}");
            }
            Err(problems) => {
                assert!(!problems.is_empty(), "{text:?}");
                let length = text.encode_utf16().count();
                for problem in problems {
                    let inside = problem.span.is_none_or(|span| span.end <= length);
                    assert!(inside, "{text:?}: {problem:?}");
                    let sentence = words::say(&problem, words::Language::En);
                    assert!(!sentence.message.is_empty(), "{text:?}");
                }
            }
        }
    }
    println!("{read} of {COUNT} read, in {taken:?}");
    assert!(read > COUNT / 100, "only {read} texts were read");
}
