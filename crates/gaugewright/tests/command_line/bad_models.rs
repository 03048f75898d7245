//! Model files that are broken: the error names file, line and column, shows the line, and says
//! what to write instead.

use std::time::{Duration, Instant};

use crate::run::{Run, TempFile, gaugewright, program, workspace};

const GOOD: &str = r#"[model]
title = "Quarks"
[[symmetry]]
label = "colour"
algebra = "SU(3)"
[[symmetry]]
label = "hypercharge"
algebra = "U(1)"
[[multiplet]]
label = "quark"
field = "left-handed fermion"
copies = 3
transforms = { colour = "3", hypercharge = "1/6" }
[[multiplet]]
label = "antiquark"
field = "left-handed fermion"
copies = 3
transforms = { colour = "3bar", hypercharge = "-1/6" }
mass_gev = 1e3
"#;

#[track_caller]
fn refused(content: impl AsRef<[u8]>) -> (String, String) {
    let file = TempFile::new("model.toml", content);
    let audit = gaugewright(["audit", &file.arg()]).refused();
    assert_eq!(gaugewright(["anomalies", &file.arg()]).refused(), audit);
    for format in ["json", "latex"] {
        let run = gaugewright(["audit", &file.arg(), "--format", format]);
        assert_eq!(run.refused(), audit);
    }
    (audit, file.arg())
}

