//! Exit status, standard output and standard error.

use std::io::Read;
use std::process::Stdio;

use crate::run::{gaugewright, json, models, program, with_input, words, workspace};

/// One line for each command, which must be answered.
pub(crate) const COMMANDS: [&str; 9] = [
    "algebra SU(5)",
    "irrep SO(10) 16bar",
    "irrep G2 7 --weights all",
    "catalog SU(5)",
    "product SU(5) 10 10 5bar",
    "power SO(10) 16 --degree 2 --symmetry antisymmetric",
    "anomalies docs/models/standard-model.toml",
    "audit docs/models/mssm.toml",
    "audit",
];

#[test]
fn published_models_are_consistent() {
    for model in models("docs/models") {
        for command in ["audit", "anomalies"] {
            let said = gaugewright([command, &model]).done();
            let mut lines = said.lines();
            lines.next().expect("a title");
            let verdict = lines.next().expect("a verdict");
            assert!(verdict.starts_with("consistent: "), "{model}: {verdict}");
            let json = json([command, &model]);
            assert_eq!(json["consistent"], true, "{model}");
        }
    }
}

/// Exit status 1, and the failing conditions with their value and the multiplets behind them.
#[test]
fn broken_models_are_refused_and_told_why() {
    for model in models("docs/models/broken") {
        let said = gaugewright(["audit", &model]).not_consistent();
        assert!(
            said.lines()
                .any(|line| line.starts_with("NOT CONSISTENT: ")),
            "{said}"
        );
        let json = json(["anomalies", &model]);
        assert_eq!(json["consistent"], false, "{model}");
        let conditions = json["conditions"].as_array().unwrap();
        let failing: Vec<_> = conditions
            .iter()
            .filter(|one| one["cancels"] == false && one["must_cancel"] == true)
            .collect();
        assert!(!failing.is_empty(), "{model}");
        // The facts under the verdict, before the next section: each failing value and culprit.
        let blame = said.split("\nAnomalies\n").next().unwrap();
        let blame = blame.split_whitespace().collect::<Vec<_>>().join(" ");
        for condition in failing {
            let value = condition["value"].as_str().unwrap();
            assert!(blame.contains(&format!("{value}, must be ")), "{blame}");
            for share in condition["contributions"].as_array().unwrap() {
                let (label, adds) = (&share["multiplet"], &share["value"]);
                let culprit = format!(
                    "{} from {}",
                    adds.as_str().unwrap(),
                    label.as_str().unwrap()
                );
                assert_eq!(
                    blame.contains(&culprit),
                    adds != "0",
                    "{culprit} in {blame}"
                );
            }
        }
    }
}

#[test]
fn every_command_has_help() {
    let overview = words("--help").done();
    for command in [
        "algebra",
        "irrep",
        "product",
        "power",
        "catalog",
        "anomalies",
        "audit",
        "batch",
    ] {
        assert!(
            overview.contains(&format!("\n  {command} ")),
            "{command} in {overview}"
        );
        let help = gaugewright([command, "--help"]).done();
        assert!(
            help.contains(&format!("Usage: gaugewright {command}")),
            "{help}"
        );
        assert!(
            help.contains("--format") && help.contains("--numbering"),
            "{help}"
        );
        let widest = help.lines().map(|line| line.chars().count()).max();
        assert!(widest <= Some(100), "{help}");
        assert_eq!(gaugewright(["help", command]).done(), help);
    }
    assert!(words("--version").done().starts_with("gaugewright "));
}

#[test]
fn what_cannot_be_understood_is_refused() {
    for line in [
        "",
        "nonsense",
        "algebra",
        "algebra SU(5) SU(6)",
        "irrep SU(5)",
        "product SU(5)",
        "product",
        "power SO(10)",
        "anomalies",
        "batch",
        "audit one.toml two.toml",
        "audit --bogus",
        "algebra SU(5) --format xml",
        "algebra SU(5) --format",
        "algebra SU(5) --numbering kac",
        "catalog SU(5) --max-dimension 5 --max-index 5",
        "catalog SU(5) --limit -1",
        "irrep SU(5) 10 --weights some",
    ] {
        words(line).refused();
    }
    gaugewright::<&str>([]).refused();
    let refused = words("algebra SU(5) --numbering kac").refused();
    assert!(
        refused.contains("slansky") && refused.contains("bourbaki"),
        "{refused}"
    );
    let refused = words("algebra SU(5) --format xml").refused();
    assert!(refused.contains("text, json, latex"), "{refused}");
}

