//! A refusal as it stands on standard error, with the offending line of a model file.

use std::path::Path;

use annotate_snippets::{AnnotationKind, Level, Renderer, Snippet};
use gaugewright::Failure;
use model::ModelFileError;

/// The words of a refusal; with colour where the terminal has it.
pub(crate) fn complaint(failure: &Failure, colour: bool) -> String {
    match failure {
        Failure::ModelFile { path, error } => with_line(path, error, colour),
        other => format!("gaugewright: {other}"),
    }
}

fn with_line(path: &Path, error: &ModelFileError, colour: bool) -> String {
    let (Some(line), Some(column), Some(source)) =
        (error.line(), error.column(), error.source_line())
    else {
        return format!("gaugewright: {}: {error}", path.display());
    };
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
    let snippet = Snippet::source(source)
        .line_start(line)
        .path(path.as_str())
        .annotation(AnnotationKind::Primary.span(start..end));
    let title = Level::ERROR.primary_title(error.message()).element(snippet);
    let report = [title.element(Level::HELP.message(error.help()))];
    let renderer = if colour {
        Renderer::styled()
    } else {
        Renderer::plain()
    };
    renderer.render(&report).to_string()
}
