//! Ammonia at equilibrium against measurements: A. T. Larson and R. L. Dodge, J. Am. Chem. Soc. 45
//! (1923) 2918, 450 °C, three parts of hydrogen to one of nitrogen; recalled from memory.

use serde_json::{Value as Json, json};
use shiftgauge::case::{self, Value};

#[test]
fn the_ideal_gas_gives_larson_and_dodge_up_to_fifty_atmospheres() {
    let case = json!({
        "format": "shiftgauge 1",
        "reactions": [{ "equation": "N2 + 3 H2 = 2 NH3", "constant": { "from": "library" } }],
        "temperature": "450 °C",
        "pressure": "10 atm",
        "reading": { "gas": { "basis": "wet", "entries": [
            { "species": "N2", "value": "25 %" }, { "species": "H2", "value": "75 %" }
        ] } }
    });
    let value: Value = serde_json::from_value(case).unwrap();
    // (atm, mole % measured, mole % that the ideal gas may miss it by). At 100 atm the real gas has 0.8
    // more than the ideal one (its fugacities), so that there the miss is held from both sides.
    let rows =
        [(10, 2.04, 0.0, 0.1), (30, 5.80, 0.0, 0.2), (50, 9.17, 0.0, 0.3), (100, 16.35, 0.4, 1.4)];
    for (atmospheres, measured, least, most) in rows {
        let pressure = format!("{atmospheres} atm");
        let request = json!({
            "x": { "knob": "pressure", "from": pressure, "to": "1000 atm", "count": 2 },
            "show": { "what": "fraction", "species": "NH3" }
        });
        let request: Value = serde_json::from_value(request).unwrap();
        let answer: Json = serde_json::to_value(case::sweep(&value, &request)).unwrap();
        let found = 100.0 * answer["sweep"]["lines"][0]["y"][0].as_f64().unwrap();
        println!("{atmospheres:4} atm: {found:.3} %, measured {measured} %");
        let miss = measured - found;
        assert!(
            miss.abs() <= most && (least == 0.0 || miss >= least),
            "{atmospheres} atm: {found}"
        );
    }
}