#[test]
fn colour_is_for_those_who_want_it() {
    let raw = |environment: &[(&str, &str)]| {
        let mut program = program();
        program.arg("audit").envs(environment.iter().copied());
        String::from_utf8(program.output().unwrap().stdout).unwrap()
    };
    let plain = raw(&[]);
    let forced = raw(&[("CLICOLOR_FORCE", "1")]);
    assert!(!plain.contains('\x1b') && forced.contains('\x1b'));
    assert_eq!(raw(&[("CLICOLOR_FORCE", "1"), ("NO_COLOR", "1")]), plain);
    // The two differ in colour only.
    let mut stripped = String::new();
    for piece in forced.split('\x1b') {
        let end = if piece.starts_with('[') {
            piece.find('m').unwrap() + 1
        } else {
            0
        };
        stripped.push_str(&piece[end..]);
    }
    assert_eq!(stripped, plain);
}

#[test]
fn json_is_the_same_whatever_the_terminal() {
    for line in COMMANDS {
        let mut program = program();
        program.args(line.split(' ')).args(["--format", "json"]);
        let output = program.env("CLICOLOR_FORCE", "1").output().unwrap();
        let once = words(&format!("{line} --format json")).done();
        assert_eq!(String::from_utf8(output.stdout).unwrap(), once, "{line}");
        assert_eq!(
            words(&format!("--format=json {line}")).done(),
            once,
            "{line}"
        );
    }
}

/// `gaugewright catalog ... | head -1`: no failure and nothing on standard error.
#[test]
fn a_reader_may_have_had_enough() {
    let requests = r#"{"command": "algebra", "algebra": "E8"}"#.to_owned() + "\n";
    let file = crate::run::TempFile::new("requests.jsonl", requests.repeat(300));
    for arguments in [
        vec!["catalog", "SU(3)", "--max-dimension", "20000"],
        vec![
            "catalog",
            "SU(3)",
            "--max-dimension",
            "20000",
            "--format",
            "json",
        ],
        vec!["batch", &file.arg()],
    ] {
        let mut child = program()
            .args(&arguments)
            .stdout(Stdio::piped())
            .stderr(Stdio::piped())
            .spawn()
            .unwrap();
        let mut stdout = child.stdout.take().unwrap();
        let mut start = [0; 16];
        stdout.read_exact(&mut start).unwrap();
        drop(stdout);
        let output = child.wait_with_output().unwrap();
        let stderr = String::from_utf8(output.stderr).unwrap();
        assert_eq!(
            (output.status.code(), &*stderr),
            (Some(0), ""),
            "{arguments:?}"
        );
    }
}

/// A disk that is full is told, with exit status 2.
#[cfg(target_os = "linux")]
#[test]
fn a_full_disk_is_told() {
    for arguments in [&["algebra", "E8"][..], &["batch", "-"][..]] {
        let full = std::fs::OpenOptions::new()
            .write(true)
            .open("/dev/full")
            .unwrap();
        let request = br#"{"command": "algebra", "algebra": "E8"}"#;
        let file = crate::run::TempFile::new("one.jsonl", request);
        let output = program()
            .args(arguments)
            .stdin(std::fs::File::open(file.path()).unwrap())
            .stdout(full)
            .output()
            .unwrap();
        let stderr = String::from_utf8(output.stderr).unwrap();
        assert_eq!(output.status.code(), Some(2), "{stderr}");
        assert!(stderr.contains("cannot be written"), "{stderr}");
    }
}

#[test]
fn a_model_comes_from_standard_input_too() {
    let path = workspace().join("docs/models/su5.toml");
    let text = std::fs::read(&path).unwrap();
    let named = gaugewright(["audit", path.to_str().unwrap()]).done();
    assert_eq!(with_input(&["audit", "-"], &text).done(), named);
    let refused = with_input(&["anomalies", "-"], b"[model]\ntitel = 1\n").refused();
    assert!(
        refused.contains("titel") && refused.contains(":2:1"),
        "{refused}"
    );
    // Without a name it is the demonstration, whatever stands on standard input.
    assert!(
        with_input(&["audit"], &text)
            .done()
            .starts_with("Lanternfish\n")
    );
}
