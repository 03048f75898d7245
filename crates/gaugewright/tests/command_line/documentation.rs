//! README.md, DEVELOPERS.md and docs/*.md say what is so: commands print what stands under them, model files can
//! be read, Rust is compiled (by `guide.rs`), and no fence is left unchecked.
//!
//! In a ```` ```console ```` block a line `$ gaugewright ...` is run at the root of the workspace
//! and the lines up to the next `$` are its standard output. `# exit status 2` directly under the
//! command tells a status other than 0; a line `...` stands for any number of lines left out.

use std::env;
use std::fs;
use std::path::Path;

use crate::run::{Run, gaugewright, with_input, workspace};

/// Commands that the documentation may name beside `gaugewright`, and who runs them.
const RUN_ELSEWHERE: [(&str, &str); 6] = [
    (
        "cargo run --release -- audit",
        "the build of .ci/run, then the tests of this binary",
    ),
    ("cargo run --release", "as above"),
    (
        "cargo install --path crates/gaugewright",
        "the same build as .ci/run's",
    ),
    ("cargo test --workspace", ".ci/run"),
    (".ci/run", "continuous integration itself"),
    (
        "cargo bench -p benches",
        "by hand, on a quiet machine; .ci/run builds it",
    ),
];

/// A fenced block.
#[derive(Debug)]
struct Fence {
    page: String,
    /// The line on which it opens, from 1.
    line: usize,
    language: String,
    lines: Vec<String>,
}

/// README.md, its neighbours and the pages in docs, by path from the root.
fn pages() -> Vec<String> {
    let mut pages = Vec::new();
    for directory in ["", "docs/"] {
        for entry in fs::read_dir(workspace().join(directory)).expect(directory) {
            let name = entry.expect("readable").file_name();
            let name = name.to_str().expect("UTF-8");
            if name.ends_with(".md") {
                pages.push(format!("{directory}{name}"));
            }
        }
    }
    pages.sort();
    let found = pages.iter().any(|page| page == "README.md");
    let allowed = env::var_os("ALLOW_NO_README").is_some();
    assert!(
        found || allowed,
        "README.md is missing; ALLOW_NO_README=1 does without"
    );
    pages
}

fn fences() -> Vec<Fence> {
    let read = |page: &String| {
        let text = fs::read_to_string(workspace().join(page)).expect(page);
        fences_in(page, &text)
    };
    pages().iter().flat_map(read).collect()
}

fn fences_in(page: &str, text: &str) -> Vec<Fence> {
    let mut fences = Vec::new();
    let mut open: Option<Fence> = None;
    for (number, line) in text.lines().enumerate() {
        let mark = line.trim_start().strip_prefix("```");
        match (&mut open, mark) {
            (None, Some(language)) => {
                open = Some(Fence {
                    page: page.to_owned(),
                    line: number + 1,
                    language: language.trim().to_owned(),
                    lines: Vec::new(),
                });
            }
            (Some(_), Some("")) => fences.extend(open.take()),
            (Some(fence), _) => fence.lines.push(line.to_owned()),
            (None, None) => {}
        }
    }
    assert!(open.is_none(), "{page}: a fence is not closed: {open:?}");
    fences
}

/// A command with what it must print.
#[derive(Debug, PartialEq, Eq)]
struct Example {
    command: String,
    status: i32,
    output: Vec<String>,
}

fn examples(lines: &[String]) -> Vec<Example> {
    let mut examples: Vec<Example> = Vec::new();
    let mut lines = lines.iter();
    while let Some(line) = lines.next() {
        if let Some(command) = line.strip_prefix("$ ") {
            let mut command = command.to_owned();
            while let Some(begun) = command.strip_suffix('\\') {
                let next = lines.next().expect("a line after a backslash");
                command = format!("{begun}{}", next.trim_start_matches("> ").trim_start());
            }
            let output = Vec::new();
            examples.push(Example {
                command,
                status: 0,
                output,
            });
            continue;
        }
        let example = examples
            .last_mut()
            .expect("a block begins with $ and a command");
        match line.strip_prefix("# exit status ") {
            Some(status) if example.output.is_empty() && example.status == 0 => {
                example.status = status.trim().parse().expect("a status");
            }
            _ => example.output.push(line.clone()),
        }
    }
    for example in &mut examples {
        while example.output.last().is_some_and(String::is_empty) {
            example.output.pop();
        }
    }
    examples
}

