//! The text that people read.

use crate::run::{TempFile, gaugewright, models, words};
use crate::streams::COMMANDS;

/// Columns of running text and of facts; tables may be wider.
const WIDTH: usize = 96;

fn all_screens() -> Vec<String> {
    let mut screens: Vec<String> = COMMANDS.iter().map(|line| words(line).stdout).collect();
    for model in models("docs/models")
        .iter()
        .chain(&models("docs/models/broken"))
    {
        screens.push(gaugewright(["audit", model]).stdout);
        screens.push(gaugewright(["anomalies", model]).stdout);
    }
    screens
}

#[test]
fn lines_end_cleanly() {
    for screen in all_screens() {
        assert!(
            screen.ends_with('\n') && !screen.ends_with("\n\n"),
            "{screen}"
        );
        assert!(!screen.contains("\n\n\n"), "{screen}");
        for line in screen.lines() {
            assert_eq!(line.trim_end(), line, "{screen}");
        }
    }
}

/// Facts are wrapped under their own column; no fact is lost by it.
#[test]
fn long_facts_hang() {
    let model = "docs/models/broken/mssm-one-higgs-doublet.toml";
    let screen = words(&format!("audit {model}")).not_consistent();
    let facts = screen.split("\n\n").nth(1).unwrap();
    assert!(facts.lines().count() > 4, "some are wrapped: {facts}");
    let column = facts.find("1/2, must be 0").unwrap();
    for line in facts.lines() {
        assert!(line.chars().count() <= WIDTH, "{line}");
        assert!(line.is_char_boundary(column));
        let (name, fact) = line.split_at(column);
        assert!(name.ends_with("  ") && !fact.starts_with(' '), "{line}");
    }
    let words: Vec<&str> = facts.split_whitespace().collect();
    let text = words.join(" ");
    let sum = "hypercharge^3 1/4, must be 0: 1/12 from quark doublet, -8/3 from up antiquark, \
               1/3 from down antiquark, -3/4 from lepton doublet, 3 from positron, 1/4 from up-type \
               Higgs doublet";
    assert!(text.contains(sum), "{text}");
}

#[test]
fn only_tables_are_wide() {
    for screen in all_screens() {
        for block in screen.split("\n\n") {
            // The rows of a table and its head begin with two spaces, as facts do; a table's first
            // line names columns.
            let table = [
                "  multiplet ",
                "  condition ",
                "  node ",
                "  name ",
                "  times ",
            ];
            if table.iter().any(|head| block.starts_with(head)) {
                continue;
            }
            for line in block.lines() {
                assert!(line.chars().count() <= WIDTH, "{line}");
            }
        }
    }
}

fn model(title: &str, label: &str) -> TempFile {
    let text = format!(
        "[model]\ntitle = \"{title}\"\n[[symmetry]]\nlabel = \"y\"\nalgebra = \"U(1)\"\n\
         [[multiplet]]\nlabel = \"{label}\"\nfield = \"left-handed fermion\"\n\
         transforms = {{ y = \"1\" }}\n[[multiplet]]\nlabel = \"plain\"\n\
         field = \"left-handed fermion\"\ntransforms = {{ y = \"-1\" }}\n"
    );
    TempFile::new("model.toml", text)
}

#[test]
fn long_titles_wrap() {
    let title = "word ".repeat(59) + "end";
    let screen = gaugewright(["audit", &model(&title, "a").arg()]).done();
    let (shown, rest) = screen.split_once("\nconsistent: ").unwrap();
    assert!(!rest.is_empty());
    assert!(
        shown.lines().count() == 4 && shown.lines().all(|line| line.len() <= WIDTH),
        "{shown}"
    );
    assert_eq!(shown.split_whitespace().count(), 60);
}

/// Wide characters take two columns and combining ones none: columns stay straight.
#[test]
fn columns_stay_straight() {
    for (label, columns) in [
        ("\u{4e2d}\u{6587}", 4),
        ("e\u{301}\u{304}x", 2),
        ("\u{3bd}_e", 3),
    ] {
        let screen = gaugewright(["audit", &model("t", label).arg()]).done();
        let row = |name: &str| {
            let begin = format!("  {name} ");
            screen
                .lines()
                .find(|line| line.starts_with(&begin))
                .expect(name)
        };
        let place = |row: &str| row.find("left-handed").unwrap();
        let gap = place(row(label)) - label.len();
        assert_eq!(gap + columns, place(row("plain")), "{screen}");
    }
}

/// Control characters are refused in titles and labels, and written out elsewhere. That none
/// reaches a terminal raw is checked on every run.
#[test]
fn escape_sequences_do_not_act() {
    for bad in [
        "\\u001B[31m",
        "a\\u0007",
        "a\\nb",
        "\\u009B31m",
        "a\\u007Fb",
    ] {
        gaugewright(["audit", &model(bad, "a").arg()]).refused();
        gaugewright(["audit", &model("t", bad).arg()]).refused();
    }
    let text = "[model]\ntitle = \"t\"\nsource = \"\\u001B[31mred\\u009B0m\\nnext\"\n\
                notes = \"\\u001B[2J\"\n[[symmetry]]\nlabel = \"y\\u202Ez\"\nalgebra = \"U(1)\"\n";
    let file = TempFile::new("model.toml", text);
    for format in ["text", "json", "latex"] {
        let screen = gaugewright(["audit", &file.arg(), "--format", format]).done();
        assert!(
            !screen.contains(['\u{1b}', '\u{9b}', '\u{202e}']),
            "{screen}"
        );
        let shown = match format {
            "text" => "\\u{1b}[31mred\\u{9b}0m next",
            "json" => "\\u001b[31mred\\u009b0m\\nnext",
            _ => "U+001B{[}31mredU+009B0m next",
        };
        assert!(screen.contains(shown), "{screen}");
    }
    // In the line of a file that an error shows, too.
    for line in [
        "title = \"\x1b[31m\"",
        "titel = \"\u{9b}31m\"",
        "\u{202e}x = 1",
        "x = \u{9b}",
    ] {
        let file = TempFile::new("model.toml", format!("[model]\n{line}\n"));
        let error = gaugewright(["audit", &file.arg()]).refused();
        assert!(!error.contains(['\u{9b}', '\u{202e}']), "{error}");
        assert!(error.contains("2 | "), "{error}");
    }
}
