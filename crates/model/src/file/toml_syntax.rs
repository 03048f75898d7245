//! From text to the tree, or to what is no TOML in it.

use toml::de::DeTable;

use super::node::Node;
use super::{MOST_FILE_BYTES, ModelFileError};

const LINES: &str = "write lines such as title = \"Standard Model\" under headers such as [model], \
                     [[symmetry]] and [[multiplet]]";
const HEADERS: &str = "write [model] and [electric_charge] once, and [[symmetry]] and \
                       [[multiplet]] in double brackets each time";
const KEYS: &str = "write each key once in its table";
const QUOTES: &str =
    "write text and fractions in quotation marks, as in algebra = \"SU(3)\" or \"1/6\"";

/// The tree of the text.
pub(super) fn parse(text: &str) -> Result<Node, ModelFileError> {
    if text.len() > MOST_FILE_BYTES {
        return Err(ModelFileError::without_place(
            format!(
                "the text has {} bytes, more than the {MOST_FILE_BYTES} (4 MiB) that are read",
                text.len()
            ),
            "write a model file; use copies for families that repeat".into(),
        ));
    }
    if let Some((place, character)) = text.char_indices().find(|(_, c)| is_binary(*c)) {
        return Err(ModelFileError::at(
            format!("the character {} is not text", character.escape_unicode()),
            "write a model file in TOML, as UTF-8 text".into(),
            text,
            place..place + character.len_utf8(),
        ));
    }
    let parsed = DeTable::parse(text).map_err(|error| not_toml(&error, text))?;
    // The document's own span may be empty; a message about the whole points at its first line.
    Ok(Node::from_toml(0..0, parsed.get_ref()))
}

fn not_toml(error: &toml::de::Error, text: &str) -> ModelFileError {
    let span = error.span().unwrap_or(0..0);
    let message = error.message();
    let help = match message {
        "duplicate key" if line_before(text, span.start).starts_with('[') => HEADERS,
        "duplicate key" => KEYS,
        _ if line_before(text, span.start).contains('=') => QUOTES,
        _ => LINES,
    };
    ModelFileError::at(format!("no TOML: {message}"), help.into(), text, span)
}

/// Control characters that TOML has no place for.
fn is_binary(character: char) -> bool {
    character.is_ascii_control() && !matches!(character, '\t' | '\n' | '\r')
}

/// The part of the line that stands before `place`.
fn line_before(text: &str, place: usize) -> &str {
    let before = text.get(..place).unwrap_or(text);
    before.rsplit('\n').next().unwrap_or(before)
}
