//! What may have been meant by a word that is not among those that may stand there.

use std::fmt;

/// Candidates that a message lists at most.
const MOST_LISTED: usize = 12;
/// Characters of the text as written that a message repeats at most.
const MOST_REPEATED: usize = 60;

/// A word that is none of those allowed, and those.
#[derive(Clone, Debug, PartialEq, Eq)]
pub struct Choice {
    written: String,
    nearest: Option<String>,
    allowed: Vec<String>,
}

impl Choice {
    /// `written` stood where only one of `allowed` may.
    pub(crate) fn new<'a>(written: &str, allowed: impl IntoIterator<Item = &'a str>) -> Self {
        let written = shortened(written);
        let allowed: Vec<String> = allowed.into_iter().map(str::to_owned).collect();
        let nearest = nearest(&written, &allowed).cloned();
        Self {
            written,
            nearest,
            allowed,
        }
    }

    /// The word as written, cut where it is too long to repeat.
    #[must_use]
    pub fn written(&self) -> &str {
        &self.written
    }

    /// The allowed word most like it, where one is like it at all.
    #[must_use]
    pub fn nearest(&self) -> Option<&str> {
        self.nearest.as_deref()
    }

    /// The words allowed.
    #[must_use]
    pub fn allowed(&self) -> &[String] {
        &self.allowed
    }
}

/// What to write instead: `did you mean "weak"? write colour, weak or hypercharge`.
impl fmt::Display for Choice {
    fn fmt(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
        if let Some(nearest) = &self.nearest {
            write!(f, "did you mean \"{nearest}\"? ")?;
        }
        let quoted: Vec<String> = self
            .allowed
            .iter()
            .map(|word| format!("\"{word}\""))
            .collect();
        match quoted.as_slice() {
            [] => f.write_str("nothing may stand there"),
            [only] => write!(f, "write {only}"),
            many if many.len() > MOST_LISTED => write!(
                f,
                "write one of {} and {} more",
                many[..MOST_LISTED].join(", "),
                many.len() - MOST_LISTED
            ),
            [most @ .., last] => write!(f, "write {} or {last}", most.join(", ")),
        }
    }
}

fn nearest<'a>(written: &str, allowed: &'a [String]) -> Option<&'a String> {
    let written = written.to_lowercase();
    // Edits are counted and compared as whole numbers: this crate has no floating point.
    let close = allowed.iter().filter_map(|word| {
        let edits = strsim::osa_distance(&written, &word.to_lowercase());
        let longer = word.chars().count().max(written.chars().count());
        (2 * edits <= longer).then_some((edits, word))
    });
    close.min_by_key(|(edits, _)| *edits).map(|(_, word)| word)
}

/// The text, cut where it is too long to repeat in a message; control characters made visible.
pub(crate) fn shortened(written: &str) -> String {
    let mut start: String = written.chars().take(MOST_REPEATED).collect();
    if start.len() < written.len() {
        start.push_str("...");
    }
    if start.chars().any(char::is_control) {
        start = start.escape_debug().to_string();
    }
    start
}
