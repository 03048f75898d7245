//! The keys that the interface promises for every command, and what stands under them.

use num_bigint::BigInt;
use num_rational::BigRational;
use serde_json::{Value, json};

use crate::run::{gaugewright, json_words};

/// What may stand under a key.
#[derive(Clone, Copy, Debug)]
enum Kind {
    Text,
    /// A JSON number without point or exponent, of any length.
    Whole,
    /// A string such as "-1/6" or "2".
    Fraction,
    Flag,
    List,
    Object,
    /// A whole number or a list of them.
    Class,
    Anything,
}

use Kind::{Anything, Class, Flag, Fraction, List, Object, Text, Whole};

#[track_caller]
fn check(value: &Value, keys: &[(&str, Kind)]) {
    for (key, kind) in keys {
        let found = value
            .get(key)
            .unwrap_or_else(|| panic!("no {key} in {value}"));
        let fits = match kind {
            Text => found.as_str().is_some_and(|text| !text.is_empty()),
            Whole => is_whole(found),
            Fraction => found
                .as_str()
                .is_some_and(|text| text.parse::<BigRational>().is_ok()),
            Flag => found.is_boolean(),
            List => found.is_array(),
            Object => found.is_object(),
            Class => {
                is_whole(found)
                    || found
                        .as_array()
                        .is_some_and(|list| list.iter().all(is_whole))
            }
            Anything => true,
        };
        assert!(fits, "{key} is no {kind:?}: {found}");
    }
}

fn is_whole(value: &Value) -> bool {
    value.is_number() && value.to_string().parse::<BigInt>().is_ok()
}

#[track_caller]
fn check_each(list: &Value, keys: &[(&str, Kind)]) {
    let list = list.as_array().expect("a list");
    assert!(!list.is_empty());
    list.iter().for_each(|item| check(item, keys));
}

#[track_caller]
fn whole_numbers(list: &Value) -> Vec<i64> {
    let list = list.as_array().expect("a list").iter();
    list.map(|item| item.as_i64().expect("whole")).collect()
}

#[test]
fn algebra() {
    for name in ["SU(5)", "SO(8)", "Sp(6)", "E8", "G2", "A1", "B40"] {
        let answer = json_words(&format!("algebra {name}"));
        check(
            &answer,
            &[
                ("algebra", Text),
                ("cartan_type", Text),
                ("rank", Whole),
                ("dimension", Whole),
                ("cartan_matrix", List),
                ("positive_roots", List),
                ("coxeter_number", Whole),
                ("dual_coxeter_number", Whole),
                ("exponents", List),
                ("weyl_group_order", Whole),
                ("center", Text),
            ],
        );
        let rank = answer["rank"].as_u64().unwrap();
        let matrix = answer["cartan_matrix"].as_array().unwrap();
        assert_eq!(matrix.len() as u64, rank);
        for row in matrix {
            assert_eq!(whole_numbers(row).len() as u64, rank);
        }
        // dim G = rank + 2 x positive roots, and the order of W is the product of (m + 1).
        let roots = answer["positive_roots"].as_array().unwrap().len() as u64;
        assert_eq!(answer["dimension"].as_u64().unwrap(), rank + 2 * roots);
        let degrees = whole_numbers(&answer["exponents"])
            .into_iter()
            .map(|m| m + 1);
        let order: BigInt = degrees.map(BigInt::from).product();
        assert_eq!(answer["weyl_group_order"].to_string(), order.to_string());
    }
}

const IRREP: [(&str, Kind); 12] = [
    ("algebra", Text),
    ("labels", List),
    ("name", Text),
    ("dimension", Whole),
    ("conjugate", Text),
    ("reality", Text),
    ("congruency", Class),
    ("casimir", Fraction),
    ("dynkin_index", Whole),
    ("trace_index", Fraction),
    ("cubic_index", Whole),
    ("numbering", Text),
];

#[test]
fn irrep() {
    for line in [
        "SU(5) 10bar",
        "SO(8) 8v",
        "SO(10) 16",
        "E7 56",
        "SU(2) (12)",
        "SO(12) 32'",
    ] {
        let answer = json_words(&format!("irrep {line}"));
        check(&answer, &IRREP);
        assert!(answer.get("weights").is_none());
    }
    for which in ["dominant", "all"] {
        let answer = json_words(&format!("irrep SU(3) 8 --weights {which}"));
        check(&answer, &IRREP);
        check_each(
            &answer["weights"],
            &[("weight", List), ("multiplicity", Whole)],
        );
        let weights = answer["weights"].as_array().unwrap();
        let sum: u64 = weights
            .iter()
            .map(|one| one["multiplicity"].as_u64().unwrap())
            .sum();
        assert_eq!(
            (weights.len(), sum),
            if which == "all" { (7, 8) } else { (2, 3) }
        );
    }
}

/// All labels 9: the highest weight plus rho is 10 rho, so by Weyl's formula the dimension is 10
/// to the number of positive roots. It stays a JSON number, to the last digit.
#[test]
fn numbers_of_any_length() {
    for (algebra, rank, roots) in [("SU(10)", 9, 45), ("E8", 8, 120), ("SO(10)", 5, 20)] {
        let labels = format!("({})", vec!["9"; rank].join(","));
        let line = gaugewright(["irrep", algebra, &labels, "--format", "json"]).done();
        let power = format!("1{}", "0".repeat(roots));
        assert!(line.contains(&format!("\"dimension\":{power},")), "{line}");
        check(&serde_json::from_str(&line).unwrap(), &IRREP);
    }
}

