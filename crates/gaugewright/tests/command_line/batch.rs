//! Many requests in one run.

use std::io::{BufRead, BufReader, Write};
use std::process::Stdio;
use std::sync::mpsc;
use std::thread;
use std::time::Duration;

use serde_json::{Value, json};

use crate::run::{TempFile, gaugewright, models, program, with_input};

#[track_caller]
fn answers(input: &[u8]) -> Vec<Value> {
    let said = with_input(&["batch", "-"], input).done();
    said.lines()
        .map(|line| serde_json::from_str(line).expect(line))
        .collect()
}

/// A request and the arguments of the single command that answers the same.
type Pair = (Value, Vec<String>);

fn pair(request: Value, arguments: &[&str]) -> Pair {
    (
        request,
        arguments.iter().map(|&one| one.to_owned()).collect(),
    )
}

/// How many of [`requests`] are neither a plain `irrep` nor `anomalies`; these come first.
const OTHERS: usize = 7;

fn requests() -> Vec<Pair> {
    let mut pairs = vec![
        pair(
            json!({"command": "algebra", "algebra": "E6"}),
            &["algebra", "E6"],
        ),
        pair(
            json!({"command": "catalog", "algebra": "G2", "max_dimension": 100}),
            &["catalog", "G2", "--max-dimension", "100"],
        ),
        pair(
            json!({"command": "catalog", "algebra": "SU(3)", "max_index": "50"}),
            &["catalog", "SU(3)", "--max-index", "50"],
        ),
        pair(
            json!({"command": "irrep", "algebra": "SU(3)", "irrep": 8, "weights": "all"}),
            &["irrep", "SU(3)", "8", "--weights", "all"],
        ),
        pair(
            json!({"command": "product", "algebra": "SU(5)", "factors": ["10", [1, 0, 0, 0], 24]}),
            &["product", "SU(5)", "10", "5", "24"],
        ),
        pair(
            json!({"command": "power", "algebra": "E6", "irrep": "27", "degree": 3,
                   "symmetry": "symmetric"}),
            &[
                "power",
                "E6",
                "27",
                "--degree",
                "3",
                "--symmetry",
                "symmetric",
            ],
        ),
        pair(json!({"command": "audit"}), &["audit"]),
    ];
    assert_eq!(pairs.len(), OTHERS);
    for (algebra, irrep) in [
        ("SU(5)", "10bar"),
        ("SO(10)", "(0,0,0,0,1)"),
        ("SO(8)", "8v"),
        ("E8", "248"),
        ("Sp(6)", "14'"),
        ("E7", "(0,0,0,0,0,3,0)"),
    ] {
        pairs.push(pair(
            json!({"command": "irrep", "algebra": algebra, "irrep": irrep}),
            &["irrep", algebra, irrep],
        ));
    }
    for path in models("docs/models")
        .iter()
        .chain(&models("docs/models/broken"))
    {
        let model: toml::Value = toml::from_str(&std::fs::read_to_string(path).unwrap()).unwrap();
        pairs.push(pair(
            json!({"command": "anomalies", "model": model}),
            &["anomalies", path],
        ));
    }
    pairs
}

/// 10,000 mixed requests: as many answers, in order, each the bytes of the single command's.
#[test]
fn ten_thousand_requests() {
    const COUNT: usize = 10_000;
    let pairs = requests();
    let single: Vec<String> = pairs
        .iter()
        .map(|(_, arguments)| {
            let format = ["--format".to_owned(), "json".to_owned()];
            gaugewright(arguments.iter().chain(&format)).stdout
        })
        .collect();
    // Mixed so that neighbours differ, and mostly what is asked most: irreps and anomalies.
    let rest = pairs.len() - OTHERS;
    let chosen: Vec<usize> = (0..COUNT)
        .map(|place| match place % 25 {
            0 => (place / 25) % OTHERS,
            _ => OTHERS + (place * 7 + place / 13) % rest,
        })
        .collect();
    let lines: Vec<String> = pairs
        .iter()
        .map(|(request, _)| request.to_string())
        .collect();
    let text: Vec<&str> = chosen.iter().map(|&one| &*lines[one]).collect();
    let file = TempFile::new("requests.jsonl", text.join("\n"));
    let said = gaugewright(["batch", &file.arg()]).done();
    assert_eq!(said.lines().count(), COUNT);
    for (place, (line, &one)) in said.split_inclusive('\n').zip(&chosen).enumerate() {
        assert_eq!(line, single[one], "line {place}: {}", lines[one]);
    }
}

