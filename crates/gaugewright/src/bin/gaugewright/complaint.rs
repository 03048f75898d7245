//! A refusal as it stands on standard error, with the offending line of a model file.

use std::path::Path;

use annotate_snippets::{AnnotationKind, Level, Renderer, Snippet};
use gaugewright::Failure;
use gaugewright::report::{acts_on_terminals, brief, harmless};
use model::ModelFileError;

/// The words of a refusal; with colour where the terminal has it.
pub(crate) fn complaint(failure: &Failure, colour: bool) -> String {
    match failure {
        Failure::ModelFile { path, error } => with_line(path, error, colour),
        other => format!("gaugewright: {}", brief(&harmless(&other.to_string()))),
    }
}

fn with_line(path: &Path, error: &ModelFileError, colour: bool) -> String {
    let (Some(line), Some(column), Some(source)) =
        (error.line(), error.column(), error.source_line())
    else {
        let words = format!("{}: {error}", path.display());
        return format!("gaugewright: {}", brief(&harmless(&words)));
    };
    let source: String = source.chars().map(seen).collect();
    let start = source
        .char_indices()
        .nth(column - 1)
        .map_or(source.len(), |(byte, _)| byte);
    let long = error.span().map_or(0, |span| span.len());
    let mut end = (start + long).min(source.len());
    while !source.is_char_boundary(end) {
        end += 1;
    }
    let path = path.display().to_string();
    let path = harmless(&path);
    let snippet = Snippet::source(&source)
        .line_start(line)
        .path(&*path)
        .annotation(AnnotationKind::Primary.span(start..end));
    let title = Level::ERROR.primary_title(harmless(error.message()));
    let help = Level::HELP.message(harmless(error.help()));
    let report = [title.element(snippet).element(help)];
    let renderer = if colour {
        Renderer::styled()
    } else {
        Renderer::plain()
    };
    renderer.render(&report).to_string()
}

/// The character, or where it acts on terminals another of as many bytes, so that spans stay.
/// Those of ASCII the renderer replaces itself.
fn seen(c: char) -> char {
    match (acts_on_terminals(c), c.len_utf8()) {
        (true, 2) => '\u{a4}',
        (true, 3) => '\u{fffd}',
        _ => c,
    }
}
