//! Reading what is written: nothing panics, what is printed is read, and errors help.

use num_bigint::BigInt;
use num_rational::BigRational;
use proptest::prelude::*;
use roots::{Numbering, ReductiveAlgebra, SimpleAlgebra, read_rational};

use super::choices::{any_algebra, irrep_of};
use crate::support::algebra;

/// Text that is nearly something.
fn nearly() -> impl Strategy<Value = String> {
    prop_oneof![
        any::<String>(),
        "[A-Za-z]{0,4} ?\\(? ?[0-9]{0,12} ?\\)?",
        "\\(?[0-9, ]{0,40}\\)?",
        "[0-9]{0,30}['′’]{0,3}(bar|BAR|v|s|c|vs){0,3}",
        "(SU\\(3\\)|x|×|X| |U\\(1\\)|E6|é|\u{1F600}){0,12}",
        "[-+]?[0-9]{0,70}(/[-+]?[0-9]{0,70})?",
    ]
}

proptest! {
    #![proptest_config(ProptestConfig::with_cases(500))]

    #[test]
    fn algebras_never_panic(text in nearly()) {
        if let Ok(read) = text.parse::<SimpleAlgebra>() {
            prop_assert_eq!(read.to_string().parse::<SimpleAlgebra>().unwrap(), read);
        }
        if let Ok(read) = text.parse::<ReductiveAlgebra>() {
            prop_assert_eq!(read.to_string().parse::<ReductiveAlgebra>().unwrap(), read);
        }
        let _ = text.parse::<Numbering>();
    }

    #[test]
    fn rationals_never_panic(text in nearly()) {
        if let Ok(read) = read_rational(&text) {
            prop_assert_eq!(read_rational(&read.to_string()).unwrap(), read);
        }
    }

    #[test]
    fn rationals_read_back(above in any::<i128>(), below in 1..i64::MAX) {
        let value = BigRational::new(BigInt::from(above), BigInt::from(below));
        prop_assert_eq!(read_rational(&format!("{above}/{below}")).unwrap(), value.clone());
        prop_assert_eq!(read_rational(&value.to_string()).unwrap(), value);
    }
}

proptest! {
    #![proptest_config(ProptestConfig::with_cases(60))]

    #[test]
    fn irreps_never_panic(algebra in any_algebra(6), text in nearly()) {
        for numbering in [Numbering::Slansky, Numbering::Bourbaki] {
            match algebra.read_irrep_in(numbering, &text) {
                Ok(irrep) => prop_assert_eq!(irrep.algebra(), algebra),
                Err(error) => prop_assert!(!error.to_string().is_empty()),
            }
        }
    }

    /// Labels read back in either numbering, in every way they may be written.
    #[test]
    fn labels_read_back(irrep in any_algebra(12).prop_flat_map(|algebra| irrep_of(algebra, 0..14u32))) {
        let algebra = irrep.algebra();
        for numbering in [Numbering::Slansky, Numbering::Bourbaki] {
            let written = irrep.bracketed_in(numbering);
            prop_assert_eq!(algebra.read_irrep_in(numbering, &written).unwrap(), irrep.clone());
        }
        let labels: Vec<String> = irrep.labels().iter().map(u32::to_string).collect();
        for separator in [",", ", ", " "] {
            let written = format!("( {} )", labels.join(separator));
            prop_assert_eq!(algebra.read_irrep(&written).unwrap(), irrep.clone());
        }
    }
}

fn complaint(algebra_name: &str, written: &str) -> String {
    algebra(algebra_name)
        .read_irrep(written)
        .unwrap_err()
        .to_string()
}

#[test]
fn products_as_they_may_be_written() {
    for written in [
        "SU(3) x SU(2) x U(1)",
        "su3xsu2xu1",
        " SU (3)\u{d7}SU( 2 ) X U (1) ",
        "A2 x A1 x u1",
        "SU(3) x SO(3) x U( 1 )",
    ] {
        let product: ReductiveAlgebra = written.parse().unwrap();
        assert_eq!(product.to_string(), "SU(3) x SU(2) x U(1)", "{written}");
    }
}

/// Ambiguous and unknown names list what may be meant, with labels.
#[test]
fn candidates() {
    let cases = [
        (
            "SO(8)",
            "8",
            vec!["8v = (1000)", "8s = (0001)", "8c = (0010)"],
        ),
        (
            "SO(8)",
            "35",
            vec!["35v = (2000)", "35s = (0002)", "35c = (0020)"],
        ),
        ("SU(3)", "8bar", vec!["8 = (11)"]),
        (
            "SU(3)",
            "15''",
            vec!["15 = (21)", "15bar = (12)", "15' = (40)", "15'bar = (04)"],
        ),
        (
            "SU(5)",
            "11",
            vec![
                "10 = (0100)",
                "10bar = (0010)",
                "15 = (2000)",
                "15bar = (0002)",
            ],
        ),
        ("E8", "249", vec!["248 = (00000010)", "3875 = (10000000)"]),
        (
            "SO(10)",
            "17",
            vec!["16 = (00001)", "16bar = (00010)", "45 = (01000)"],
        ),
        ("SO(12)", "32''", vec!["32 = (000001)", "32' = (000010)"]),
    ];
    for (name, written, candidates) in cases {
        let complaint = complaint(name, written);
        for candidate in candidates {
            assert!(
                complaint.contains(candidate),
                "{name} {written}: {complaint}"
            );
        }
        assert!(complaint.contains(&format!("\"{written}\"")), "{complaint}");
    }
}

/// What is wrong and what to write instead.
#[test]
fn errors_of_labels_and_algebras() {
    let cases = [
        ("(1,0)", "4 Dynkin labels"),
        ("(1,0,0,-1)", "\"-1\""),
        ("(1,0,0,x)", "\"x\""),
        ("(1,0,0,4294967296)", "4294967296"),
        ("(1,0,0,99999999999999999999)", "4294967295"),
        ("(1,0,0,0", "(1,0,0,0"),
        ("1,0,0,0", "(1000)"),
        ("", "(1000)"),
        ("five", "(1000)"),
        ("2000000000", "beyond dimension 1000000,"),
    ];
    for (written, part) in cases {
        let complaint = complaint("SU(5)", written);
        assert!(complaint.contains(part), "{written}: {complaint}");
    }
    let algebras = [
        ("SO(4)", "SU(2) x SU(2)"),
        ("D2", "SU(2) x SU(2)"),
        ("SO(2)", "U(1)"),
        ("SU(1)", "SU(2)"),
        ("Sp(5)", "Sp(4)"),
        ("U(1)", "factor of a product"),
        ("U(3)", "SU(N) x U(1)"),
        ("E9", "6 to 8"),
        ("F5", "F has rank 4"),
        ("G3", "G has rank 2"),
        ("SU(300)", "SU(257)"),
        ("A1000000", "SU(257)"),
        ("SU(99999999999999999999999)", "SU(257)"),
        ("SL(2)", "SU(N)"),
        ("", "SU(N)"),
    ];
    for (written, part) in algebras {
        let complaint = written.parse::<SimpleAlgebra>().unwrap_err().to_string();
        assert!(complaint.contains(part), "{written}: {complaint}");
    }
    for (written, part) in [
        ("SU(3) x", "empty factor"),
        ("SU(3) x Q(1)", "U(1)"),
        ("", "factor"),
    ] {
        let complaint = written.parse::<ReductiveAlgebra>().unwrap_err().to_string();
        assert!(complaint.contains(part), "{written}: {complaint}");
    }
}
