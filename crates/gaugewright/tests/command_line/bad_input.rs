//! Names, labels and bounds that cannot be used: exit status 2, one clear error, no panic.

use std::ffi::OsString;
use std::time::{Duration, Instant};

use crate::run::{gaugewright, with_input};

/// Each line is `arguments -> what the error says`, the arguments separated by commas.
#[track_caller]
fn check(cases: &str) {
    for case in cases.trim().lines() {
        let (arguments, says) = case.split_once(" -> ").expect(case);
        let arguments: Vec<&str> = arguments.split('|').map(str::trim).collect();
        let error = gaugewright(&arguments).refused();
        for part in says.split(" & ") {
            assert!(error.contains(part), "{arguments:?}: {part:?} in {error}");
        }
        assert_eq!(error.lines().count(), 1, "one line: {error}");
    }
}

#[test]
fn names_of_algebras() {
    check(
        r#"
algebra | SO(4) -> "SO(4)" & SU(2) x SU(2)
algebra | SO(2) -> abelian & write "U(1)"
algebra | SO(1) -> SO(1)
algebra | SU(1) -> rank 0 & write SU(2)
algebra | SU(0) -> rank 0 & write SU(2)
algebra | U(1) -> abelian
algebra | E9 -> E has rank 6 to 8
algebra | E5 -> E has rank 6 to 8
algebra | F5 -> F has rank 4
algebra | G3 -> G has rank 2
algebra | H4 -> "H4" is no algebra; write SU(N)
algebra | Sp(3) -> odd size & Sp(4)
algebra | Sp(0) -> Sp(0)
algebra |  -> "" is no algebra; write SU(N)
algebra | SU(-3) -> "SU(-3)" is no algebra; write SU(N)
algebra | SU(5 -> "SU(5" is no algebra; write SU(N)
algebra | SU(3) x SU(2) -> is no algebra
algebra | Z(3) -> is no algebra
algebra | 5 -> is no algebra
algebra | ν -> is no algebra
algebra | SU(1000000) -> beyond rank 256 & SU(257)
algebra | A1000000 -> beyond rank 256
algebra | SO(1000000) -> beyond rank 256
algebra | SU(99999999999999999999999) -> beyond rank 256
algebra | SU(18446744073709551616) -> beyond rank 256
irrep | SU(1000000) | 1000000 -> beyond rank 256
catalog | SU(1000000) -> beyond rank 256
product | E9 | 1 | 1 -> E has rank 6 to 8
power | SO(4) | 4 | --degree | 2 -> SU(2) x SU(2)
"#,
    );
}

#[test]
fn names_and_labels_of_irreps() {
    check(
        r#"
irrep | SU(5) |  -> "" is no irrep & (1000)
irrep | SU(5) | 11 -> no irrep "11" & 10 = (0100)
irrep | SU(5) | 10'' -> no irrep "10''"
irrep | SU(5) | ten -> "ten"
irrep | SU(5) | 0 -> "0"
irrep | SU(5) | -5 -> "-5"
irrep | SU(5) | 5/2 -> "5/2"
irrep | SO(8) | 8 -> 8v = (1000), 8s = (0001), 8c = (0010)
irrep | SU(5) | (1,0,0) -> 4 Dynkin labels & 3 given
irrep | SU(5) | (1,0,0,0,0) -> 4 Dynkin labels & 5 given
irrep | SU(5) | () -> Dynkin label
irrep | SU(5) | (1,0,0,0 -> (1,0,0,0
irrep | SU(5) | (-1,0,0,0) -> "-1" & from 0 to 4294967295
irrep | SU(5) | (1/2,0,0,0) -> "1/2" & from 0 to 4294967295
irrep | SU(5) | (4294967296,0,0,0) -> "4294967296" & from 0 to 4294967295
irrep | SU(5) | (99999999999999999999999,0,0,0) -> from 0 to 4294967295
irrep | SU(5) | (a,b,c,d) -> "a"
irrep | SU(3) | 99999999999999999999999999 -> beyond dimension & write its Dynkin labels
irrep | E6 | 28 -> no irrep "28" & 27 = (100000)
product | SU(5) | 10 | 11 -> no irrep "11"
product | SU(5) | 10 | -1 -> "-1"
power | SU(5) | 10 | --degree | 2 | --symmetry | 3,1 -> partition
power | SU(5) | 10 | --degree | 2 | --symmetry | sym -> sym
power | SU(5) | 10 -> needs a degree; give a degree
power | SU(5) | 10 | --degree | 41 -> degree 41 is beyond 40, the largest power that is taken
power | SU(5) | 10 | --symmetry | antisymmetric | --degree | 41 -> degree 41 is beyond 40
"#,
    );
}

#[test]
fn bounds() {
    check(
        r#"
catalog | SU(5) | --max-dimension | -3 -> "-3" is no whole number & largest dimension
catalog | SU(5) | --max-dimension | 1e9 -> "1e9" is no whole number
catalog | SU(5) | --max-dimension | 1.5 -> "1.5" is no whole number
catalog | SU(5) | --max-dimension |  -> "" is no whole number
catalog | SU(5) | --max-index | x -> "x" is no whole number & largest index
catalog | SU(5) | --max-dimension | 99999999999999999999 -> more than 100000
catalog | SU(5) | --max-dimension | 50 | --limit | 3 -> more than 3
"#,
    );
    let digits = "9".repeat(900);
    gaugewright(["catalog", "SU(5)", "--max-dimension", &digits]).refused();
}

/// The greatest labels that can be written are answered or refused, not wrapped.
#[test]
fn labels_at_the_edge() {
    let edge = u32::MAX.to_string();
    for (algebra, rank) in [
        ("SU(2)", 1),
        ("SU(3)", 2),
        ("G2", 2),
        ("E8", 8),
        ("SO(10)", 5),
    ] {
        let labels = format!("({})", vec![&*edge; rank].join(","));
        let answer = gaugewright(["irrep", algebra, &labels]).done();
        assert!(answer.contains(&labels), "{answer}");
    }
    // dim = label + 1 in SU(2); l = (n^3 - n) / 6 with n that dimension.
    let answer = crate::run::json(["irrep", "SU(2)", "(4294967295)"]);
    assert_eq!(answer["dimension"].to_string(), "4294967296");
    let n: u128 = 1 << 32;
    assert_eq!(
        answer["dynkin_index"].to_string(),
        ((n * n * n - n) / 6).to_string()
    );
    for line in [
        [
            "product",
            "SU(3)",
            "(4294967295,0)",
            "(4294967295,4294967295)",
        ],
        ["product", "SU(2)", "(4294967295)", "(4294967295)"],
        ["irrep", "SU(3)", "(4294967295,0)", "--weights=all"],
    ] {
        let start = Instant::now();
        gaugewright(line).refused();
        assert!(start.elapsed() < Duration::from_secs(10), "{line:?}");
    }
}

/// Arguments of 100 kB: an error that does not repeat all of it, and soon.
#[test]
fn long_arguments() {
    let long = 100_000;
    let nines = "9".repeat(long);
    let list = format!("({})", vec!["1"; long / 2].join(","));
    let brackets = "(".repeat(long);
    let letters = "ν".repeat(long / 2);
    for argument in [&nines, &list, &brackets, &letters] {
        for line in [
            vec!["algebra", argument],
            vec!["irrep", "SU(5)", argument],
            vec!["irrep", argument, "10"],
            vec!["product", "SU(5)", argument, argument],
            vec!["power", "SU(5)", "5", "--symmetry", argument],
            vec!["catalog", "SU(5)", "--max-dimension", argument],
            vec!["audit", argument],
            vec!["batch", argument],
        ] {
            let start = Instant::now();
            let error = gaugewright(&line).refused();
            let shown: usize = error.len();
            assert!(
                shown < 1000,
                "{} {}: {shown} bytes",
                line[0].len(),
                line.len()
            );
            assert!(start.elapsed() < Duration::from_secs(5));
        }
    }
}

/// Bytes that are no UTF-8 are refused, or are a file name like any other.
#[cfg(unix)]
#[test]
fn arguments_that_are_no_text() {
    use std::os::unix::ffi::OsStringExt;
    let bytes = || OsString::from_vec(b"SU\xff(5)".to_vec());
    for line in [
        vec!["algebra".into(), bytes()],
        vec!["irrep".into(), "SU(5)".into(), bytes()],
        vec![
            "catalog".into(),
            "SU(5)".into(),
            "--max-dimension".into(),
            bytes(),
        ],
        vec!["algebra".into(), "SU(5)".into(), "--format".into(), bytes()],
        vec![
            "algebra".into(),
            "SU(5)".into(),
            "--numbering".into(),
            bytes(),
        ],
        vec!["audit".into(), bytes()],
        vec!["anomalies".into(), bytes()],
        vec!["batch".into(), bytes()],
        vec![bytes()],
    ] {
        gaugewright(line).refused();
    }
    let directory = tempfile::tempdir().unwrap();
    let odd = directory.path().join(bytes());
    let model = crate::run::workspace().join("docs/models/su5.toml");
    std::fs::copy(model, &odd).unwrap();
    gaugewright(["audit".into(), odd.into_os_string()]).done();
}

/// Escape sequences in what is typed do not come back raw (`Run` checks it); they are shown.
#[test]
fn escape_sequences_are_shown() {
    for line in [
        vec!["algebra", "\x1b[31mSU(5)"],
        vec!["irrep", "SU(5)", "10\x1b[0m"],
        vec!["audit", "\x1b]0;title\x07.toml"],
        vec!["batch", "\u{9b}31m"],
        vec!["catalog", "SU(5)", "--max-dimension", "1\x1b[0m"],
    ] {
        let error = gaugewright(&line).refused();
        assert!(error.contains("\\u{"), "{error}");
    }
    let request = b"{\"command\": \"algebra\", \"algebra\": \"\\u001b[31m\\u009b\"}\n";
    with_input(&["batch", "-"], request).done();
}
