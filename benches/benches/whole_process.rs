//! Whole processes of the release binary, start to end, with the answers asserted.
//!
//! `cargo bench -p benches --bench whole_process`, which builds the binary first. Targets: 100 ms
//! for the audit of the demonstration, 50 ms for the catalogue of E8. The limit is what the system
//! takes to start and end a process that does nothing, printed first.

use std::path::{Path, PathBuf};
use std::process::{Command, Output};
use std::time::{Duration, Instant};

const RUNS: usize = 40;

fn main() {
    let binary = build();
    println!(
        "{:<50} {:>9} {:>9} {:>7}",
        "process", "least", "median", "target"
    );
    report(
        "/bin/true",
        None,
        || run(Path::new("/bin/true"), &[]),
        |_| {},
    );
    report(
        "gaugewright audit (the demonstration)",
        Some(100),
        || run(&binary, &["audit"]),
        |said| {
            assert!(said.starts_with("Lanternfish\n"), "{said}");
            assert!(said.contains("consistent: all 12 anomaly conditions hold"));
            assert!(said.contains("the subgroup Z6 of the centre"));
        },
    );
    let catalog = ["catalog", "E8", "--max-dimension", "1000000000"];
    report(
        "gaugewright catalog E8 --max-dimension 1000000000",
        Some(50),
        || run(&binary, &catalog),
        |said| {
            // The count and the ends of a list that is in print: McKay-Patera 1981, from memory.
            assert!(said.starts_with("22 irreps of E8 "), "{said}");
            for dimension in ["3875", "147250", "344452500", "820260000"] {
                assert!(said.contains(dimension), "{said}");
            }
        },
    );
}

/// The release binary, which lies beside the folder of this one.
fn build() -> PathBuf {
    let built = Command::new(env!("CARGO"))
        .args([
            "build",
            "--release",
            "-p",
            "gaugewright",
            "--bin",
            "gaugewright",
        ])
        .status();
    assert!(built.expect("cargo runs").success());
    let own = std::env::current_exe().expect("this process has a file");
    let release = own.parent().and_then(Path::parent);
    release.expect("a target folder").join("gaugewright")
}

fn run(program: &Path, arguments: &[&str]) -> Output {
    Command::new(program)
        .args(arguments)
        .output()
        .expect("a program that starts")
}

fn report(name: &str, target: Option<u64>, call: impl Fn() -> Output, check: impl Fn(&str)) {
    let mut times: Vec<Duration> = Vec::with_capacity(RUNS);
    for _ in 0..RUNS {
        let start = Instant::now();
        let output = call();
        times.push(start.elapsed());
        assert!(output.status.success(), "{name}");
        check(&String::from_utf8(output.stdout).expect("UTF-8"));
    }
    times.sort_unstable();
    let time = |time: Duration| format!("{time:.2?}");
    println!(
        "{name:<50} {:>9} {:>9} {:>7}",
        time(times[0]),
        time(times[RUNS / 2]),
        target.map_or_else(String::new, |target| format!("{target}ms")),
    );
}
