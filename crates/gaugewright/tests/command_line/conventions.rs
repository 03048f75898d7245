//! The table of conventions, line by line, as the command answers.

use num_rational::BigRational;
use serde_json::{Value, json};

use crate::run::{TempFile, json, json_words};

fn irrep(algebra: &str, irrep: &str) -> Value {
    json(["irrep", algebra, irrep])
}

fn fraction(value: &Value) -> BigRational {
    let text = value
        .as_str()
        .map_or_else(|| value.to_string(), str::to_owned);
    text.parse().expect(&text)
}

fn ratio(numerator: i64, denominator: i64) -> BigRational {
    BigRational::new(numerator.into(), denominator.into())
}

/// Node numbering: the checks that the table itself gives ([Slansky 1981], Tables 10-13).
#[test]
fn node_numbering() {
    for (algebra, name, labels) in [
        ("E6", "27", "(100000)"),
        ("E6", "78", "(000001)"),
        ("E7", "133", "(1000000)"),
        ("E7", "56", "(0000010)"),
        ("E8", "248", "(00000010)"),
        ("F4", "52", "(1000)"),
        ("F4", "26", "(0001)"),
        ("G2", "14", "(10)"),
        ("G2", "7", "(01)"),
        ("SO(10)", "16", "(00001)"),
        ("SO(10)", "16bar", "(00010)"),
    ] {
        let (by_name, by_labels) = (irrep(algebra, name), irrep(algebra, labels));
        assert_eq!(by_name, by_labels, "{algebra} {name}");
        assert_eq!(by_name["name"], name);
        let digits: Vec<u32> = labels.chars().filter_map(|c| c.to_digit(10)).collect();
        assert_eq!(by_name["labels"], json!(digits));
    }
    let lengths =
        |algebra| json_words(&format!("algebra {algebra}"))["simple_root_lengths"].clone();
    assert_eq!(lengths("F4"), json!(["2", "2", "1", "1"]));
    assert_eq!(lengths("G2"), json!(["2", "2/3"]));
}

/// A[i][j] = 2 (alpha_i, alpha_j) / (alpha_j, alpha_j), longest root squared 2: A times half the
/// squared length of its column is the symmetric matrix of inner products.
#[test]
fn cartan_matrix() {
    for algebra in ["SU(4)", "SO(7)", "Sp(6)", "SO(8)", "F4", "G2", "E6"] {
        let answer = json_words(&format!("algebra {algebra}"));
        let lengths: Vec<BigRational> = answer["simple_root_lengths"]
            .as_array()
            .unwrap()
            .iter()
            .map(fraction)
            .collect();
        assert_eq!(lengths.iter().max(), Some(&ratio(2, 1)));
        let entry = |i: usize, j: usize| fraction(&answer["cartan_matrix"][i][j]);
        let product = |i: usize, j: usize| entry(i, j) * &lengths[j] / ratio(2, 1);
        for (i, length) in lengths.iter().enumerate() {
            assert_eq!(product(i, i), *length);
            for j in 0..i {
                assert_eq!(product(i, j), product(j, i), "{algebra} {i} {j}");
            }
        }
    }
}

#[test]
fn indices() {
    for n in 2..=9 {
        let fundamental = irrep(&format!("SU({n})"), &n.to_string());
        assert_eq!(fundamental["dynkin_index"], 1);
        assert_eq!(fundamental["trace_index"], "1/2");
        assert_eq!(fraction(&fundamental["casimir"]), ratio(n * n - 1, 2 * n));
        assert_eq!(fundamental["cubic_index"], i64::from(n >= 3));
        let symplectic = irrep(&format!("Sp({})", 2 * n), &(2 * n).to_string());
        assert_eq!(
            (&symplectic["dynkin_index"], &symplectic["cubic_index"]),
            (&json!(1), &json!(0))
        );
    }
    for n in [5, 6, 7, 9, 10, 11, 12] {
        let vector = irrep(&format!("SO({n})"), &n.to_string());
        assert_eq!(vector["dynkin_index"], 2, "SO({n})");
        assert_eq!(vector["cubic_index"], 0);
    }
    assert_eq!(irrep("SO(8)", "8v")["dynkin_index"], 2);
    // Spinors of SO(6) are the fundamentals of SU(4).
    assert_eq!(irrep("SO(6)", "4")["cubic_index"], 1);
    assert_eq!(irrep("SO(6)", "4bar")["cubic_index"], -1);
    assert_eq!(irrep("E6", "27")["cubic_index"], 0);
    assert_eq!(irrep("SO(10)", "16")["cubic_index"], 0);
}

/// T(R) dim(G) = C2(R) dim(R), and T = l/2.
#[test]
fn casimir() {
    for (algebra, dimension) in [
        ("SU(4)", 15),
        ("SO(9)", 36),
        ("Sp(6)", 21),
        ("G2", 14),
        ("E6", 78),
    ] {
        let catalog = json_words(&format!("catalog {algebra}"));
        for entry in catalog["irreps"].as_array().unwrap().iter().take(12) {
            let one = irrep(algebra, entry["name"].as_str().unwrap());
            let trace = fraction(&one["trace_index"]);
            assert_eq!(&trace * ratio(2, 1), fraction(&one["dynkin_index"]));
            let right = fraction(&one["casimir"]) * fraction(&one["dimension"]);
            assert_eq!(
                trace * ratio(dimension, 1),
                right,
                "{algebra} {}",
                entry["name"]
            );
        }
    }
}

