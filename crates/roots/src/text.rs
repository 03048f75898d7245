//! Text as it is repeated in messages.

/// The text without the spaces around it, cut where it is too long to repeat.
pub(crate) fn shortened(written: &str) -> String {
    const MOST: usize = 60;
    let written = written.trim();
    match written.char_indices().nth(MOST) {
        None => written.to_owned(),
        Some((end, _)) => format!("{}...", &written[..end]),
    }
}
