//! A report as a list of blocks, before any format is chosen.

use super::Phrase;

/// Where a column's entries stand.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum Align {
    /// Words.
    Left,
    /// Numbers.
    Right,
}

/// Rows under named columns.
#[derive(Clone, Debug, PartialEq, Eq)]
pub struct Table {
    columns: Vec<(Phrase, Align)>,
    rows: Vec<Vec<Phrase>>,
}

impl Table {
    /// A table with these columns and no row.
    #[must_use]
    pub fn new(columns: impl IntoIterator<Item = (Phrase, Align)>) -> Self {
        Self {
            columns: columns.into_iter().collect(),
            rows: Vec::new(),
        }
    }

    /// Adds a row; missing cells at its end are empty.
    ///
    /// # Panics
    /// Where the row has more cells than there are columns.
    pub fn push(&mut self, row: impl IntoIterator<Item = Phrase>) {
        let mut row: Vec<Phrase> = row.into_iter().collect();
        assert!(row.len() <= self.columns.len(), "a cell without a column");
        row.resize(self.columns.len(), Phrase::new());
        self.rows.push(row);
    }

    /// Heading and alignment of each column.
    #[must_use]
    pub fn columns(&self) -> &[(Phrase, Align)] {
        &self.columns
    }

    /// The rows, each with one cell per column.
    #[must_use]
    pub fn rows(&self) -> &[Vec<Phrase>] {
        &self.rows
    }
}

/// What a report concludes.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum Verdict {
    /// Nothing stands against the model.
    Consistent,
    /// Something does.
    Inconsistent,
}

/// One block of a report.
#[derive(Clone, Debug, PartialEq, Eq)]
pub enum Block {
    /// What the report is about; its first line.
    Title(Phrase),
    /// The conclusion, told before the reasons.
    Verdict(Verdict, Phrase),
    /// The heading of a section.
    Section(Phrase),
    /// A paragraph.
    Paragraph(Phrase),
    /// Facts, each with its name.
    Facts(Vec<(Phrase, Phrase)>),
    /// A table.
    Table(Table),
}

/// A report.
#[derive(Clone, Debug, Default, PartialEq, Eq)]
pub struct Page {
    blocks: Vec<Block>,
}

impl Page {
    /// A page about `title`.
    #[must_use]
    pub fn titled(title: impl Into<Phrase>) -> Self {
        Self {
            blocks: vec![Block::Title(title.into())],
        }
    }

    /// Its blocks, top to bottom.
    #[must_use]
    pub fn blocks(&self) -> &[Block] {
        &self.blocks
    }

    /// Adds the conclusion.
    pub fn verdict(&mut self, verdict: Verdict, words: impl Into<Phrase>) {
        self.blocks.push(Block::Verdict(verdict, words.into()));
    }

    /// Starts a section.
    pub fn section(&mut self, heading: impl Into<Phrase>) {
        self.blocks.push(Block::Section(heading.into()));
    }

    /// Adds a paragraph.
    pub fn paragraph(&mut self, words: impl Into<Phrase>) {
        self.blocks.push(Block::Paragraph(words.into()));
    }

    /// Adds named facts.
    pub fn facts<N: Into<Phrase>>(&mut self, facts: impl IntoIterator<Item = (N, Phrase)>) {
        let facts = facts.into_iter().map(|(name, fact)| (name.into(), fact));
        self.blocks.push(Block::Facts(facts.collect()));
    }

    /// Adds a table.
    pub fn table(&mut self, table: Table) {
        self.blocks.push(Block::Table(table));
    }
}