/// A right-handed fermion counts as its left-handed conjugate; scalars do not count.
#[test]
fn fermions_count_left_handed() {
    let model = |field: &str, irrep: &str, charge: &str| {
        let text = format!(
            "[[symmetry]]\nlabel = \"c\"\nalgebra = \"SU(3)\"\n[[symmetry]]\nlabel = \"y\"\n\
             algebra = \"U(1)\"\n[[multiplet]]\nlabel = \"x\"\nfield = \"{field}\"\ncopies = 2\n\
             transforms = {{ c = \"{irrep}\", y = \"{charge}\" }}\n"
        );
        json(["anomalies", &TempFile::new("m.toml", text).arg()])["conditions"].clone()
    };
    let right = model("right-handed fermion", "3", "1/3");
    assert_eq!(right, model("left-handed fermion", "3bar", "-1/3"));
    let value = |name: &str| {
        let found = right
            .as_array()
            .unwrap()
            .iter()
            .find(|one| one["name"] == name);
        found.unwrap_or_else(|| panic!("{name} in {right}"))["value"].clone()
    };
    // Two copies: A = -1; l q = -1/3; q^3 = -1/27 and q = -1/3 for three colours.
    assert_eq!(value("c^3"), "-2");
    assert_eq!(value("c^2 y"), "-2/3");
    assert_eq!(value("y^3"), "-2/9");
    assert_eq!(value("gravity^2 y"), "-2");
    let scalars = model("complex scalar", "3", "1/3");
    for condition in scalars.as_array().unwrap() {
        assert_eq!(condition["value"], "0", "{condition}");
    }
}

/// Q = T3 + Y: the quark doublet has Y = 1/6 and charges 2/3 and -1/3.
#[test]
fn hypercharge() {
    let answer = json_words("audit docs/models/standard-model.toml");
    let multiplets = answer["multiplets"].as_array().unwrap();
    let doublet = multiplets
        .iter()
        .find(|one| one["transforms"]["hypercharge"] == "1/6")
        .unwrap();
    let charges = doublet["electric_charges"].as_array().unwrap();
    let charges: Vec<&Value> = charges.iter().map(|one| &one["charge"]).collect();
    assert_eq!(charges, [&json!("2/3"), &json!("-1/3")]);
}

/// k = 5/3 in SU(5), so b of hypercharge, 41/6, becomes 41/10 (Georgi-Quinn-Weinberg 1974; the
/// value in the Standard Model with one doublet is common practice).
#[test]
fn unified_normalisation() {
    let answer = json_words("audit docs/models/standard-model.toml");
    assert_eq!(answer["running"]["hypercharge_normalisation"], "5/3");
    let one_loop = &answer["running"]["one_loop"];
    assert_eq!(one_loop["hypercharge"], "41/10");
    assert_eq!(
        (&one_loop["weak"], &one_loop["colour"]),
        (&json!("-19/6"), &json!("-7"))
    );
}

/// Names of algebras: case and brackets are optional, `USp` is `Sp`, Cartan types are read.
#[test]
fn names_of_algebras() {
    for (written, meant) in [
        ("su5", "SU(5)"),
        ("so10", "SO(10)"),
        ("SO10", "SO(10)"),
        ("USp(4)", "Sp(4)"),
        ("sp4", "Sp(4)"),
        ("e6", "E6"),
        ("A4", "SU(5)"),
        ("B3", "SO(7)"),
        ("C2", "Sp(4)"),
        ("D5", "SO(10)"),
        ("g2", "G2"),
    ] {
        assert_eq!(
            json(["algebra", written]),
            json(["algebra", meant]),
            "{written}"
        );
    }
    assert_eq!(json_words("algebra Sp(6)")["rank"], 3);
}

/// Names of irreps: the examples that the interface prints.
#[test]
fn names_of_irreps() {
    for (algebra, name, labels) in [
        ("SU(5)", "10", json!([0, 1, 0, 0])),
        ("SU(5)", "35", json!([0, 0, 0, 3])),
        ("SU(5)", "40", json!([0, 0, 1, 1])),
        ("SU(5)", "45", json!([0, 1, 0, 1])),
        ("SU(4)", "10", json!([2, 0, 0])),
        ("SO(10)", "126", json!([0, 0, 0, 0, 2])),
        ("SO(14)", "64", json!([0, 0, 0, 0, 0, 1, 0])),
        ("SU(3)", "6", json!([2, 0])),
        ("SU(3)", "15", json!([2, 1])),
        ("SU(3)", "15'", json!([4, 0])),
        ("SO(8)", "8v", json!([1, 0, 0, 0])),
        ("SO(8)", "8s", json!([0, 0, 0, 1])),
        ("SO(8)", "8c", json!([0, 0, 1, 0])),
        ("SO(8)", "35v", json!([2, 0, 0, 0])),
        ("SU(2)", "(12)", json!([12])),
    ] {
        assert_eq!(irrep(algebra, name)["labels"], labels, "{algebra} {name}");
    }
}
