//! What is wrong with a model file, where, and what to write instead.

use std::fmt;
use std::ops::Range;

use super::node::{Node, Place};
use crate::Problem;

/// Characters of the offending line that are kept.
const MOST_LINE_CHARACTERS: usize = 400;

/// The first mistake in a model file.
///
/// `Display` is one sentence: `line 9, column 16: ...; what to write instead`. For JSON it names
/// the path of the value instead of a line.
#[derive(Clone, Debug, PartialEq, Eq)]
pub struct ModelFileError {
    inner: Box<Inner>,
}

#[derive(Clone, Debug, PartialEq, Eq)]
struct Inner {
    message: String,
    help: String,
    path: String,
    location: Option<Location>,
}

#[derive(Clone, Debug, PartialEq, Eq)]
struct Location {
    span: Range<usize>,
    line: usize,
    column: usize,
    source_line: String,
}

impl ModelFileError {
    pub(super) fn without_place(message: String, help: String) -> Self {
        Self::new(message, help, String::new(), None)
    }

    pub(super) fn at(message: String, help: String, text: &str, span: Range<usize>) -> Self {
        Self::new(message, help, String::new(), Some(locate(text, span)))
    }

    fn new(message: String, help: String, path: String, location: Option<Location>) -> Self {
        let inner = Box::new(Inner {
            message,
            help,
            path,
            location,
        });
        Self { inner }
    }

    /// What is wrong.
    #[must_use]
    pub fn message(&self) -> &str {
        &self.inner.message
    }

    /// What to write instead.
    #[must_use]
    pub fn help(&self) -> &str {
        &self.inner.help
    }

    /// The path of the value, such as `multiplet[3].transforms.weak`, lists counted from 0; empty
    /// for the whole, and where the text is no TOML.
    #[must_use]
    pub fn path(&self) -> &str {
        &self.inner.path
    }

    /// The bytes of the text that are wrong; none for JSON and for a text too large.
    #[must_use]
    pub fn span(&self) -> Option<Range<usize>> {
        self.location().map(|location| location.span.clone())
    }

    /// The line, from 1.
    #[must_use]
    pub fn line(&self) -> Option<usize> {
        self.location().map(|location| location.line)
    }

    /// The column, from 1, in characters.
    #[must_use]
    pub fn column(&self) -> Option<usize> {
        self.location().map(|location| location.column)
    }

    /// The text of that line, without its end; its first 400 characters where it is longer.
    #[must_use]
    pub fn source_line(&self) -> Option<&str> {
        self.location().map(|location| &*location.source_line)
    }

    fn location(&self) -> Option<&Location> {
        self.inner.location.as_ref()
    }
}

impl fmt::Display for ModelFileError {
    fn fmt(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
        if let Some(Location { line, column, .. }) = self.location() {
            write!(f, "line {line}, column {column}: ")?;
        } else if !self.path().is_empty() {
            write!(f, "{}: ", self.path())?;
        }
        write!(f, "{}; {}", self.message(), self.help())
    }
}

impl std::error::Error for ModelFileError {}

/// Line and column of the start of `span`; a span past the end is brought back to it.
fn locate(text: &str, span: Range<usize>) -> Location {
    let mut start = span.start.min(text.len());
    while !text.is_char_boundary(start) {
        start -= 1;
    }
    let (before, after) = text.split_at(start);
    let line_start = before.rfind('\n').map_or(0, |place| place + 1);
    let line_end = after.find('\n').map_or(text.len(), |place| start + place);
    let shown = text[line_start..line_end].trim_end_matches('\r');
    let column = text[line_start..start]
        .trim_start_matches('\u{feff}')
        .chars()
        .count();
    Location {
        line: before.matches('\n').count() + 1,
        column: column + 1,
        source_line: shown
            .trim_start_matches('\u{feff}')
            .chars()
            .take(MOST_LINE_CHARACTERS)
            .collect(),
        span: start..span.end.clamp(start, text.len()),
    }
}

/// A mistake at a place of the tree, before it is known which lines the tree came from.
#[derive(Debug)]
pub(super) struct Fault<'a> {
    pub(super) place: Place<'a>,
    pub(super) message: String,
    pub(super) help: String,
}

impl<'a> Fault<'a> {
    pub(super) fn new(place: Place<'a>, message: String, help: String) -> Self {
        Self {
            place,
            message,
            help,
        }
    }

    pub(super) fn problem(place: Place<'a>, problem: &Problem) -> Self {
        Self::new(place, problem.message(), problem.help())
    }

    pub(super) fn in_text(self, root: &Node, text: &str) -> ModelFileError {
        let path = root.path_to(&self.place).unwrap_or_default();
        let location = locate(text, self.place.span());
        ModelFileError::new(self.message, self.help, path, Some(location))
    }

    pub(super) fn in_json(self, root: &Node) -> ModelFileError {
        let path = root.path_to(&self.place).unwrap_or_default();
        ModelFileError::new(self.message, self.help, path, None)
    }
}