/// Numbering is for all lines of the run.
#[test]
fn numbering() {
    let input = br#"{"command": "irrep", "algebra": "G2", "irrep": [1, 0]}"#;
    let said = with_input(&["batch", "-", "--numbering", "bourbaki"], input).done();
    let answer: Value = serde_json::from_str(&said).unwrap();
    assert_eq!(
        answer,
        crate::run::json_words("irrep G2 7 --numbering bourbaki")
    );
}

/// Bad lines are reported in their place and say what is wrong; blank ones are no requests.
#[test]
fn bad_lines_in_place() {
    let bad = [
        (r#"nonsense"#, "one JSON object"),
        (
            r#"not json"#,
            "the line is no JSON: expected a value at column 2",
        ),
        (
            r#"{"command": "irrep", "algebra": "G2", "irrep": "7", "weights": "ALL"}"#,
            "\"weights\" cannot be \"ALL\": it is \"dominant\" or \"all\"",
        ),
        (
            r#"{"command": "irrep", "algebra": "G2", "irrep": "7", "max_weights": 1.5}"#,
            "\"max_weights\" cannot be 1.5: it is a whole number",
        ),
        (
            r#"{"command": "power", "algebra": "G2", "irrep": "7", "degree": -1}"#,
            "\"degree\" cannot be -1: it is a whole number from 0 to 4294967295",
        ),
        (
            r#"{"command": "power", "algebra": "G2", "irrep": "7", "degree": "2"}"#,
            "\"degree\" cannot be \"2\"",
        ),
        (
            r#"{"command": "power", "algebra": "G2", "irrep": "7", "degree": 2, "max_terms": []}"#,
            "\"max_terms\" cannot be []",
        ),
        (
            r#"{"command": "power", "algebra": "G2", "irrep": "7", "symmetry": [2, 0.5]}"#,
            "\"symmetry\" cannot be [2,0.5]",
        ),
        (
            r#"{"command": "power", "algebra": "G2", "irrep": "7", "symmetry": 2}"#,
            "\"symmetry\" cannot be 2",
        ),
        (
            r#"{"command": "power", "algebra": "G2", "irrep": "7", "symmetry": [1, 2]}"#,
            "\"1,2\" is no partition",
        ),
        (
            r#"{"command": "power", "algebra": "G2", "irrep": "7", "symmetry": "antisymmetric"}"#,
            "give a degree",
        ),
        (
            r#"{"command": "catalog", "algebra": "G2", "limit": -1}"#,
            "\"limit\" cannot be -1",
        ),
        (r#"{"command": "irrep""#, "EOF"),
        (r#"[1, 2]"#, "JSON object"),
        (r#""irrep""#, "an object with the key"),
        (r#"7"#, "an object with the key"),
        (r#"null"#, "an object with the key"),
        (r#"{}"#, "missing key `command`"),
        (r#"{"algebra": "SU(5)"}"#, "missing key `command`"),
        (r#"{"command": "solve"}"#, "unknown command `solve`"),
        (r#"{"command": 5}"#, "command"),
        (
            r#"{"command": "batch", "file": "-"}"#,
            "unknown command `batch`",
        ),
        (
            r#"{"command": "irrep", "algebra": "SU(5)"}"#,
            "missing key `irrep`",
        ),
        (
            r#"{"command": "irrep", "algebra": "SU(5)", "irep": "5"}"#,
            "unknown key `irep`",
        ),
        (
            r#"{"command": "irrep", "algebra": "SU(5)", "irrep": "5", "irrep": "10"}"#,
            "duplicate",
        ),
        (
            r#"{"command": "irrep", "algebra": "SU(5)", "irrep": "11"}"#,
            "10 = (0100)",
        ),
        (
            r#"{"command": "irrep", "algebra": "SO(4)", "irrep": "4"}"#,
            "SU(2) x SU(2)",
        ),
        (
            r#"{"command": "irrep", "algebra": "SU(5)", "irrep": [1, 0]}"#,
            "4 Dynkin labels",
        ),
        (
            r#"{"command": "irrep", "algebra": "SU(5)", "irrep": [-1, 0, 0, 0]}"#,
            "-1 is no Dynkin label",
        ),
        (
            r#"{"command": "irrep", "algebra": "SU(5)", "irrep": [1e30, 0, 0, 0]}"#,
            "no Dynkin label",
        ),
        (
            r#"{"command": "irrep", "algebra": "SU(5)", "irrep": 1.5}"#,
            "1.5 is no irrep",
        ),
        (
            r#"{"command": "irrep", "algebra": "SU(5)", "irrep": null}"#,
            "null is no irrep",
        ),
        (
            r#"{"command": "irrep", "algebra": 5, "irrep": "5"}"#,
            "expected a string",
        ),
        (
            r#"{"command": "product", "algebra": "SU(5)", "factors": "10"}"#,
            "expected a list",
        ),
        (
            r#"{"command": "catalog", "algebra": "SU(5)", "max_dimension": -5}"#,
            "no whole number",
        ),
        (
            r#"{"command": "catalog", "algebra": "SU(5)", "max_dimension": [5]}"#,
            "no whole number",
        ),
        (r#"{"command": "anomalies"}"#, "missing key `model`"),
        (r#"{"command": "anomalies", "model": "m.toml"}"#, "m.toml"),
        (r#"{"command": "anomalies", "model": {}}"#, "no symmetry"),
        (
            r#"{"command": "anomalies", "model": {"symmetry": [{"label": "c", "algebra": "SU(3)"}],
               "multiplet": [{"label": "q", "field": "left-handed fermion",
               "transforms": {"c": "7"}}]}}"#,
            "multiplet[0].transforms.c",
        ),
        (
            r#"{"command": "anomalies", "model": {"symmetry": [{"label": "c", "algebra": "SU(3)"}],
               "multiplet": [{"label": "q", "field": "left-handed fermion", "copies": 3,
               "copies": 1, "transforms": {"c": "3"}}]}}"#,
            "model: multiplet[0].copies: this key is written twice",
        ),
        (
            r#"{"command": "audit", "model": {"symmetry": [{"label": "c", "algebra": "SU(3)"}],
               "multiplet": [{"label": "q", "field": "left-handed fermion",
               "transforms": {"c": "3", "c": "3bar"}}]}}"#,
            "model: multiplet[0].transforms.c: this key is written twice",
        ),
    ];
    let good = r#"{"command": "irrep", "algebra": "SU(5)", "irrep": "5"}"#;
    let mut input = String::new();
    for (line, _) in bad {
        input += &format!("{}\n\n  \t \r\n{good}\r\n", line.replace('\n', " "));
    }
    let answers = answers(input.as_bytes());
    assert_eq!(answers.len(), 2 * bad.len());
    for (pair, (line, says)) in answers.chunks(2).zip(bad) {
        let error = pair[0]["error"].as_str().expect(line);
        assert!(error.contains(says), "{line}: {error}");
        assert_eq!(pair[0].as_object().unwrap().len(), 1);
        for word in [
            "enum", "variant", "u32", "usize", "sequence", "struct", "field `", "ident", "--",
        ] {
            assert!(!error.contains(word), "a word of Rust in {error}");
        }
        assert_eq!(pair[1]["dimension"], 5);
    }
}

/// `symmetry` as it may be written, and what a command line says for the same.
#[test]
fn symmetries_of_a_power() {
    for (keys, arguments) in [
        (r#""degree": 2"#, "--degree 2"),
        (r#""symmetry": [2, 1]"#, "--symmetry 2,1"),
        (r#""symmetry": "2,1", "degree": null"#, "--symmetry 2,1"),
    ] {
        let line = format!(r#"{{"command": "power", "algebra": "G2", "irrep": 7, {keys}}}"#);
        let expected = crate::run::json_words(&format!("power G2 7 {arguments}"));
        assert_eq!(answers(line.as_bytes()), [expected], "{line}");
    }
}

#[test]
fn lines_that_are_no_text() {
    let good = r#"{"command": "irrep", "algebra": "SU(5)", "irrep": "5"}"#;
    let mut input = Vec::new();
    input.extend_from_slice(b"\xff\xfe{\n");
    input.extend_from_slice(format!("{good}\n").as_bytes());
    let deep = format!(
        "{{\"command\": \"anomalies\", \"model\": {}",
        "[".repeat(100_000)
    );
    // Longer than is read, and then a line that is answered.
    input.extend(std::iter::repeat_n(b'x', (4 << 20) + 10));
    input.extend_from_slice(format!("\n{good}\n\0\n{deep}\n").as_bytes());
    // No newline at the end.
    input.extend_from_slice(good.as_bytes());
    let answers = answers(&input);
    let dimensions: Vec<Option<u64>> = answers
        .iter()
        .map(|one| one["dimension"].as_u64())
        .collect();
    assert_eq!(
        dimensions,
        [None, Some(5), None, Some(5), None, None, Some(5)]
    );
    let error = |place: usize| answers[place]["error"].as_str().unwrap();
    assert!(error(0).contains("UTF-8") && error(2).contains("longer than 4 MiB"));
    assert!(error(5).contains("recursion limit"), "{}", error(5));
}

#[test]
fn nothing_asked() {
    for input in [&b""[..], b"\n", b"\n \n\t\n\r\n"] {
        assert_eq!(with_input(&["batch", "-"], input).done(), "");
    }
}

/// A program writes one request, waits for its answer, and only then writes the next.
#[test]
fn an_answer_for_each_line_at_once() {
    let mut child = program()
        .args(["batch", "-"])
        .stdin(Stdio::piped())
        .stdout(Stdio::piped())
        .spawn()
        .unwrap();
    let mut stdin = child.stdin.take().unwrap();
    let stdout = BufReader::new(child.stdout.take().unwrap());
    let (sender, answers) = mpsc::channel();
    let reader = thread::spawn(move || {
        for line in stdout.lines() {
            sender.send(line.unwrap()).unwrap();
        }
    });
    let mut ask = |text: &str, expected: &[u64]| {
        stdin.write_all(text.as_bytes()).unwrap();
        stdin.flush().unwrap();
        for dimension in expected {
            let line = answers.recv_timeout(Duration::from_secs(20));
            let line = line.expect("an answer before the next request");
            let answer: Value = serde_json::from_str(&line).unwrap();
            assert_eq!(answer["dimension"], *dimension);
        }
    };
    let request =
        |name: &str| format!(r#"{{"command":"irrep","algebra":"SU(5)","irrep":"{name}"}}"#);
    for _ in 0..20 {
        ask(&(request("5") + "\n"), &[5]);
    }
    // A blank line in between, two at once, one and a half.
    ask(&format!("\n{}\n\n", request("10")), &[10]);
    ask(
        &format!("{}\n{}\n", request("10"), request("24")),
        &[10, 24],
    );
    let half = request("15");
    ask(&format!("{}\n{}", request("5"), &half[..20]), &[5]);
    ask(&format!("{}\n", &half[20..]), &[15]);
    drop(stdin);
    assert!(child.wait().unwrap().success());
    reader.join().unwrap();
}
