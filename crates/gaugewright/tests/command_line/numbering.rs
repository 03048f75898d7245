//! `--numbering bourbaki`, on input and output, against the plates of Bourbaki, *Lie* VI (E6: plate
//! V, E7: VI, E8: VII, F4: VIII, G2: IX), from memory, and each diagram drawn again from its bonds.

use serde_json::{Value, json};

use crate::run::{gaugewright, json};

/// Node pairs that are joined.
fn bonds(answer: &Value) -> Vec<(usize, usize)> {
    let matrix = answer["cartan_matrix"].as_array().unwrap();
    let mut bonds = Vec::new();
    for (i, row) in matrix.iter().enumerate() {
        for (j, entry) in row.as_array().unwrap().iter().enumerate() {
            if i < j && entry.as_i64() != Some(0) {
                bonds.push((i + 1, j + 1));
            }
        }
    }
    bonds
}

fn algebra(name: &str, numbering: &str) -> Value {
    json(["algebra", name, "--numbering", numbering])
}

#[test]
fn diagrams() {
    let slansky: [(&str, &[(usize, usize)]); 3] = [
        ("E6", &[(1, 2), (2, 3), (3, 4), (3, 6), (4, 5)]),
        ("E7", &[(1, 2), (2, 3), (3, 4), (3, 7), (4, 5), (5, 6)]),
        (
            "E8",
            &[(1, 2), (2, 3), (3, 4), (3, 8), (4, 5), (5, 6), (6, 7)],
        ),
    ];
    let bourbaki: [(&str, &[(usize, usize)]); 3] = [
        ("E6", &[(1, 3), (2, 4), (3, 4), (4, 5), (5, 6)]),
        ("E7", &[(1, 3), (2, 4), (3, 4), (4, 5), (5, 6), (6, 7)]),
        (
            "E8",
            &[(1, 3), (2, 4), (3, 4), (4, 5), (5, 6), (6, 7), (7, 8)],
        ),
    ];
    for (name, expected) in slansky {
        assert_eq!(bonds(&algebra(name, "slansky")), expected, "{name}");
        assert_eq!(algebra(name, "slansky"), json(["algebra", name]));
    }
    for (name, expected) in bourbaki {
        assert_eq!(bonds(&algebra(name, "bourbaki")), expected, "{name}");
    }
}

/// Plate IX has the short root first: the matrix is transposed, and the highest root 3 a1 + 2 a2.
#[test]
fn g2() {
    let (ours, theirs) = (algebra("G2", "slansky"), algebra("G2", "bourbaki"));
    assert_eq!(ours["cartan_matrix"], json!([[2, -3], [-1, 2]]));
    assert_eq!(theirs["cartan_matrix"], json!([[2, -1], [-3, 2]]));
    assert_eq!(theirs["simple_root_lengths"], json!(["2/3", "2"]));
    let roots = theirs["positive_roots"].as_array().unwrap();
    let expected = [[1, 0], [0, 1], [1, 1], [2, 1], [3, 1], [3, 2]];
    assert_eq!(roots.len(), expected.len());
    for root in expected {
        assert!(roots.contains(&json!(root)), "{root:?}");
    }
}

/// The highest roots that the plates print.
#[test]
fn highest_roots() {
    for (name, expected) in [
        ("E6", json!([1, 2, 2, 3, 2, 1])),
        ("E7", json!([2, 2, 3, 4, 3, 2, 1])),
        ("E8", json!([2, 3, 4, 6, 5, 4, 3, 2])),
        ("F4", json!([2, 3, 4, 2])),
        ("G2", json!([3, 2])),
    ] {
        let answer = algebra(name, "bourbaki");
        let roots = answer["positive_roots"].as_array().unwrap();
        let height = |root: &Value| -> i64 {
            root.as_array()
                .unwrap()
                .iter()
                .map(|n| n.as_i64().unwrap())
                .sum()
        };
        let highest = roots.iter().max_by_key(|root| height(root)).unwrap();
        assert_eq!(highest, &expected, "{name}");
    }
}

