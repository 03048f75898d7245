//! Pages as LaTeX that needs no package: it compiles by itself, and `\input` takes it into a paper.

use std::fmt::Write as _;

use num_rational::BigRational;
use num_traits::Signed;
use roots::IrrepName;

use super::latex_words::escaped;
use super::text::plain;
use super::{Align, Block, Inline, Page, Phrase, Table, Verdict};

/// Opens a document unless one is open: `\@nodocument` is an error message until
/// `\begin{document}` makes it `\relax`.
const OPENING: &str = "\
% Compiles by itself; \\input takes it into a document that has begun.
\\expandafter\\ifx\\csname @nodocument\\endcsname\\relax
  \\let\\closepage\\relax
\\else
  \\def\\closepage{\\end{document}}
  \\documentclass{article}
  \\begin{document}
\\fi
";

impl Page {
    /// The page as LaTeX.
    #[must_use]
    pub fn to_latex(&self) -> String {
        let mut out = OPENING.to_owned();
        for block in self.blocks() {
            write_block(&mut out, block);
        }
        out.push_str("\\closepage\n");
        out
    }
}

fn write_block(out: &mut String, block: &Block) {
    let _ = match block {
        Block::Title(words) => writeln!(out, "\\section*{{{}}}", latex(words)),
        Block::Section(words) => writeln!(out, "\\subsection*{{{}}}", latex(words)),
        Block::Paragraph(words) => writeln!(out, "{}\n", latex(words)),
        Block::Verdict(verdict, words) => {
            let mark = match verdict {
                Verdict::Consistent => "Consistent",
                Verdict::Inconsistent => "Not consistent",
            };
            writeln!(out, "\\textbf{{{mark}}}: {}\n", latex(words))
        }
        Block::Facts(facts) => write_facts(out, facts),
        Block::Table(table) => write_table(out, table),
    };
}

fn write_facts(out: &mut String, facts: &[(Phrase, Phrase)]) -> std::fmt::Result {
    writeln!(out, "\\begin{{description}}")?;
    for (name, fact) in facts {
        writeln!(out, "\\item[{}] {}", latex(name), latex(fact))?;
    }
    writeln!(out, "\\end{{description}}")
}

/// Rows that fit a page; a longer table goes on in the next one under the same heading.
const ROWS_PER_PAGE: usize = 40;

fn write_table(out: &mut String, table: &Table) -> std::fmt::Result {
    let columns: String = table
        .columns()
        .iter()
        .map(|(_, align)| match align {
            Align::Left => 'l',
            Align::Right => 'r',
        })
        .collect();
    let heads = cells(table.columns().iter().map(|(head, _)| head));
    let (size, close) = fitted(table);
    for rows in table.rows().chunks(ROWS_PER_PAGE) {
        writeln!(
            out,
            "\\begin{{flushleft}}\n\\def\\arraystretch{{1.15}}\n{size}\\begin{{tabular}}{{{columns}}}"
        )?;
        writeln!(out, "\\hline\n{heads} \\\\ \\hline")?;
        for row in rows {
            writeln!(out, "{} \\\\", cells(row))?;
        }
        writeln!(out, "\\hline\n\\end{{tabular}}{close}\n\\end{{flushleft}}")?;
    }
    Ok(())
}

/// What opens and closes a table so that it fits the line of an article: smaller type where it is
/// wide, and beyond that an equal share of both margins.
fn fitted(table: &Table) -> (&'static str, &'static str) {
    // Points: a line, a letter times ten and the space at a column, from the size of the class.
    const LINE: usize = 345;
    let widths = columns_in_letters(table);
    let (letters, columns) = (widths.iter().sum::<usize>(), widths.len());
    let wide = |letter: usize, column: usize| letters * letter / 10 + columns * column > LINE;
    if !wide(47, 12) {
        ("", "")
    } else if !wide(38, 6) {
        ("\\footnotesize\\tabcolsep=3pt\n", "")
    } else {
        (
            "\\scriptsize\\tabcolsep=2pt\n\\makebox[\\linewidth][c]{",
            "}",
        )
    }
}

fn columns_in_letters(table: &Table) -> Vec<usize> {
    let heads = table.columns().iter().enumerate();
    let widest = heads.map(|(place, (head, _))| {
        let cells = table.rows().iter().map(|row| &row[place]);
        let letters = cells.chain([head]).map(|cell| plain(cell).chars().count());
        letters.max().unwrap_or(0)
    });
    widest.collect()
}

fn cells<'a>(cells: impl IntoIterator<Item = &'a Phrase>) -> String {
    let cells: Vec<String> = cells.into_iter().map(cell).collect();
    cells.join(" & ")
}

/// The phrase in a table, where fractions lie flat so that rows do not touch.
fn cell(phrase: &Phrase) -> String {
    let pieces = phrase.pieces().iter().map(|inline| match inline {
        Inline::Number(value) => format!("${value}$"),
        other => piece(other),
    });
    pieces.collect()
}

/// The phrase as LaTeX.
fn latex(phrase: &Phrase) -> String {
    phrase.pieces().iter().map(piece).collect()
}

fn piece(inline: &Inline) -> String {
    match inline {
        Inline::Words(words) => escaped(words),
        Inline::Strong(words) => format!("\\textbf{{{}}}", escaped(words)),
        Inline::Irrep(name) => format!("${}$", irrep(name)),
        Inline::Number(value) => format!("${}$", number(value)),
        Inline::Algebra(name) => format!("${}$", algebra(name)),
        Inline::Labels(labels) => format!("${labels}$"),
        Inline::Symbol(_, latex) => format!("${latex}$"),
    }
}

/// An irrep in the trade's bold: `\overline{\mathbf{16}}`, `\mathbf{15}'`, `\mathbf{8}_{v}`.
fn irrep(name: &IrrepName) -> String {
    match name {
        IrrepName::Labels(labels) => labels.clone(),
        IrrepName::Dimension {
            dimension,
            primes,
            letters,
            bar,
        } => {
            let bold = format!("\\mathbf{{{dimension}}}");
            let bold = if *bar {
                format!("\\overline{{{bold}}}")
            } else {
                bold
            };
            let letters = if letters.is_empty() {
                String::new()
            } else {
                format!("_{{{letters}}}")
            };
            format!("{bold}{letters}{}", "'".repeat(*primes))
        }
    }
}

fn number(value: &BigRational) -> String {
    if value.is_integer() {
        return value.to_string();
    }
    let sign = if value.is_negative() { "-" } else { "" };
    format!(
        "{sign}\\frac{{{}}}{{{}}}",
        value.numer().magnitude(),
        value.denom()
    )
}

/// `SU(3) x U(1)` as `\mathrm{SU}(3) \times \mathrm{U}(1)`, `E6` as `\mathrm{E}_{6}`.
fn algebra(name: &str) -> String {
    let factors = name
        .split(" x ")
        .map(|factor| match factor.split_once('(') {
            Some((series, size)) => format!("\\mathrm{{{series}}}({size}"),
            None => match factor.split_at_checked(1) {
                Some((letter, rank)) if !rank.is_empty() => {
                    format!("\\mathrm{{{letter}}}_{{{rank}}}")
                }
                _ => format!("\\mathrm{{{factor}}}"),
            },
        });
    factors.collect::<Vec<_>>().join(" \\times ")
}