/// Whether the lines are the expected ones, where `...` stands for any number of them.
fn agree(expected: &[String], lines: &[&str]) -> bool {
    match (expected.split_first(), lines.split_first()) {
        (None, None) => true,
        (Some((first, rest)), _) if first == "..." => {
            (0..=lines.len()).any(|left_out| agree(rest, &lines[left_out..]))
        }
        (Some((first, rest)), Some((line, others))) => first == line && agree(rest, others),
        (None, Some(_)) | (Some(_), None) => false,
    }
}

/// Runs the words after `gaugewright`; `< FILE` at the end gives standard input.
fn run(words: &[String]) -> Run {
    match words {
        [arguments @ .., less, file] if less == "<" => {
            let input = fs::read(workspace().join(file)).expect(file);
            let arguments: Vec<&str> = arguments.iter().map(String::as_str).collect();
            with_input(&arguments, &input)
        }
        arguments => gaugewright(arguments),
    }
}

fn check_example(place: &str, example: &Example) {
    let words = shell_words::split(&example.command).expect(place);
    let (program, arguments) = words.split_first().expect(place);
    if program != "gaugewright" {
        let known = RUN_ELSEWHERE
            .iter()
            .any(|(command, _)| *command == example.command);
        let checks = fs::read_to_string(workspace().join(".ci/run")).unwrap_or_default();
        let run_there = checks.lines().any(|line| line.trim() == example.command);
        assert!(
            known || run_there,
            "{place}: nobody runs `{}`",
            example.command
        );
        return;
    }
    let run = run(arguments);
    assert_eq!(
        run.status, example.status,
        "{place}: {}: {}",
        example.command, run.stderr
    );
    let mut lines: Vec<&str> = run.stdout.lines().collect();
    while lines.last().is_some_and(|line| line.is_empty()) {
        lines.pop();
    }
    assert!(
        agree(&example.output, &lines),
        "{place}: `{}` prints\n{}\nand the page says\n{}",
        example.command,
        lines.join("\n"),
        example.output.join("\n"),
    );
}

#[test]
fn commands_print_what_the_pages_show() {
    let fences = fences();
    for fence in fences.iter().filter(|fence| fence.language == "console") {
        let place = format!("{}:{}", fence.page, fence.line);
        for example in examples(&fence.lines) {
            check_example(&place, &example);
        }
    }
    let shows = |fence: &Fence| fence.page == "README.md" && fence.language == "console";
    let readme = workspace().join("README.md").exists();
    assert_eq!(
        fences.iter().any(shows),
        readme,
        "README.md shows a command"
    );
}

#[test]
fn model_files_on_the_pages_can_be_read() {
    for fence in fences().iter().filter(|fence| fence.language == "toml") {
        let text = fence.lines.join("\n");
        if text.contains("[[symmetry]]") {
            let read = gaugewright::model::Model::from_toml(&text);
            assert!(
                read.is_ok(),
                "{}:{}: {}",
                fence.page,
                fence.line,
                read.unwrap_err()
            );
        }
    }
}

/// A fence without a language would be taken for Rust, and one of another for nothing.
#[test]
fn every_fence_is_checked_by_someone() {
    let checked = ["console", "rust", "toml"];
    let shown_only = ["text", "json", "latex", "tex", "sh", "yaml", "python"];
    for fence in fences() {
        let language = fence.language.split(',').next().unwrap_or_default();
        let known = checked.contains(&language) || shown_only.contains(&language);
        assert!(
            known,
            "{}:{}: a fence of \"{language}\"",
            fence.page, fence.line
        );
        let hides = fence.language.contains("ignore") || fence.language.contains("no_run");
        assert!(
            !hides,
            "{}:{}: Rust that is not run",
            fence.page, fence.line
        );
    }
}

