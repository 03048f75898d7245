//! Labels of symmetries and multiplets.

use crate::Problem;
use crate::suggestion::shortened;

/// Characters that a label may have.
pub const MOST_LABEL_CHARACTERS: usize = 100;

/// Checks that a label can stand in a report: one line, not empty, no space at its ends.
pub(crate) fn check(label: &str) -> Result<(), Problem> {
    let why = if label.is_empty() {
        "is empty"
    } else if label.trim() != label {
        "begins or ends with a space"
    } else if label.chars().any(char::is_control) {
        "has a control character"
    } else if label.chars().count() > MOST_LABEL_CHARACTERS {
        "has more than 100 characters"
    } else {
        return Ok(());
    };
    Err(Problem::BadLabel {
        label: shortened(label),
        why,
    })
}
