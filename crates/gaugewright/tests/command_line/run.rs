//! Runs the program, and holds every run to what holds for all of them.

use std::ffi::OsStr;
use std::io::Write;
use std::path::PathBuf;
use std::process::{Command, Output, Stdio};
use std::thread;

use serde_json::Value;
use tempfile::TempDir;

/// A run that has ended.
#[derive(Debug)]
pub(crate) struct Run {
    pub(crate) status: i32,
    pub(crate) stdout: String,
    pub(crate) stderr: String,
}

/// The program, with none of the environment's wishes about colour.
pub(crate) fn program() -> Command {
    let mut command = Command::new(env!("CARGO_BIN_EXE_gaugewright"));
    command.current_dir(workspace());
    for name in ["NO_COLOR", "CLICOLOR", "CLICOLOR_FORCE"] {
        command.env_remove(name);
    }
    command
}

/// The root of the workspace, against which the documentation writes its paths.
pub(crate) fn workspace() -> PathBuf {
    let root = PathBuf::from(env!("CARGO_MANIFEST_DIR"));
    root.join("../..").canonicalize().expect("the workspace")
}

/// Runs with these arguments and no input.
#[track_caller]
pub(crate) fn gaugewright<A: AsRef<OsStr>>(arguments: impl IntoIterator<Item = A>) -> Run {
    finished(program().args(arguments).stdin(Stdio::null()).output())
}

/// Runs with arguments that stand in one line with spaces between.
#[track_caller]
pub(crate) fn words(line: &str) -> Run {
    gaugewright(line.split(' '))
}

/// Runs with `input` on standard input.
#[track_caller]
pub(crate) fn with_input(arguments: &[&str], input: &[u8]) -> Run {
    let mut child = program()
        .args(arguments)
        .stdin(Stdio::piped())
        .stdout(Stdio::piped())
        .stderr(Stdio::piped())
        .spawn()
        .expect("the program starts");
    let mut stdin = child.stdin.take().expect("piped");
    let output = thread::scope(|scope| {
        // It may stop reading early, as with a file that is too large.
        scope.spawn(move || stdin.write_all(input));
        child.wait_with_output()
    });
    finished(output)
}

#[track_caller]
fn finished(output: std::io::Result<Output>) -> Run {
    let output = output.expect("the program runs");
    let run = Run {
        status: output.status.code().expect("no signal"),
        stdout: String::from_utf8(output.stdout).expect("UTF-8"),
        stderr: String::from_utf8(output.stderr).expect("UTF-8"),
    };
    run.check();
    run
}

impl Run {
    /// What holds for every run whose streams are no terminal.
    #[track_caller]
    fn check(&self) {
        let (stdout, stderr) = (&self.stdout, &self.stderr);
        assert!(!stderr.contains("panicked"), "{stderr}");
        for stream in [stdout, stderr] {
            let acts = |c: char| c.is_control() && c != '\n';
            assert!(!stream.contains(acts), "raw control characters: {stream:?}");
        }
        match self.status {
            0 | 1 => assert_eq!(stderr, "", "said beside an answer"),
            2 => {
                assert_eq!(stdout, "", "an answer beside a refusal");
                assert!(
                    stderr.trim().len() > 20 && stderr.ends_with('\n'),
                    "{stderr:?}"
                );
            }
            other => panic!("exit status {other}: {stderr}"),
        }
    }

    /// Standard output of a run that must be done.
    #[track_caller]
    pub(crate) fn done(self) -> String {
        assert_eq!(self.status, 0, "{}", self.stderr);
        self.stdout
    }

    /// Standard output of a run whose answer must be "not consistent".
    #[track_caller]
    pub(crate) fn not_consistent(self) -> String {
        assert_eq!(self.status, 1, "{}{}", self.stdout, self.stderr);
        self.stdout
    }

    /// Standard error of a run that must be refused.
    #[track_caller]
    pub(crate) fn refused(self) -> String {
        assert_eq!(self.status, 2, "{}", self.stdout);
        self.stderr
    }
}

/// The one object on standard output of `gaugewright ... --format json`.
#[track_caller]
pub(crate) fn json<A: AsRef<OsStr>>(arguments: impl IntoIterator<Item = A>) -> Value {
    let given = arguments.into_iter().map(|one| one.as_ref().to_owned());
    let run = gaugewright(given.chain(["--format".into(), "json".into()]));
    assert_ne!(run.status, 2, "{}", run.stderr);
    let line = run.stdout.strip_suffix('\n').expect("ends with a newline");
    assert!(!line.contains('\n'), "one line: {line}");
    let value: Value = serde_json::from_str(line).expect(line);
    assert!(value.is_object(), "{line}");
    value
}

/// As [`json`], with arguments in one line.
#[track_caller]
pub(crate) fn json_words(line: &str) -> Value {
    json(line.split(' '))
}

/// A directory with one file in it.
pub(crate) struct TempFile {
    directory: TempDir,
    name: String,
}

impl TempFile {
    pub(crate) fn new(name: &str, content: impl AsRef<[u8]>) -> Self {
        let directory = tempfile::tempdir().expect("a temporary directory");
        std::fs::write(directory.path().join(name), content).expect("a file in it");
        let name = name.to_owned();
        Self { directory, name }
    }

    pub(crate) fn path(&self) -> PathBuf {
        self.directory.path().join(&self.name)
    }

    /// The path as an argument.
    pub(crate) fn arg(&self) -> String {
        self.path().to_str().expect("UTF-8").to_owned()
    }
}

/// Every model file in `directory`, below the workspace.
pub(crate) fn models(directory: &str) -> Vec<String> {
    let entries = std::fs::read_dir(workspace().join(directory)).expect(directory);
    let paths = entries.map(|entry| entry.expect("readable").path());
    let mut models: Vec<String> = paths
        .filter(|path| path.extension() == Some("toml".as_ref()))
        .map(|path| path.to_str().expect("UTF-8").to_owned())
        .collect();
    models.sort();
    assert!(models.len() > 5, "{directory} holds models");
    models
}
