//! Pages as LaTeX that needs no package: it compiles by itself, and `\input` takes it into a paper.

use std::fmt::Write as _;

use num_rational::BigRational;
use num_traits::Signed;
use roots::IrrepName;

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
        Block::Drawing(lines) => {
            writeln!(
                out,
                "\\begin{{verbatim}}\n{}\n\\end{{verbatim}}",
                lines.join("\n")
            )
        }
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
    for rows in table.rows().chunks(ROWS_PER_PAGE) {
        writeln!(out, "\\begin{{flushleft}}\n\\begin{{tabular}}{{{columns}}}")?;
        writeln!(out, "\\hline\n{heads} \\\\ \\hline")?;
        for row in rows {
            writeln!(out, "{} \\\\", cells(row))?;
        }
        writeln!(out, "\\hline\n\\end{{tabular}}\n\\end{{flushleft}}")?;
    }
    Ok(())
}

fn cells<'a>(cells: impl IntoIterator<Item = &'a Phrase>) -> String {
    let cells: Vec<String> = cells.into_iter().map(latex).collect();
    cells.join(" & ")
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

/// Words with LaTeX's own characters made plain, and others than ASCII left to its input encoding.
fn escaped(words: &str) -> String {
    let mut out = String::with_capacity(words.len());
    for c in words.chars() {
        match c {
            '\\' => out.push_str("\\textbackslash{}"),
            '~' => out.push_str("\\textasciitilde{}"),
            '^' => out.push_str("\\textasciicircum{}"),
            '<' => out.push_str("$<$"),
            '>' => out.push_str("$>$"),
            '|' => out.push_str("$|$"),
            // A bracket after a row's end or an \\item would be taken for its option.
            '[' | ']' => {
                out.push('{');
                out.push(c);
                out.push('}');
            }
            '&' | '%' | '$' | '#' | '_' | '{' | '}' => {
                out.push('\\');
                out.push(c);
            }
            other => out.push(other),
        }
    }
    out
}
