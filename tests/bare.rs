//! The two calls on bare numbers: what they answer, and every mistake they name.

use shiftgauge::equilibrium::{
    Affinity, BareProblem, BareReaction, BareSpecies, Hold, affinities, rest_of,
};
use shiftgauge::problem::{Problem, words};
use shiftgauge::reaction::Phase;

fn species(phase: Phase, amount_mol: f64) -> BareSpecies {
    BareSpecies { name: format!("{} {amount_mol}", phase.symbol()), phase, amount_mol }
}

/// A(g) = B(g) with an inert gas.
fn sound() -> BareProblem {
    BareProblem {
        species: vec![species(Phase::Gas, 1.0), species(Phase::Gas, 0.0), species(Phase::Gas, 2.0)],
        reactions: vec![BareReaction { nu: vec![-1.0, 1.0, 0.0], ln_k: 0.0 }],
        temperature_k: 400.0,
        hold: Hold::Pressure { pressure_pa: 1e5 },
    }
}

type Row = (&'static str, &'static str, fn(&mut BareProblem));

/// The code, the field, and what is done to a sound problem.
const MISTAKES: [Row; 18] = [
    ("lengths-differ", "reactions[0].nu", |p| p.reactions[0].nu = vec![-1.0, 1.0]),
    ("number-not-finite", "reactions[0].nu[1]", |p| p.reactions[0].nu[1] = f64::NAN),
    ("nu-out-of-range", "reactions[0].nu[0]", |p| p.reactions[0].nu[0] = -2000.0),
    ("nu-out-of-range", "reactions[0].nu[1]", |p| p.reactions[0].nu[1] = 1e-9),
    ("nothing-reacts", "reactions[0].nu", |p| p.reactions[0].nu = vec![0.0; 3]),
    ("ln-k-out-of-range", "reactions[0].ln_k", |p| p.reactions[0].ln_k = 2e5),
    ("number-not-finite", "reactions[0].ln_k", |p| p.reactions[0].ln_k = f64::INFINITY),
    ("no-reaction", "reactions", |p| p.reactions.clear()),
    ("many-reactions", "reactions", |p| p.reactions.push(p.reactions[0].clone())),
    ("amount-out-of-range", "species[2].amount_mol", |p| p.species[2].amount_mol = -1e-9),
    ("amount-out-of-range", "species[2].amount_mol", |p| p.species[2].amount_mol = 1e301),
    ("number-not-finite", "species[0].amount_mol", |p| p.species[0].amount_mol = f64::NAN),
    ("temperature-not-positive", "temperature_k", |p| p.temperature_k = 0.0),
    ("number-not-finite", "temperature_k", |p| p.temperature_k = f64::INFINITY),
    ("pressure-not-positive", "pressure_pa", |p| p.hold = Hold::Pressure { pressure_pa: -1.0 }),
    ("volume-not-positive", "volume_m3", |p| p.hold = Hold::Volume { volume_m3: 0.0 }),
    ("solutes-with-gas", "species", |p| {
        p.species[2].phase = Phase::Aqueous;
        p.hold = Hold::Volume { volume_m3: 1.0 };
    }),
    ("solutes-hold-pressure", "hold", |p| {
        p.species.iter_mut().for_each(|species| species.phase = Phase::Aqueous);
    }),
];

fn shown(problems: &[Problem]) -> Vec<(&'static str, &str)> {
    problems.iter().map(|problem| (problem.code.as_str(), problem.field.as_str())).collect()
}

#[test]
fn each_mistake_has_its_code_its_field_and_its_sentences() {
    for (code, field, spoil) in MISTAKES {
        let mut problem = sound();
        spoil(&mut problem);
        let found = rest_of(&problem).unwrap_err();
        assert_eq!(shown(&found), [(code, field)]);
        let said = words::say(&found[0], words::Language::En);
        assert!(!said.message.contains('{') && !said.hint.contains('{'), "{said:?}");
        assert!(said.message.ends_with('.') && said.hint.ends_with('.'), "{said:?}");
    }
}

#[test]
fn all_mistakes_are_reported_at_once() {
    let mut problem = sound();
    problem.species[0].amount_mol = -1.0;
    problem.temperature_k = -5.0;
    problem.reactions[0].ln_k = f64::NAN;
    let expected = [
        ("number-not-finite", "reactions[0].ln_k"),
        ("amount-out-of-range", "species[0].amount_mol"),
        ("temperature-not-positive", "temperature_k"),
    ];
    assert_eq!(shown(&rest_of(&problem).unwrap_err()), expected);
    assert_eq!(shown(&affinities(&problem).unwrap_err()), expected);
}

#[test]
fn affinities_are_given_for_many_reactions_with_names_for_their_open_ends() {
    let mut problem = sound();
    let mut add = |nu: [f64; 3]| {
        problem.reactions.push(BareReaction { nu: nu.to_vec(), ln_k: 1.5 });
    };
    add([1.0, -1.0, 0.0]);
    add([-1.0, 0.0, 1.0]);
    add([0.0, -1.0, 0.0]);
    let found = affinities(&problem).unwrap();
    let expected = 1.5 - std::f64::consts::LN_2;
    assert_eq!(found[0], Affinity::OpenForward);
    assert_eq!(found[1], Affinity::OpenReverse);
    assert!(matches!(found[2], Affinity::Finite(x) if (x - expected).abs() < 1e-15), "{found:?}");
    assert_eq!(found[3], Affinity::OpenReverse);
    let texts: Vec<String> =
        found.iter().map(|affinity| serde_json::to_string(affinity).unwrap()).collect();
    assert_eq!(texts[0], r#"{"affinity":"open-forward"}"#);
    assert!(texts[2].starts_with(r#"{"affinity":"finite","over_rt":0.80685"#), "{}", texts[2]);
}

#[test]
fn what_is_used_up_is_marked_and_what_is_absent_is_not() {
    let problem = BareProblem {
        species: vec![
            species(Phase::Solid, 1.0),
            species(Phase::Gas, 2.0),
            species(Phase::Gas, 0.0),
            species(Phase::Gas, 0.0),
        ],
        // C(s) + A(g) = 2 B(g), far forward: the solid goes first.
        reactions: vec![BareReaction { nu: vec![-1.0, -1.0, 2.0, 0.0], ln_k: 30.0 }],
        temperature_k: 1200.0,
        hold: Hold::Pressure { pressure_pa: 1e5 },
    };
    let end = rest_of(&problem).unwrap();
    let text = serde_json::to_string(&end).unwrap();
    assert!(text.contains(r#""outcome":"phase exhausted""#), "{text}");
    let exhausted: Vec<bool> = end.species.iter().map(|species| species.exhausted).collect();
    assert_eq!(exhausted, [true, false, false, false]);
    let amounts: Vec<f64> = end.species.iter().map(|species| species.amount_mol).collect();
    assert_eq!(amounts, [0.0, 1.0, 2.0, 0.0]);
    assert_eq!(end.extents_mol, [1.0]);
}
