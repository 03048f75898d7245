//! Pages as text for a terminal, with or without colour.

use std::fmt::Write as _;

use unicode_width::{UnicodeWidthChar, UnicodeWidthStr};

use super::{Align, Block, Inline, Page, Phrase, Table, Verdict, harmless};

/// Whether text carries terminal colours.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum Colour {
    /// No escape sequence at all.
    Plain,
    /// Bold and colour by ANSI escape sequences.
    Ansi,
}

/// Columns of running text, the width that papers' listings and terminals share.
const WIDTH: usize = 96;
/// Columns left to a fact beside a long name.
const NARROWEST: usize = 40;

const BOLD: &str = "\x1b[1m";
const FAINT: &str = "\x1b[2m";
const GOOD: &str = "\x1b[1;36m";
const BAD: &str = "\x1b[1;31m";
const RESET: &str = "\x1b[0m";

impl Page {
    /// The page as text; every line ends with a newline and none has a blank at its end.
    #[must_use]
    pub fn to_text(&self, colour: Colour) -> String {
        let mut out = String::new();
        for (place, block) in self.blocks().iter().enumerate() {
            if place > 0 && !matches!(block, Block::Verdict(..)) {
                out.push('\n');
            }
            write_block(&mut out, block, colour);
        }
        out
    }
}

fn write_block(out: &mut String, block: &Block, colour: Colour) {
    match block {
        Block::Title(words) | Block::Section(words) => {
            flow(out, &painted(&plain(words), BOLD, colour), 0);
        }
        Block::Verdict(verdict, words) => {
            let (mark, paint) = match verdict {
                Verdict::Consistent => ("consistent", GOOD),
                Verdict::Inconsistent => ("NOT CONSISTENT", BAD),
            };
            let mark = painted(mark, paint, colour);
            flow(out, &format!("{mark}: {}", styled(words, colour)), 0);
        }
        Block::Paragraph(words) => flow(out, &styled(words, colour), 0),
        Block::Facts(facts) => write_facts(out, facts, colour),
        Block::Table(table) => write_table(out, table, colour),
    }
}

fn line(out: &mut String, words: &str) {
    out.push_str(words.trim_end());
    out.push('\n');
}

/// Writes words from column `indent` on, broken where they reach the width; what follows stands
/// under the first. A word that is longer than a line, such as a number, is left whole.
fn flow(out: &mut String, words: &str, indent: usize) {
    let room = WIDTH.saturating_sub(indent).max(NARROWEST);
    let mut width = 0;
    for word in words.split_whitespace() {
        let long = shown_width(word);
        if width > 0 && width + 1 + long > room {
            out.push('\n');
            out.push_str(&" ".repeat(indent));
            width = 0;
        }
        if width > 0 {
            out.push(' ');
            width += 1;
        }
        out.push_str(word);
        width += long;
    }
    out.truncate(out.trim_end_matches(' ').len());
    out.push('\n');
}

fn write_facts(out: &mut String, facts: &[(Phrase, Phrase)], colour: Colour) {
    let names: Vec<String> = facts.iter().map(|(name, _)| plain(name)).collect();
    let widest = names
        .iter()
        .map(|name| shown_width(name))
        .max()
        .unwrap_or(0);
    for (name, (_, fact)) in names.iter().zip(facts) {
        let gap = " ".repeat(widest - shown_width(name));
        let name = painted(name, FAINT, colour);
        let _ = write!(out, "  {name}{gap}  ");
        flow(out, &styled(fact, colour), widest + 4);
    }
}

fn write_table(out: &mut String, table: &Table, colour: Colour) {
    let heads: Vec<String> = table
        .columns()
        .iter()
        .map(|(head, _)| plain(head))
        .collect();
    let rows: Vec<Vec<String>> = table
        .rows()
        .iter()
        .map(|row| row.iter().map(|cell| styled(cell, colour)).collect())
        .collect();
    let widths: Vec<usize> = heads
        .iter()
        .enumerate()
        .map(|(place, head)| {
            let cells = rows.iter().map(|row| shown_width(&row[place]));
            cells.chain([shown_width(head)]).max().unwrap_or(0)
        })
        .collect();
    let aligns: Vec<Align> = table.columns().iter().map(|(_, align)| *align).collect();
    let heads: Vec<String> = heads
        .iter()
        .map(|head| painted(head, FAINT, colour))
        .collect();
    write_row(out, &heads, &widths, &aligns);
    for row in &rows {
        write_row(out, row, &widths, &aligns);
    }
}

fn write_row(out: &mut String, cells: &[String], widths: &[usize], aligns: &[Align]) {
    let mut row = String::new();
    for ((cell, width), align) in cells.iter().zip(widths).zip(aligns) {
        let gap = " ".repeat(width - shown_width(cell));
        let _ = match align {
            Align::Left => write!(row, "  {cell}{gap}"),
            Align::Right => write!(row, "  {gap}{cell}"),
        };
    }
    line(out, &row);
}

/// The phrase without colours.
pub(crate) fn plain(phrase: &Phrase) -> String {
    phrase.pieces().iter().map(piece).collect()
}

fn styled(phrase: &Phrase, colour: Colour) -> String {
    let pieces = phrase.pieces().iter();
    pieces
        .map(|inline| match inline {
            Inline::Strong(words) => painted(&harmless(words), BOLD, colour),
            other => piece(other),
        })
        .collect()
}

fn piece(inline: &Inline) -> String {
    match inline {
        Inline::Words(words) | Inline::Strong(words) => harmless(words).into_owned(),
        Inline::Irrep(name) => name.to_string(),
        Inline::Number(number) => number.to_string(),
        Inline::Algebra(name) | Inline::Labels(name) => name.clone(),
        Inline::Symbol(text, _) => (*text).to_owned(),
    }
}

fn painted(words: &str, paint: &str, colour: Colour) -> String {
    match colour {
        Colour::Ansi if !words.is_empty() => format!("{paint}{words}{RESET}"),
        _ => words.to_owned(),
    }
}

/// Columns that the text takes: none for escape sequences, two for wide characters.
fn shown_width(text: &str) -> usize {
    if !text.contains('\x1b') {
        return text.width();
    }
    let mut width = 0;
    let mut inside = false;
    for c in text.chars() {
        match (inside, c) {
            (false, '\x1b') => inside = true,
            (true, 'm') => inside = false,
            (true, _) => {}
            (false, _) => width += c.width().unwrap_or(0),
        }
    }
    width
}
