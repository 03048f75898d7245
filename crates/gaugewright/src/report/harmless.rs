//! Words from outside, made fit for a terminal.

use std::borrow::Cow;
use std::fmt::Write as _;

/// Whether a character moves the cursor, starts an escape sequence, or turns the direction of
/// writing, so that what is seen is not what is there.
#[must_use]
pub fn acts_on_terminals(c: char) -> bool {
    c.is_control()
        || matches!(
            c,
            '\u{200e}'
                | '\u{200f}'
                | '\u{2028}'..='\u{202e}'
                | '\u{2066}'..='\u{2069}'
                | '\u{feff}'
        )
}

/// The words on one line, with every such character written out as `\u{1b}`.
#[must_use]
pub fn harmless(words: &str) -> Cow<'_, str> {
    if !words.contains(acts_on_terminals) {
        return words.into();
    }
    let mut out = String::with_capacity(words.len() + 8);
    for c in words.chars() {
        if matches!(c, '\n' | '\r' | '\t') {
            out.push(' ');
        } else if acts_on_terminals(c) {
            let _ = write!(out, "{}", c.escape_unicode());
        } else {
            out.push(c);
        }
    }
    out.into()
}

/// The words, each cut that is too long to be read, such as a file given in place of its name.
#[must_use]
pub fn brief(words: &str) -> Cow<'_, str> {
    const READABLE: usize = 400;
    const KEPT: usize = 100;
    let long = |word: &str| word.len() > READABLE && word.chars().nth(READABLE).is_some();
    if !words.split(' ').any(long) {
        return words.into();
    }
    let cut = words
        .split(' ')
        .map(|word| match word.char_indices().nth(KEPT) {
            Some((end, _)) if long(word) => format!("{}...", &word[..end]),
            _ => word.to_owned(),
        });
    cut.collect::<Vec<_>>().join(" ").into()
}

#[cfg(test)]
mod tests {
    use super::{brief, harmless};

    #[test]
    fn only_long_words_are_cut() {
        let (long, short) = ("\u{3bd}".repeat(401), "a ".repeat(401));
        assert_eq!(brief(&short), short);
        assert_eq!(brief(&long[..800]), long[..800]);
        assert_eq!(
            brief(&format!("a {long} b")),
            format!("a {}... b", &long[..200])
        );
    }

    #[test]
    fn only_what_acts_is_written_out() {
        assert_eq!(harmless("quark \u{3bd} \u{e9}"), "quark \u{3bd} \u{e9}");
        assert_eq!(harmless("a\u{1b}[31mb\u{9b}c"), "a\\u{1b}[31mb\\u{9b}c");
        assert_eq!(harmless("two\nlines\ttab"), "two lines tab");
        assert_eq!(harmless("\u{202e}live"), "\\u{202e}live");
    }
}
