//! The library's records: they reproduce their table, join without a step, and are found by name.

use shiftgauge::library;
use shiftgauge::library::{Combination, Reach, Record, Temperature};
use shiftgauge::problem::Outcome;
use shiftgauge::reaction::Phase;

/// The record of a table id; a test that names an unknown one fails.
pub fn record(id: &str) -> &'static Record {
    library::all().find(|record| record.id == id).unwrap_or_else(|| panic!("no record {id}"))
}

/// Reads `-1 SO2.g 1 SO3.g` into a combination, with the change of gas moles.
pub fn combination(text: &str) -> (Combination, f64) {
    let words: Vec<&str> = text.split_whitespace().collect();
    let terms: Vec<(&'static Record, f64)> =
        words.chunks(2).map(|pair| (record(pair[1]), pair[0].parse().unwrap())).collect();
    let gas = terms.iter().filter(|(record, _)| record.phase == Phase::Gas);
    let delta_nu_gas = gas.map(|(_, nu)| nu).sum();
    (Combination::new(&terms).unwrap(), delta_nu_gas)
}

/// A temperature that is known to be allowed.
pub fn kelvin(t: f64) -> Temperature {
    Temperature::new(t).unwrap()
}

/// The rows of a published table: its lines without comments and head, cut at the tabs.
pub fn rows(text: &'static str) -> Vec<Vec<&'static str>> {
    let lines = text.lines().filter(|line| !line.starts_with('#')).skip(1);
    lines.map(|line| line.split('\t').collect()).collect()
}

#[test]
fn every_line_of_the_species_table_is_a_record_with_a_known_source() {
    let table = include_str!("../src/library/tables/species.tsv");
    assert_eq!(library::all().count(), table.lines().count() - 1);
    for record in library::all() {
        assert!(!record.sources.is_empty(), "{}", record.id);
        assert_eq!(record.citations().count(), record.sources.len(), "{}", record.id);
        assert!(!record.names[0].is_empty(), "{}", record.id);
        let formula = shiftgauge::reaction::parse_formula(&record.formula).unwrap();
        let line =
            table.lines().find(|line| line.starts_with(&format!("{}\t", record.id))).unwrap();
        assert_eq!(line.split('\t').nth(6), Some(formula.hill().as_str()), "{}", record.id);
        let form = record.form.as_ref().map_or(String::new(), |form| format!(".{form}"));
        let id = format!("{}.{}{form}", record.formula, record.phase.symbol());
        assert_eq!(record.id, id);
    }
}

#[test]
fn the_tables_are_sorted_and_every_heat_line_belongs_to_a_species() {
    for (name, text) in [
        ("species", include_str!("../src/library/tables/species.tsv")),
        ("heat", include_str!("../src/library/tables/heat.tsv")),
        ("sources", include_str!("../src/library/tables/sources.tsv")),
    ] {
        let ids: Vec<&str> = rows(text).into_iter().map(|row| row[0]).collect();
        assert!(ids.is_sorted(), "{name}.tsv is not sorted by its first column");
        if name == "heat" {
            assert!(ids.iter().all(|id| library::all().any(|record| record.id == *id)));
        }
        if name != "heat" {
            assert!(ids.windows(2).all(|pair| pair[0] < pair[1]), "{name}.tsv repeats an id");
        }
    }
    for row in rows(include_str!("../src/library/tables/heat.tsv")) {
        assert!(library::citation(row[12]).is_some(), "{} names no source", row[0]);
    }
}

#[test]
fn enthalpy_and_entropy_at_298_kelvin_are_those_of_the_table() {
    for record in library::all() {
        let at = record.properties(Temperature::standard());
        let enthalpy_error = at.enthalpy_j_per_mol - record.formation_enthalpy_j_per_mol;
        let entropy_error = at.entropy_j_per_mol_k - record.standard_entropy_j_per_mol_k;
        assert!(enthalpy_error.abs() < 1e-3, "{}: {enthalpy_error} J/mol", record.id);
        assert!(entropy_error.abs() < 6e-4, "{}: {entropy_error} J/(mol K)", record.id);
    }
}

#[test]
fn elements_in_their_reference_states_have_no_enthalpy_at_298_kelvin() {
    let elements = [
        "H2.g",
        "O2.g",
        "N2.g",
        "Cl2.g",
        "Ar.g",
        "He.g",
        "C.s.graphite",
        "S.s.rhombic",
        "Fe.s",
        "F2.g",
        "Br2.l",
        "I2.s",
        "Hg.l",
        "Zn.s",
        "Cu.s",
        "Ni.s",
        "Al.s",
        "Si.s",
    ];
    for id in elements {
        let at = record(id).properties(Temperature::standard());
        assert!(at.enthalpy_j_per_mol.abs() < 1e-6, "{id}: {}", at.enthalpy_j_per_mol);
        assert_eq!(record(id).u_gibbs_j_per_mol, 0.0, "{id}");
    }
}

#[test]
fn gibbs_energy_is_continuous_everywhere_and_the_rest_but_at_transitions() {
    // Transitions: H° and S° jump there by the published amount, in J/mol.
    let table = rows(include_str!("published/transitions.tsv"));
    let figure = |text: &str| text.parse::<f64>().unwrap();
    let transitions: Vec<(&str, f64, f64)> =
        table.iter().map(|row| (row[0], figure(row[1]), figure(row[2]))).collect();
    // At the peak of a lambda transition Cp alone steps.
    let lambda = [
        ("Fe.s", 1042.0),
        ("Fe3O4.s", 900.0),
        ("Fe2O3.s", 1050.0),
        ("S.l", 432.02),
        ("Ni.s", 631.0),
        ("NiO.s", 525.0),
        ("NiO.s", 565.0),
        ("Ba.s", 582.53), // transitions without an enthalpy in JANAF's table
        ("Ba.s", 768.13),
        ("Zn.l", 440.0), // JANAF's undercooled zinc turns to glass here
    ];
    let (mut seen, mut worst_cp, mut steps) = (0, ("", 0.0, 0.0), Vec::new());
    for record in library::all() {
        for joint_k in record.joints_k() {
            let below = record.properties(kelvin(joint_k * (1.0 - 1e-13)));
            let above = record.properties(kelvin(joint_k));
            let place = format!("{} at {joint_k} K", record.id);
            let known = transitions.iter().find(|row| (row.0, row.1) == (&*record.id, joint_k));
            seen += usize::from(known.is_some());
            let jump = known.map_or(0.0, |row| row.2);
            let gibbs = above.gibbs_j_per_mol - below.gibbs_j_per_mol;
            let enthalpy = above.enthalpy_j_per_mol - below.enthalpy_j_per_mol - jump;
            let entropy = above.entropy_j_per_mol_k - below.entropy_j_per_mol_k - jump / joint_k;
            assert!(gibbs.abs() < 1e-4, "{place}: G° steps by {gibbs} J/mol");
            assert!(enthalpy.abs() < 1e-3, "{place}: H° steps by {enthalpy} J/mol");
            assert!(entropy.abs() < 1e-6, "{place}: S° steps by {entropy} J/(mol K)");
            let step = above.heat_capacity_j_per_mol_k / below.heat_capacity_j_per_mol_k - 1.0;
            let peak = known.is_some() || lambda.contains(&(&*record.id, joint_k));
            if !peak && step.abs() > 0.005 {
                steps.push(format!("{place}: Cp steps by {:.3} %", 100.0 * step));
            }
            if !peak && step.abs() > worst_cp.2 {
                worst_cp = (&*record.id, joint_k, step.abs());
            }
        }
    }
    assert_eq!(seen, transitions.len(), "a transition was not met");
    assert!(steps.is_empty(), "{}", steps.join("\n"));
    println!(
        "largest step of Cp: {:.3} % in {} at {} K",
        100.0 * worst_cp.2,
        worst_cp.0,
        worst_cp.1
    );
}

#[test]
fn enthalpy_and_entropy_are_the_integrals_of_the_heat_capacity() {
    for record in library::all() {
        let mut t = record.range_k.0 - 50.0;
        while t < record.range_k.1 + 200.0 {
            let step = 1e-3 * t;
            let ends = [t - step, t + step];
            let crosses = |joint: &f64| *joint >= ends[0] && *joint <= ends[1];
            let (low, high) = record.range_k;
            if !record.joints_k().iter().chain([&low, &high]).any(crosses) {
                let [below, above] = ends.map(|k| record.properties(kelvin(k)));
                let at = record.properties(kelvin(t));
                let slope = (above.enthalpy_j_per_mol - below.enthalpy_j_per_mol) / (2.0 * step);
                let minus_s = (above.gibbs_j_per_mol - below.gibbs_j_per_mol) / (2.0 * step);
                let cp = at.heat_capacity_j_per_mol_k;
                // A dissolved species may have no heat capacity, or a negative one or entropy.
                let near = 1e-3 * cp.abs() + 1e-6;
                assert!((slope - cp).abs() < near, "{} at {t}: {slope}, {cp}", record.id);
                let s = at.entropy_j_per_mol_k;
                let near = 1e-3 * s.abs() + 1e-3;
                assert!((minus_s + s).abs() < near, "{} at {t}: {minus_s}, {s}", record.id);
                let g = at.enthalpy_j_per_mol - t * s - at.gibbs_j_per_mol;
                assert!(
                    g.abs() < 1e-8 * t * (s.abs() + 1.0),
                    "{} at {t}: G° is not H° − T S° by {g}",
                    record.id
                );
            }
            t += 37.0;
        }
    }
}

#[test]
fn outside_its_range_a_record_says_how_far_and_keeps_its_heat_capacity() {
    for record in library::all() {
        let (low, high) = record.range_k;
        assert_eq!(record.reach(kelvin(low)), Reach::InRange);
        assert_eq!(record.reach(kelvin(high)), Reach::InRange);
        let end = record.properties(kelvin(high));
        let beyond = record.properties(kelvin(high + 125.0));
        let Reach::Extrapolated { by_k } = beyond.reach else { panic!("{}", record.id) };
        assert!((by_k - 125.0).abs() < 1e-9, "{}: {by_k}", record.id);
        let (cp, kept) = (end.heat_capacity_j_per_mol_k, beyond.heat_capacity_j_per_mol_k);
        assert!((cp - kept).abs() < 1e-9, "{}: {cp} becomes {kept}", record.id);
        let risen = end.enthalpy_j_per_mol + 125.0 * cp - beyond.enthalpy_j_per_mol;
        assert!(risen.abs() < 1e-3, "{}", record.id);
        assert!(matches!(record.reach(kelvin(1.0)), Reach::Extrapolated { .. }));
    }
}

#[test]
fn every_property_is_finite_at_every_temperature_allowed() {
    let (low, high) = library::TEMPERATURE_LIMITS_K;
    for record in library::all() {
        for t in [low, 10.0, 273.15, 298.15, 1000.0, 6000.0, high] {
            let at = record.properties(kelvin(t));
            let figures = [
                at.heat_capacity_j_per_mol_k,
                at.enthalpy_j_per_mol,
                at.entropy_j_per_mol_k,
                at.gibbs_j_per_mol,
                record.gibbs_over_rt(kelvin(t)),
            ];
            assert!(figures.iter().all(|figure| figure.is_finite()), "{} at {t}", record.id);
        }
    }
    for t in [0.0, -1.0, 1e-300, 1e300, f64::INFINITY, f64::NAN] {
        assert_eq!(code(Temperature::new(t)), "species-temperature", "{t}");
    }
}

#[test]
fn a_species_is_found_by_formula_phase_form_name_and_number() {
    let ids =
        |found: Vec<&'static Record>| found.iter().map(|one| one.id.clone()).collect::<Vec<_>>();
    assert_eq!(ids(library::find("H2O", None, None)), ["H2O.g", "H2O.l"]);
    assert_eq!(ids(library::find("H2O", Some(Phase::Liquid), None)), ["H2O.l"]);
    assert_eq!(ids(library::find("S", None, Some("monoclinic"))), ["S.s.monoclinic"]);
    assert_eq!(ids(library::find("Ca(OH)2", None, None)), ["Ca(OH)2.g", "Ca(OH)2.s"]);
    assert_eq!(ids(library::find("h2o", None, None)), [""; 0]);
    assert_eq!(ids(library::find("", None, None)), [""; 0]);
    assert_eq!(ids(library::named(" Sulphur Dioxide ")), ["SO2.g"]);
    assert_eq!(ids(library::named("7732-18-5")), ["H2O.g", "H2O.l"]);
    assert_eq!(ids(library::named("")), [""; 0]);
    assert!(library::formulas().filter(|formula| *formula == "S").count() == 1);
    for record in library::all() {
        assert!(
            library::find(&record.formula, Some(record.phase), record.form.as_deref())
                .contains(&record)
        );
        assert!(record.names.iter().all(|name| library::named(name).contains(&record)));
    }
}

#[test]
fn what_names_no_single_record_is_a_problem() {
    assert_eq!(code(library::one("XeF6", None, None)), "species-unknown");
    assert_eq!(code(library::one("SO2", Some(Phase::Solid), None)), "species-phase-unknown");
    assert_eq!(code(library::one("S", Some(Phase::Solid), None)), "species-several");
    let iron = library::one("Fe", Some(Phase::Solid), None).unwrap();
    assert_eq!(code(Combination::new(&[(iron, f64::NAN)])), "species-coefficient");
    assert_eq!(code(Combination::new(&[(iron, f64::INFINITY)])), "species-coefficient");
}

fn code<T: std::fmt::Debug>(outcome: Outcome<T>) -> &'static str {
    outcome.unwrap_err()[0].code.as_str()
}
