//! What can be wrong with a name, a label or a bound, and what to write instead.

use crate::{Family, MAX_RANK};

/// An error of this crate; `Display` is a sentence that says what to write instead.
#[derive(Clone, Debug, PartialEq, Eq, thiserror::Error)]
#[non_exhaustive]
pub enum Error {
    /// The family has no algebra of that rank.
    #[error("there is no simple algebra {family}{rank}; {family} has rank {}", ranks(*.family))]
    NoSuchType {
        /// The family.
        family: Family,
        /// The rank that it does not have.
        rank: usize,
    },
    /// The rank is above [`MAX_RANK`].
    #[error(
        "\"{written}\" is beyond rank {MAX_RANK}, the largest that is supported; \
         write SU(257), SO(513) or Sp(512) at most"
    )]
    RankTooLarge {
        /// What was written.
        written: String,
    },
    /// A group that is abelian, trivial or falls apart.
    #[error("\"{written}\" is not simple: it is {what}; write {instead}")]
    NotSimple {
        /// What was written.
        written: String,
        /// What it is.
        what: &'static str,
        /// What to write instead.
        instead: &'static str,
    },
    /// No name of an algebra.
    #[error(
        "\"{written}\" is no algebra; write SU(N), SO(N), Sp(2N), E6, E7, E8, F4, G2 \
         or a Cartan type such as D5{}", after(.also)
    )]
    UnknownAlgebra {
        /// What was written.
        written: String,
        /// What else may stand there, e.g. "U(1)"; may be empty.
        also: &'static str,
    },
    /// A product with no factor in one of its places.
    #[error(
        "\"{written}\" has an empty factor; write factors with x between them, \
         as in \"SU(3) x SU(2) x U(1)\""
    )]
    EmptyFactor {
        /// What was written.
        written: String,
    },
    /// The number of labels is not the rank.
    #[error("{algebra} takes {expected} Dynkin {}, one per node; {found} given", plural(.expected, "label"))]
    LabelCount {
        /// Name of the algebra.
        algebra: String,
        /// Its rank.
        expected: usize,
        /// How many labels there were.
        found: usize,
    },
    /// A label that is no whole number from 0 to 4294967295.
    #[error(
        "\"{label}\" in \"{written}\" is no Dynkin label; \
         labels of an irrep are whole numbers from 0 to {}",
        u32::MAX
    )]
    BadLabel {
        /// What was written.
        written: String,
        /// The part that is no label.
        label: String,
    },
    /// Not the form of a name or of labels.
    #[error(
        "\"{written}\" is no irrep of {algebra}; write labels such as {labels} \
         or a dimension such as {dimension}, with bar or primes where they apply"
    )]
    BadIrrep {
        /// Name of the algebra.
        algebra: String,
        /// What was written.
        written: String,
        /// Labels of a small irrep, as an example.
        labels: String,
        /// Its name, as an example.
        dimension: String,
    },
    /// No irrep has that name.
    #[error(
        "{algebra} has no irrep \"{written}\"; {}",
        join_candidates(.candidates, "it has", "none has that dimension; write labels")
    )]
    UnknownIrrep {
        /// Name of the algebra.
        algebra: String,
        /// What was written.
        written: String,
        /// Irreps of that dimension, or else of the nearest ones: name and labels.
        candidates: Vec<String>,
    },
    /// Several irreps could be meant.
    #[error(
        "\"{written}\" could be any of several irreps of {algebra}; {}",
        join_candidates(.candidates, "write one of", "write labels")
    )]
    AmbiguousIrrep {
        /// Name of the algebra.
        algebra: String,
        /// What was written.
        written: String,
        /// The irreps it could be: name and labels.
        candidates: Vec<String>,
    },
    /// A name beyond the bound up to which names are worked out.
    #[error(
        "\"{written}\" is beyond dimension {most}, up to which irreps of {algebra} have names; \
         write its Dynkin labels"
    )]
    BeyondNames {
        /// Name of the algebra.
        algebra: String,
        /// The bound.
        most: u32,
        /// What was written.
        written: String,
    },
    /// A list that would be longer than its limit.
    #[error("{what} has more than {limit} entries; {instead}")]
    TooMany {
        /// What the list holds.
        what: String,
        /// The limit that applies.
        limit: usize,
        /// What to do about it.
        instead: String,
    },
    /// A computation whose size is beyond its limit.
    #[error("{what} takes {size}, beyond the limit of {limit}; {instead}")]
    BeyondLimit {
        /// What was asked for.
        what: String,
        /// An estimate of its size, in words.
        size: String,
        /// The limit that applies.
        limit: u64,
        /// Which of the [`Limits`](crate::Limits) that is; none where it cannot be raised.
        raised_by: Option<LimitKind>,
        /// What to do about it.
        instead: String,
    },
    /// Irreps of different algebras in one product.
    #[error("{irrep} is no irrep of {algebra}; the factors of a product share one algebra")]
    MixedAlgebras {
        /// Name of the algebra of the product.
        algebra: String,
        /// The irrep that does not belong to it, with its algebra.
        irrep: String,
    },
    /// A label of a weight that is out of range.
    #[error("{label} is out of range for the label of a weight; labels are at most {most} in size")]
    WeightLabel {
        /// The label.
        label: i64,
        /// The largest size that is accepted.
        most: i64,
    },
    /// A sum of characters that is the character of nothing.
    #[error(
        "the character holds {irrep} {times} times, and so is that of no representation; \
         read its irreps with their signs instead"
    )]
    NotARepresentation {
        /// The irrep.
        irrep: String,
        /// Its negative multiplicity.
        times: String,
    },
    /// No partition.
    #[error(
        "\"{written}\" is no partition; write whole numbers that do not rise, as in 2,1, \
         with sum at most {most}"
    )]
    BadPartition {
        /// What was written.
        written: String,
        /// The largest sum that is accepted.
        most: u32,
    },
    /// A power of a degree beyond [`Partition::MOST`](crate::Partition::MOST).
    #[error("degree {degree} is beyond {most}, the largest power that is taken")]
    DegreeTooLarge {
        /// The degree.
        degree: u32,
        /// The largest that is accepted.
        most: u32,
    },
    /// The number of charges or irreps is not the number of factors.
    #[error("{algebra} has {expected} factors; {found} irreps or charges were given")]
    FactorCount {
        /// Name of the algebra.
        algebra: String,
        /// Its number of factors.
        expected: usize,
        /// How many were given.
        found: usize,
    },
    /// An irrep where a charge belongs, an irrep of another algebra, or the reverse.
    #[error("factor {place} of {algebra} is {factor}; {found} does not belong to it")]
    FactorMismatch {
        /// Name of the whole algebra.
        algebra: String,
        /// Which factor, from 1.
        place: usize,
        /// Name of the factor.
        factor: String,
        /// What was given for it.
        found: String,
    },
    /// Not a fraction.
    #[error("\"{written}\" is no exact number; write a whole number or a fraction such as -1/3")]
    BadNumber {
        /// What was written.
        written: String,
    },
}

/// The limits that a caller may raise.
#[derive(Clone, Copy, Debug, PartialEq, Eq, Hash)]
pub enum LimitKind {
    /// Different irreps in a result.
    Terms,
    /// Dominant weights in one irrep.
    DominantWeights,
    /// Weights walked through, or listed.
    Weights,
}

fn plural(count: &usize, noun: &str) -> String {
    let ending = if *count == 1 { "" } else { "s" };
    format!("{noun}{ending}")
}

fn ranks(family: Family) -> String {
    let ranks = family.ranks();
    match (ranks.start(), ranks.end()) {
        (from, to) if from == to => from.to_string(),
        (from, to) => format!("{from} to {to}"),
    }
}

fn after(also: &str) -> String {
    if also.is_empty() {
        String::new()
    } else {
        format!(", or {also}")
    }
}

fn join_candidates(candidates: &[String], lead: &str, none: &str) -> String {
    match candidates {
        [] => none.to_owned(),
        some => format!("{lead} {}", some.join(", ")),
    }
}
