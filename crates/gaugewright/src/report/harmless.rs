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

#[cfg(test)]
mod tests {
    use super::harmless;

    #[test]
    fn only_what_acts_is_written_out() {
        assert_eq!(harmless("quark \u{3bd} \u{e9}"), "quark \u{3bd} \u{e9}");
        assert_eq!(harmless("a\u{1b}[31mb\u{9b}c"), "a\\u{1b}[31mb\\u{9b}c");
        assert_eq!(harmless("two\nlines\ttab"), "two lines tab");
        assert_eq!(harmless("\u{202e}live"), "\\u{202e}live");
    }
}
