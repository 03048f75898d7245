//! LaTeX: it compiles by itself and inside a document, with no package, whatever a model's labels.

use std::env;
use std::path::Path;
use std::process::{Command, Stdio};

use crate::run::{TempFile, gaugewright};
use crate::streams::COMMANDS;

/// Whether there is a pdflatex. In continuous integration (`CI` is set) there must be one.
fn pdflatex_is_here() -> bool {
    let found = Command::new("pdflatex")
        .arg("--version")
        .stdout(Stdio::null())
        .status();
    let here = found.is_ok_and(|status| status.success());
    if !here {
        assert!(
            env::var_os("CI").is_none(),
            "install pdflatex: Debian's texlive-latex-base"
        );
        eprintln!("skipped: there is no pdflatex; Debian has it in texlive-latex-base");
    }
    here
}

/// The log of a compilation that must succeed.
#[track_caller]
fn compile(directory: &Path, file: &str) -> String {
    let output = Command::new("pdflatex")
        .args(["-interaction=nonstopmode", "-halt-on-error", file])
        .current_dir(directory)
        .output()
        .expect("pdflatex runs");
    let log = String::from_utf8_lossy(&output.stdout).into_owned();
    assert!(output.status.success(), "{file}: {log}");
    assert!(!log.contains("Missing character"), "{file}: {log}");
    assert!(log.contains("Output written"), "{file}: {log}");
    log
}

/// Every command's output alone, and all of them taken into one document.
#[test]
fn every_command_compiles() {
    let directory = tempfile::tempdir().unwrap();
    let mut document = String::from("\\documentclass{article}\n\\begin{document}\nBefore.\n");
    for (place, line) in COMMANDS.iter().enumerate() {
        let latex = gaugewright(line.split(' ').chain(["--format", "latex"])).done();
        assert!(latex.is_ascii(), "{line}");
        assert!(!latex.contains("\\usepackage"), "{line}");
        let name = format!("answer{place}.tex");
        std::fs::write(directory.path().join(&name), latex).unwrap();
        document += &format!("\\input{{answer{place}}}\nBetween.\n");
    }
    document += "\\end{document}\n";
    std::fs::write(directory.path().join("document.tex"), document).unwrap();
    if !pdflatex_is_here() {
        return;
    }
    compile(directory.path(), "document.tex");
    for (place, line) in COMMANDS.iter().enumerate() {
        let log = compile(directory.path(), &format!("answer{place}.tex"));
        for points in log
            .lines()
            .filter_map(|line| line.strip_prefix("Overfull \\hbox ("))
        {
            let points: f64 = points.split("pt").next().unwrap().parse().unwrap();
            assert!(points < 5.0, "{line}: {points} points too wide");
        }
    }
}

/// LaTeX's own characters, Greek, accents and other scripts, in title and labels.
const LABELS: [&str; 12] = [
    "& % $ # _ { } ~ ^ \\ < > | [ ]",
    "[x] \\end{document} \\input{/etc/passwd}",
    "$x$ % all the rest",
    "* starred \" quoted \" `back` ''ticks'' -- --- ?` !`",
    "\u{b5} \u{3bc} \u{3bd} \u{3bd}\u{304}_\u{3c4} \u{39d} \u{3a9} \u{3c6}\u{3d5} \u{3bd}\u{303}",
    "\u{e9}\u{e8}\u{fc}\u{f1}\u{e7}\u{df}\u{f8}\u{142} \u{151} \u{1ebf} \u{ee} \u{12d} \u{f0}\u{fe}\u{111}",
    "\u{2192} \u{2297} \u{2295} \u{2264} \u{d7} \u{b1} \u{2212} \u{b2} \u{2082} \u{2020} \u{2113} \u{210f} \u{221e} \u{b0}",
    "\u{4e2d}\u{6587} \u{440}\u{443}\u{441} \u{5d0} \u{1f980}",
    "\u{2018}a\u{2019} \u{201c}b\u{201d} \u{2013} \u{2014} \u{2026}\u{a0}\u{ab}x\u{bb}",
    "e\u{301}\u{327} \u{301} \u{200b}x &\u{301} \\\u{302} 5\u{303}",
    "\\\\ \\par \\begin{tabular}{ll}",
    "]",
];

fn odd_model() -> String {
    let quoted = |text: &str| format!("\"{}\"", text.replace('\\', "\\\\").replace('"', "\\\""));
    let mut text = format!("[model]\ntitle = {}\n", quoted(LABELS[4]));
    text += &format!("source = {}\n", quoted(LABELS[0]));
    for label in &LABELS[..3] {
        text += &format!(
            "[[symmetry]]\nlabel = {}\nalgebra = \"U(1)\"\n",
            quoted(label)
        );
    }
    for label in LABELS {
        text += &format!(
            "[[multiplet]]\nlabel = {}\nfield = \"left-handed fermion\"\ntransforms = {{ {} = \"1/3\" }}\n",
            quoted(label),
            quoted(LABELS[0]),
        );
    }
    text
}

#[test]
fn odd_labels_compile() {
    let file = TempFile::new("odd.toml", odd_model());
    let directory = tempfile::tempdir().unwrap();
    for command in ["audit", "anomalies"] {
        let latex = gaugewright([command, &file.arg(), "--format", "latex"]).not_consistent();
        assert!(latex.is_ascii());
        // The label is set as words: no command of its own is left.
        assert!(!latex.contains("\\input{/etc") && latex.matches("\\end{document}").count() == 1);
        assert!(
            latex.contains("$\\mu$") && latex.contains("$\\bar{\\nu}$\\_$\\tau$"),
            "{latex}"
        );
        assert!(latex.contains("U+4E2DU+6587"));
        let name = format!("{command}.tex");
        std::fs::write(directory.path().join(&name), latex).unwrap();
    }
    let document = "\\documentclass{article}\\begin{document}\n\\input{audit}\\input{anomalies}\n\
                    \\end{document}\n";
    std::fs::write(directory.path().join("document.tex"), document).unwrap();
    if !pdflatex_is_here() {
        return;
    }
    for name in ["audit.tex", "anomalies.tex", "document.tex"] {
        compile(directory.path(), name);
    }
}