/// Each line is `from => to @ line:column help`.
#[test]
fn one_line_at_a_time() {
    let file = TempFile::new("model.toml", GOOD);
    gaugewright(["audit", &file.arg()]).done();
    let cases = r#"
[model] => [modle] @ 1:2 did you mean "model"
title = "Quarks" => titel = "Quarks" @ 2:1 did you mean "title"
title = "Quarks" => title = 5 @ 2:9 quotation marks
title = "Quarks" => title = "" @ 2:9 title
title = "Quarks" => title = "Quarks @ 2:16 quotation marks
label = "colour" => lable = "colour" @ 4:1 did you mean "label"
algebra = "SU(3)" => algebra = "SU(1)" @ 5:11 SU(2) or larger
algebra = "SU(3)" => algebra = "SO(4)" @ 5:11 write two symmetries, each SU(2)
algebra = "SU(3)" => algebra = "SO(2)" @ 5:11 write U(1)
algebra = "SU(3)" => algebra = "U(2)" @ 5:11 write two symmetries, U(1) and SU(N)
algebra = "SU(3)" => algebra = "E9" @ 5:11 rank 6 to 8
algebra = "SU(3)" => algebra = "SU(1000000)" @ 5:11 SU(257)
algebra = "SU(3)" => algebra = 3 @ 5:11 SU(3)
algebra = "SU(3)" => algebra = "Z(1)" @ 5:11 Z(
label = "hypercharge" => label = "colour" @ 7:9 label of its own
label = "quark" => label = "antiquark" @ 15:9 label of its own
label = "quark" => label = "" @ 10:9 label
label = "quark" => label = "a\tb" @ 10:9 label
field = "left-handed fermion" => field = "lefthanded fermion" @ 11:9 did you mean "left-handed fermion"
field = "left-handed fermion" => field = "chiral superfield" @ 11:9 supersymmetric
copies = 3 => copies = -1 @ 12:10 whole number from 1
copies = 3 => copies = 0 @ 12:10 whole number from 1
copies = 3 => copies = 1e30 @ 12:10 whole number from 1
copies = 3 => copies = 1000000000000000000000000000000 @ 12:10 whole number from 1
copies = 3 => copies = "3" @ 12:10 whole number from 1
copies = 3 => copies = nan @ 12:10 whole number
colour = "3", => color = "3", @ 13:16 did you mean "colour"
colour = "3", => colour = "5", @ 13:25 3 = (10)
colour = "3", => colour = "(1,0,0)", @ 13:25 2 Dynkin labels
colour = "3", => colour = "(-1,0)", @ 13:25 from 0 to 4294967295
colour = "3", => colour = "(4294967296,0)", @ 13:25 from 0 to 4294967295
colour = "3", => colour = 3, @ 13:25 quotation marks
hypercharge = "1/6" => hypercharge = "1/0" @ 13:44 fraction
hypercharge = "1/6" => hypercharge = nan @ 13:44 fraction
hypercharge = "1/6" => hypercharge = "NaN" @ 13:44 fraction
hypercharge = "1/6" => hypercharge = inf @ 13:44 fraction
hypercharge = "1/6" => hypercharge = 0.5 @ 13:44 "1/2"
hypercharge = "1/6" => hypercharge = [1, 6] @ 13:44 "1/6"
mass_gev = 1e3 => mass_gev = -5 @ 19:12 GeV
mass_gev = 1e3 => mass_gev = nan @ 19:12 750.5
mass_gev = 1e3 => mas_gev = 5 @ 19:1 did you mean "mass_gev"
"#;
    for case in cases.trim().lines() {
        let (from, rest) = case.split_once(" => ").unwrap();
        let (to, rest) = rest.rsplit_once(" @ ").unwrap();
        let (place, help) = rest.split_once(' ').unwrap();
        assert!(GOOD.contains(from), "{from}");
        let text = GOOD.replacen(from, to, 1);
        let (error, path) = refused(&text);
        assert!(
            error.contains(&format!("{path}:{place}\n")),
            "{case}: {error}"
        );
        assert!(error.contains(help), "{case}: {error}");
        let line: usize = place.split(':').next().unwrap().parse().unwrap();
        let shown = text.lines().nth(line - 1).unwrap().replace('\t', "    ");
        assert!(
            error.contains(&format!("{line} | {shown}")),
            "{case}: {error}"
        );
        assert!(
            error.starts_with("error: ") && error.contains("help: "),
            "{error}"
        );
        assert!(error.lines().count() <= 8, "{error}");
    }
}

#[test]
fn no_model_at_all() {
    for (content, says) in [
        (&b""[..], "[[symmetry]]"),
        (b"\n\n# nothing\n", "[[symmetry]]"),
        (b"\xff\xfe\x00binary", "not UTF-8"),
        (b"\x7fELF\x02\x01\x01\x00\x00", "TOML"),
        (b"{\"symmetry\": []}", "TOML"),
        (b"\x00", "TOML"),
    ] {
        let (error, path) = refused(content);
        assert!(error.contains(&path) && error.contains(says), "{error}");
    }
}

/// Deep nesting and long lines are refused without filling the stack or the terminal.
#[test]
fn hostile_text() {
    let deep = format!("x = {}", "[".repeat(100_000));
    let tables = format!("x = {}", "{a=".repeat(100_000));
    let dotted = format!("{} = 1", vec!["a"; 100_000].join("."));
    let long = format!("title = \"{}\"", "ν".repeat(200_000));
    let many = "[[symmetry]]\nlabel = \"a\"\nalgebra = \"U(1)\"\n".repeat(20_000);
    for text in [deep, tables, dotted, long, many] {
        let start = Instant::now();
        let (error, _) = refused(&text);
        assert!(error.len() < 3000, "{} bytes", error.len());
        assert!(start.elapsed() < Duration::from_secs(20), "{}", &text[..20]);
    }
}

#[test]
fn no_file_to_read() {
    let directory = tempfile::tempdir().unwrap();
    let file = TempFile::new("model.toml", GOOD);
    let below = file.path().join("model.toml");
    let missing = directory.path().join("model.toml");
    for path in [directory.path(), &missing, &below] {
        for command in ["audit", "anomalies", "batch"] {
            let path = path.to_str().unwrap();
            let error = gaugewright([command, path]).refused();
            assert!(
                error.contains(path) && error.contains("cannot be read"),
                "{error}"
            );
            assert!(error.contains("; name a"), "{error}");
            assert_eq!(error.lines().count(), 1);
        }
    }
    gaugewright(["audit", ""]).refused();
}

#[cfg(target_os = "linux")]
#[test]
fn files_that_are_none() {
    let directory = tempfile::tempdir().unwrap();
    let dangling = directory.path().join("dangling");
    std::os::unix::fs::symlink("nowhere", &dangling).unwrap();
    let circle = directory.path().join("circle");
    std::os::unix::fs::symlink("circle", &circle).unwrap();
    // Opens, and fails when it is read, even for root.
    let fails = "/proc/self/mem";
    for path in [dangling.to_str().unwrap(), circle.to_str().unwrap(), fails] {
        let error = gaugewright(["audit", path]).refused();
        assert!(error.contains("cannot be read"), "{error}");
    }
}

/// The program with no more than `mebibytes` of address space.
#[cfg(target_os = "linux")]
fn within_memory(mebibytes: u32, arguments: &[&str]) -> Run {
    let inner = program();
    let limit = format!("ulimit -v {} && exec \"$0\" \"$@\"", mebibytes << 10);
    let output = std::process::Command::new("sh")
        .args(["-c", &limit])
        .arg(inner.get_program())
        .args(arguments)
        .current_dir(workspace())
        .output()
        .unwrap();
    Run {
        status: output.status.code().unwrap_or(-1),
        stdout: String::from_utf8(output.stdout).unwrap(),
        stderr: String::from_utf8(output.stderr).unwrap(),
    }
}

/// 100 MB of holes, 100 MB of comments, an endless device: refused at once and in little memory.
#[cfg(target_os = "linux")]
#[test]
fn files_too_large() {
    use std::io::Write;
    let directory = tempfile::tempdir().unwrap();
    let holes = directory.path().join("holes.toml");
    std::fs::File::create(&holes)
        .unwrap()
        .set_len(100 << 20)
        .unwrap();
    let comments = directory.path().join("comments.toml");
    let mut file = std::fs::File::create(&comments).unwrap();
    let mebibyte = "# a comment in a model\n".repeat((1 << 20) / 23);
    for _ in 0..101 {
        file.write_all(mebibyte.as_bytes()).unwrap();
    }
    for path in [&*holes, &*comments, "/dev/zero".as_ref()] {
        let path = path.to_str().unwrap();
        let start = Instant::now();
        let run = within_memory(64, &["audit", path]);
        assert!(start.elapsed() < Duration::from_secs(5));
        assert_eq!((run.status, &*run.stdout), (2, ""), "{}", run.stderr);
        assert!(run.stderr.contains("larger than 4 MiB"), "{}", run.stderr);
    }
    // 4 MiB of good text are within the bound, and their memory is in proportion.
    let models = directory.path().join("large.toml");
    let text = GOOD.to_owned() + &mebibyte.repeat(3);
    std::fs::write(&models, text).unwrap();
    let run = within_memory(256, &["audit", models.to_str().unwrap()]);
    assert_eq!(run.status, 0, "{}", run.stderr);
}

/// Ranks and labels that would need much memory are refused in little.
#[cfg(target_os = "linux")]
#[test]
fn bounded_memory() {
    for arguments in [
        &["algebra", "SU(1000000)"][..],
        &[
            "irrep",
            "SU(3)",
            "(4000000000,4000000000)",
            "--weights",
            "all",
        ],
        &["catalog", "SU(2)", "--max-dimension", "999999999999"],
        &["product", "SU(3)", "(4000000000,0)", "(4000000000,5)"],
        &["power", "SU(2)", "2", "--degree", "4000000000"],
        &["power", "E8", "248", "--degree", "60"],
    ] {
        let start = Instant::now();
        let run = within_memory(1024, arguments);
        assert_eq!(
            (run.status, &*run.stdout),
            (2, ""),
            "{arguments:?}: {}",
            run.stderr
        );
        assert!(!run.stderr.contains("panicked"), "{}", run.stderr);
        assert!(start.elapsed() < Duration::from_secs(10), "{arguments:?}");
    }
}
