//! GAP, a general-purpose algebra system, as one process that runs one script.

use std::env;
use std::ffi::OsString;
use std::io::Write;
use std::process::{Command, Stdio};

use num_bigint::BigInt;

/// The program: `gap`, or what the variable `GAP` says.
fn program() -> OsString {
    env::var_os("GAP").unwrap_or_else(|| "gap".into())
}

/// Runs `script` and hands back the lines it printed; `None`, with a line that says so, where
/// there is no GAP.
///
/// Library packages of GAP are not loaded: its core is enough, and starts faster.
///
/// # Panics
/// Where GAP is missing although the variable `CI` or `REQUIRE_GAP` is set, since a check that
/// silently checks nothing is worse than none; and where GAP reports an error.
#[must_use]
pub fn run(script: &str) -> Option<Vec<String>> {
    let mut file = tempfile::NamedTempFile::new().expect("a temporary file can be made");
    // Lines are not to be broken at the width of a screen.
    let whole = format!("SetPrintFormattingStatus(\"*stdout*\", false);\n{script}\nQUIT;\n");
    file.write_all(whole.as_bytes())
        .expect("the script can be written");
    let started = Command::new(program())
        .args(["-A", "-q", "-b", "-T"])
        .arg(file.path())
        .stdin(Stdio::null())
        .output();
    let output = match started {
        Ok(output) => output,
        Err(error) => {
            let required = ["CI", "REQUIRE_GAP"]
                .map(env::var_os)
                .iter()
                .any(Option::is_some);
            assert!(!required, "gap is required here and cannot be run: {error}");
            // Not by `println!`, which the test runner would swallow.
            let line = format!("skipped: no gap ({error}); install gap-core or set GAP\n");
            std::io::stderr()
                .write_all(line.as_bytes())
                .expect("standard error is open");
            return None;
        }
    };
    let printed = String::from_utf8_lossy(&output.stdout);
    let complaints = String::from_utf8_lossy(&output.stderr);
    let error = printed.find("Error,").map(|place| &printed[place..]);
    assert!(
        output.status.success() && error.is_none() && complaints.is_empty(),
        "gap failed: {}\n{complaints}",
        error.unwrap_or_default()
    );
    Some(printed.lines().map(str::to_owned).collect())
}

/// The whole numbers in a line, whatever stands between them.
///
/// # Panics
/// Where a minus sign stands alone.
#[must_use]
pub fn numbers(line: &str) -> Vec<BigInt> {
    line.split(|c: char| !c.is_ascii_digit() && c != '-')
        .filter(|part| !part.is_empty())
        .map(|part| part.parse().expect("a whole number"))
        .collect()
}