/// Labels read and written by the plates: the adjoint and the smallest irreps.
#[test]
fn labels() {
    for (name, irrep, labels) in [
        ("E6", "78", "(010000)"),
        ("E6", "27", "(100000)"),
        ("E6", "27bar", "(000001)"),
        ("E7", "133", "(1000000)"),
        ("E7", "56", "(0000001)"),
        ("E7", "912", "(0100000)"),
        ("E8", "248", "(00000001)"),
        ("E8", "3875", "(10000000)"),
        ("F4", "52", "(1000)"),
        ("F4", "26", "(0001)"),
        ("G2", "14", "(01)"),
        ("G2", "7", "(10)"),
        ("SO(10)", "16", "(00001)"),
    ] {
        let option = ["--numbering", "bourbaki"];
        let by_name = json(["irrep", name, irrep].into_iter().chain(option));
        let by_labels = json(["irrep", name, labels].into_iter().chain(option));
        assert_eq!(by_name, by_labels, "{name} {irrep}");
        assert_eq!(by_name["name"], irrep);
        assert_eq!(by_name["numbering"], "bourbaki");
        let digits: Vec<u32> = labels.chars().filter_map(|c| c.to_digit(10)).collect();
        assert_eq!(by_name["labels"], json!(digits));
        let text = gaugewright(["irrep", name, irrep].into_iter().chain(option)).done();
        assert!(text.contains(labels), "{text}");
        // What does not depend on the numbering does not change.
        let other = json(["irrep", name, irrep]);
        for key in [
            "name",
            "dimension",
            "dynkin_index",
            "casimir",
            "conjugate",
            "congruency",
        ] {
            assert_eq!(by_name[key], other[key], "{name} {irrep} {key}");
        }
    }
}

#[test]
fn products_catalogues_and_weights() {
    let option = ["--numbering", "bourbaki"];
    let product = json(
        ["product", "E6", "(100000)", "27bar"]
            .into_iter()
            .chain(option),
    );
    let terms = product["terms"].as_array().unwrap();
    let labels: Vec<&Value> = terms.iter().map(|term| &term["labels"]).collect();
    // 27 x 27bar = 1 + 78 + 650, and 650 = (100001) by plate V.
    let zero = json!([0, 0, 0, 0, 0, 0]);
    let expected = [
        &zero,
        &json!([0, 1, 0, 0, 0, 0]),
        &json!([1, 0, 0, 0, 0, 1]),
    ];
    assert_eq!(labels, expected);
    let catalog = json(
        ["catalog", "G2", "--max-dimension", "14"]
            .into_iter()
            .chain(option),
    );
    assert_eq!(catalog["irreps"][1]["labels"], json!([1, 0]));
    assert_eq!(catalog["irreps"][2]["labels"], json!([0, 1]));
    let weights = ["irrep", "G2", "14", "--weights", "dominant"];
    let weights = json(weights.into_iter().chain(option));
    let weights = weights["weights"].as_array().unwrap();
    let of = |weight: Value| weights.iter().find(|one| one["weight"] == weight).unwrap();
    assert_eq!(of(json!([0, 1]))["multiplicity"], 1);
    assert_eq!(of(json!([1, 0]))["multiplicity"], 1);
    assert_eq!(of(json!([0, 0]))["multiplicity"], 2);
}

/// A model file is in Slansky's numbering, so that it means one thing; what is said of it follows
/// the option. 351' of E6 is (000020), and (000002) by plate V.
#[test]
fn models() {
    let option = ["--numbering", "bourbaki"];
    let line = ["audit", "docs/models/e6.toml"];
    let labels = |answer: Value| {
        let multiplets = answer["multiplets"].as_array().unwrap().clone();
        let found = multiplets
            .into_iter()
            .find(|one| one["transforms"]["unified"] == "351'");
        found.unwrap()["labels"]["unified"].clone()
    };
    assert_eq!(labels(json(line)), json!([0, 0, 0, 0, 2, 0]));
    assert_eq!(
        labels(json(line.into_iter().chain(option))),
        json!([0, 0, 0, 0, 0, 2])
    );
    let text = gaugewright(line.into_iter().chain(option)).done();
    assert!(text.contains("351' (000002)"), "{text}");
}