#[test]
fn catalog() {
    for line in [
        "SU(5)",
        "SU(5) --max-dimension 50",
        "E8 --max-index 2000",
        "SO(8) --max-dimension 300",
    ] {
        let answer = json_words(&format!("catalog {line}"));
        check(&answer, &[("algebra", Text), ("irreps", List)]);
        check_each(
            &answer["irreps"],
            &[
                ("labels", List),
                ("name", Text),
                ("dimension", Whole),
                ("dynkin_index", Whole),
                ("cubic_index", Whole),
                ("reality", Text),
                ("congruency", Class),
            ],
        );
        // By dimension, then index.
        let irreps = answer["irreps"].as_array().unwrap().iter();
        let order: Vec<_> = irreps
            .map(|one| {
                (
                    one["dimension"].as_u64().unwrap(),
                    one["dynkin_index"].as_u64().unwrap(),
                )
            })
            .collect();
        assert!(order.is_sorted(), "{order:?}");
    }
}

const TERMS: [(&str, Kind); 4] = [
    ("labels", List),
    ("name", Text),
    ("dimension", Whole),
    ("multiplicity", Whole),
];

#[test]
fn product_and_power() {
    let product = json_words("product SU(5) 10 10 5bar");
    check(
        &product,
        &[
            ("algebra", Text),
            ("factors", List),
            ("terms", List),
            ("dimension", Whole),
        ],
    );
    check_each(&product["terms"], &TERMS);
    assert_eq!(product["factors"], json!(["10", "10", "5bar"]));
    assert_eq!(product["dimension"], json!(500));
    let symmetries = [
        ("symmetric", 136),
        ("antisymmetric", 120),
        ("1,1", 120),
        ("2", 136),
    ];
    for (symmetry, dimension) in symmetries {
        let power = json_words(&format!("power SO(10) 16 --degree 2 --symmetry {symmetry}"));
        check(
            &power,
            &[
                ("algebra", Text),
                ("factors", List),
                ("terms", List),
                ("dimension", Whole),
                ("degree", Whole),
                ("symmetry", Text),
            ],
        );
        check_each(&power["terms"], &TERMS);
        assert_eq!(
            (&power["degree"], &power["symmetry"]),
            (&json!(2), &json!(symmetry))
        );
        assert_eq!(power["dimension"], json!(dimension));
    }
}

const CONDITION: [(&str, Kind); 6] = [
    ("name", Text),
    ("kind", Text),
    ("factors", List),
    ("value", Fraction),
    ("cancels", Flag),
    ("contributions", List),
];

/// The shape of `conditions`; contributions add up to the value.
fn check_conditions(answer: &Value) {
    check(answer, &[("conditions", List), ("consistent", Flag)]);
    check_each(&answer["conditions"], &CONDITION);
    for condition in answer["conditions"].as_array().unwrap() {
        let kind = condition["kind"].as_str().unwrap();
        let kinds = ["cubic", "mixed", "gravitational", "global", "discrete"];
        assert!(kinds.contains(&kind), "{kind}");
        check_each(
            &condition["contributions"],
            &[("multiplet", Text), ("value", Fraction)],
        );
        let read = |value: &Value| value.as_str().unwrap().parse::<BigRational>().unwrap();
        let shares = condition["contributions"].as_array().unwrap().iter();
        let sum: BigRational = shares.map(|share| read(&share["value"])).sum();
        assert_eq!(sum, read(&condition["value"]), "{condition}");
    }
}

#[test]
fn anomalies() {
    let answer = json_words("anomalies docs/models/standard-model.toml");
    check_conditions(&answer);
    let conditions = answer["conditions"].as_array().unwrap();
    let factors: Vec<&Value> = conditions.iter().map(|one| &one["factors"]).collect();
    for expected in [
        json!(["colour", "colour", "colour"]),
        json!(["colour", "colour", "hypercharge"]),
        json!(["weak", "weak", "hypercharge"]),
        json!(["hypercharge", "hypercharge", "hypercharge"]),
        json!(["gravity", "gravity", "hypercharge"]),
    ] {
        assert!(factors.contains(&&expected), "{expected} in {factors:?}");
    }
    let witten = conditions
        .iter()
        .find(|one| one["kind"] == "global")
        .expect("weak SU(2)");
    // Doublets: three colours and one lepton in each of three families.
    assert_eq!(witten["value"], "12");
    check_conditions(&json_words(
        "anomalies docs/models/broken/baryon-number.toml",
    ));
}

#[test]
fn audit() {
    for line in [
        "audit",
        "audit docs/models/mssm.toml",
        "audit docs/models/broken/sp4-one-4.toml",
    ] {
        let answer = json_words(line);
        check(
            &answer,
            &[
                ("model", Object),
                ("symmetry", List),
                ("multiplets", List),
                ("anomalies", Object),
                ("running", Object),
                ("embeddings", Anything),
                ("couplings", Anything),
                ("consistent", Flag),
            ],
        );
        check(&answer["model"], &[("title", Text)]);
        check_each(
            &answer["symmetry"],
            &[("label", Text), ("algebra", Text), ("gauged", Flag)],
        );
        check_each(
            &answer["multiplets"],
            &[
                ("label", Text),
                ("field", Text),
                ("copies", Whole),
                ("transforms", Object),
            ],
        );
        check_conditions(&answer["anomalies"]);
        let one_loop = answer["running"]["one_loop"].as_object().unwrap();
        for symmetry in answer["symmetry"].as_array().unwrap() {
            let label = symmetry["label"].as_str().unwrap();
            check(&answer["running"]["one_loop"], &[(label, Fraction)]);
        }
        assert!(!one_loop.is_empty());
        assert_eq!(answer["consistent"], answer["anomalies"]["consistent"]);
    }
}