/// `guide.rs` compiles and runs the Rust of each page.
#[test]
fn every_page_is_in_the_guide() {
    let guide = Path::new(env!("CARGO_MANIFEST_DIR")).join("src/guide.rs");
    let guide = fs::read_to_string(guide).expect("src/guide.rs");
    for page in pages() {
        let line = format!("include_str!(\"../../../{page}\")");
        assert!(guide.contains(&line), "src/guide.rs lacks {line}");
    }
}

/// The paths that a page links to, without those of the web and of headings.
fn links(text: &str) -> Vec<&str> {
    let ends = text.split("](").skip(1);
    let targets = ends.filter_map(|rest| rest.split([')', '#']).next());
    targets
        .filter(|target| !target.is_empty() && !target.contains("://"))
        .collect()
}

#[test]
fn links_lead_to_files() {
    for page in pages() {
        let path = workspace().join(&page);
        let text = fs::read_to_string(&path).expect(&page);
        for link in links(&text) {
            let target = path.parent().expect("a directory").join(link);
            assert!(
                target.exists(),
                "{page} links to {link}, which is not there"
            );
        }
    }
}

/// The checks above can fail.
mod the_checks_themselves {
    use super::{Example, agree, check_example, examples, fences_in, links};

    fn lines(text: &str) -> Vec<String> {
        text.lines().map(str::to_owned).collect()
    }

    #[test]
    fn fences_are_found() {
        let page = "a\n```console\n$ x\ny\n```\n\n  ```rust,should_panic\n```\n";
        let fences = fences_in("page", page);
        let seen: Vec<_> = fences
            .iter()
            .map(|one| (one.line, &*one.language))
            .collect();
        assert_eq!(seen, [(2, "console"), (7, "rust,should_panic")]);
        assert_eq!(fences[0].lines, ["$ x", "y"]);
    }

    #[test]
    fn links_are_found() {
        let text = "[a](docs/a.md), [b](b.md#part) [c](#here) [d](https://example.org/x)";
        assert_eq!(links(text), ["docs/a.md", "b.md"]);
    }

    #[test]
    fn examples_are_read() {
        let block = "$ one 'a b'\n# exit status 1\n# text\n\n$ two \\\n>   three\n\n";
        let read = examples(&lines(block));
        let example = |command: &str, status, output: &[&str]| Example {
            command: command.to_owned(),
            status,
            output: output.iter().map(|&line| line.to_owned()).collect(),
        };
        assert_eq!(
            read,
            [
                example("one 'a b'", 1, &["# text"]),
                example("two three", 0, &[])
            ]
        );
    }

    #[test]
    fn lines_left_out() {
        let all = ["a", "b", "c"];
        for good in [
            "a\nb\nc",
            "...",
            "a\n...",
            "...\nc",
            "a\n...\nc",
            "...\nb\n...",
            "a\n...\nb\nc",
        ] {
            assert!(agree(&lines(good), &all), "{good}");
        }
        for bad in [
            "",
            "a",
            "a\nb",
            "...\nb",
            "b\n...",
            "a\n...\nd",
            "a\nb\nc\nd",
            "c\n...\na",
        ] {
            assert!(!agree(&lines(bad), &all), "{bad}");
        }
    }

    fn check(block: &str) {
        examples(&lines(block))
            .iter()
            .for_each(|one| check_example("here", one));
    }

    #[test]
    fn what_is_so_passes() {
        check("$ gaugewright irrep 'SO(10)' 16bar\n16bar (00010) of SO(10)\n...");
        check("$ gaugewright audit docs/models/broken/chiral-triplet.toml\n# exit status 1\n...");
        check("$ gaugewright anomalies - < docs/models/su5.toml\n...");
        check("$ gaugewright algebra \"SO(4)\"\n# exit status 2");
        check("$ cargo run --release -- audit");
    }

    #[test]
    #[should_panic(expected = "prints")]
    fn other_output_fails() {
        check("$ gaugewright irrep 'SO(10)' 16bar\n16 (00001) of SO(10)\n...");
    }

    #[test]
    #[should_panic(expected = "left: 1")]
    fn other_status_fails() {
        check("$ gaugewright audit docs/models/broken/chiral-triplet.toml\n...");
    }

    #[test]
    #[should_panic(expected = "nobody runs")]
    fn unknown_commands_fail() {
        check("$ curl example.org");
    }
}
