//! Finding a species while it is typed.

use shiftgauge::library::{self, Book, FoundBy};

/// Text, the record that must come first, and by what.
const FIRST: &[(&str, &str, FoundBy)] = &[
    ("SO2", "SO2.g", FoundBy::Formula),
    (" SO2 ", "SO2.g", FoundBy::Formula),
    ("H2O(l)", "H2O.l", FoundBy::Formula),
    ("S(s, monoclinic)", "S.s.monoclinic", FoundBy::Formula),
    ("SO₄²⁻", "SO4^2-.aq", FoundBy::Formula),
    ("O2S", "SO2.g", FoundBy::Atoms),
    ("ClH", "HCl.g", FoundBy::Atoms),
    ("H4C", "CH4.g", FoundBy::Atoms),
    ("CaO2H2", "Ca(OH)2.s", FoundBy::Atoms),
    ("sulphur dioxide", "SO2.g", FoundBy::Name),
    ("QUICKLIME", "CaO.s", FoundBy::Name),
    ("7446-09-5", "SO2.g", FoundBy::Name),
    ("nh3", "NH3.g", FoundBy::Name),
    ("caustic", "NaOH.s", FoundBy::NameStart),
    ("amonia", "NH3.g", FoundBy::Near),
    ("methnol vapour", "CH3OH.g", FoundBy::Near),
];

#[test]
fn the_likeliest_record_comes_first() {
    let mut wrong = Vec::new();
    for (text, id, by) in FIRST {
        let found = Book::default().search(text, 12);
        match found.first() {
            Some(first) if first.record.id == *id && first.by == *by => {}
            first => wrong.push(format!("{text}: {:?}", first.map(|one| (&one.record.id, one.by)))),
        }
    }
    assert!(wrong.is_empty(), "{}", wrong.join("\n"));
}

#[test]
fn every_record_is_found_by_its_formula_its_names_and_its_number() {
    let book = Book::default();
    for record in library::all() {
        let texts = record.names.iter().map(|name| name.to_string());
        let number = (!record.cas.is_empty()).then(|| record.cas.to_string());
        for text in texts.chain(number).chain([record.label()]) {
            let found = book.search(&text, 40);
            let place = found.iter().position(|one| one.record.id == record.id);
            assert!(place.is_some_and(|place| found[place].by <= FoundBy::Name), "{text}");
        }
    }
}

#[test]
fn isomers_share_their_atoms() {
    let found = Book::default().search("C2H6O", 12);
    let ids: Vec<&str> = found.iter().map(|one| &*one.record.id).collect();
    assert!(ids.contains(&"C2H5OH.g") && ids.contains(&"CH3OCH3.g"), "{ids:?}");
    assert!(found.iter().all(|one| one.by <= FoundBy::Name), "{ids:?}");
}

#[test]
fn dissolved_species_come_after_the_others_of_a_group() {
    let found = Book::default().search("NH3", 12);
    let first: Vec<&str> = found.iter().take(3).map(|one| &*one.record.id).collect();
    assert_eq!(first, ["NH3.g", "NH3.l", "NH3.aq"]);
}

#[test]
fn nothing_and_nonsense_find_nothing_and_the_list_is_as_long_as_asked() {
    let book = Book::default();
    for text in ["", "   ", "qqqqqqqqqq", "\u{1F600}", "((((", "٣٤٥"] {
        assert!(book.search(text, 12).is_empty(), "{text}");
    }
    assert_eq!(book.search("ch", 7).len(), 7);
}
