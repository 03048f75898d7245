//! Products and powers: a representation as a sum of irreps.

use num_bigint::BigUint;
use num_traits::One;
use roots::{Decomposition, Irrep, Limits, NameBook, Numbering, Partition, SimpleAlgebra};
use serde::Serialize;

use super::Answer;
use super::irrep::{labels, name_phrase, written_name};
use crate::Failure;
use crate::report::{Align, Page, Phrase, Table, Whole, to_json_line};

/// What `gaugewright product` and `gaugewright power` answer.
#[derive(Clone, Debug, Serialize)]
pub struct DecompositionAnswer {
    algebra: String,
    numbering: String,
    factors: Vec<String>,
    #[serde(skip_serializing_if = "Option::is_none")]
    degree: Option<u32>,
    #[serde(skip_serializing_if = "Option::is_none")]
    symmetry: Option<String>,
    dimension: Whole,
    terms: Vec<Term>,
    #[serde(skip)]
    title: Phrase,
}

#[derive(Clone, Debug, Serialize)]
struct Term {
    labels: Vec<u32>,
    name: String,
    dimension: Whole,
    multiplicity: Whole,
    #[serde(skip)]
    cells: [Phrase; 4],
}

/// The part of a power that is asked for.
#[derive(Clone, Debug, PartialEq, Eq)]
pub struct PowerSymmetry {
    partition: Partition,
    name: String,
}

impl PowerSymmetry {
    /// Reads `symmetric`, `antisymmetric` or a partition such as `2,1`; the degree may be left
    /// out with a partition.
    ///
    /// # Errors
    /// [`Failure::Power`] where the two do not fit together, or what is wrong with the partition.
    pub fn read(symmetry: &str, degree: Option<u32>) -> Result<Self, Failure> {
        let written = symmetry.trim().to_ascii_lowercase();
        let (partition, name) = match (written.as_str(), degree) {
            ("symmetric" | "antisymmetric", None) => {
                return Err(Failure::Power(format!("a {written} power needs a degree")));
            }
            ("symmetric", Some(degree)) => (Partition::row(degree)?, written),
            ("antisymmetric", Some(degree)) => (Partition::column(degree)?, written),
            (partition, degree) => {
                let partition: Partition = partition.parse()?;
                let size = partition.size();
                if degree.is_some_and(|degree| degree != size) {
                    let words = format!("the partition {written} is of {size}, not of the degree");
                    return Err(Failure::Power(words));
                }
                let name = partition.to_string();
                (partition, name)
            }
        };
        Ok(Self { partition, name })
    }
}

impl DecompositionAnswer {
    /// The tensor product of `factors`.
    ///
    /// # Errors
    /// [`Failure::BeyondLimit`] where it is beyond `limits`.
    pub fn product(
        algebra: SimpleAlgebra,
        factors: &[Irrep],
        limits: &Limits,
        order: Numbering,
    ) -> Result<Self, Failure> {
        let product = algebra.product_within(factors, limits)?;
        let mut names = NameBook::new(algebra);
        let shown = factors
            .iter()
            .map(|factor| name_phrase(&mut names, factor, order));
        let title = Phrase::product(shown)
            .then(" of ")
            .then(Phrase::algebra(algebra));
        Ok(Self::new(&product, factors, title, &mut names, order))
    }

    /// The part of a power of `irrep` with that symmetry.
    ///
    /// # Errors
    /// [`Failure::BeyondLimit`] where it is beyond `limits`.
    pub fn power(
        irrep: &Irrep,
        symmetry: &PowerSymmetry,
        limits: &Limits,
        order: Numbering,
    ) -> Result<Self, Failure> {
        let power = irrep.power_within(&symmetry.partition, limits)?;
        let mut names = NameBook::new(irrep.algebra());
        let degree = symmetry.partition.size();
        let title = Phrase::from(format!("{} part of degree {degree} of ", symmetry.name))
            .then(name_phrase(&mut names, irrep, order))
            .then(" of ")
            .then(Phrase::algebra(irrep.algebra()));
        let factors = vec![irrep.clone(); degree as usize];
        Ok(Self {
            degree: Some(degree),
            symmetry: Some(symmetry.name.clone()),
            ..Self::new(&power, &factors, title, &mut names, order)
        })
    }

    fn new(
        sum: &Decomposition,
        factors: &[Irrep],
        title: Phrase,
        names: &mut NameBook,
        order: Numbering,
    ) -> Self {
        let mut irreps: Vec<Irrep> = sum.irreps().cloned().collect();
        NameBook::sort(&mut irreps);
        names.prepare(&irreps);
        let terms = irreps
            .iter()
            .map(|irrep| term(names, irrep, sum.multiplicity(irrep), order));
        Self {
            terms: terms.collect(),
            algebra: sum.algebra().to_string(),
            numbering: order.to_string(),
            factors: factors
                .iter()
                .map(|factor| written_name(names, factor, order))
                .collect(),
            degree: None,
            symmetry: None,
            dimension: sum.dimension().into(),
            title,
        }
    }
}

fn term(names: &mut NameBook, irrep: &Irrep, multiplicity: BigUint, order: Numbering) -> Term {
    let dimension = irrep.dimension();
    Term {
        labels: labels(irrep, order),
        name: written_name(names, irrep, order),
        cells: [
            multiplicity.clone().into(),
            name_phrase(names, irrep, order),
            Phrase::labels(irrep.bracketed_in(order)),
            dimension.clone().into(),
        ],
        dimension: dimension.into(),
        multiplicity: multiplicity.into(),
    }
}

/// Terms that a sum on one line may have.
const MOST_ON_A_LINE: usize = 40;

impl Answer for DecompositionAnswer {
    fn json(&self) -> String {
        to_json_line(self).expect("names and numbers have a JSON form")
    }

    fn page(&self) -> Page {
        let mut page = Page::titled(self.title.clone());
        if self.terms.is_empty() {
            page.paragraph("= 0");
            return page;
        }
        if (1..=MOST_ON_A_LINE).contains(&self.terms.len()) {
            let terms = self.terms.iter().map(|term| {
                let [multiplicity, name, ..] = &term.cells;
                if term.multiplicity.value().is_one() {
                    name.clone()
                } else {
                    multiplicity.clone().then("(").then(name.clone()).then(")")
                }
            });
            page.paragraph(Phrase::from("= ").then(Phrase::join(terms, " + ")));
        }
        let mut table = Table::new([
            (Phrase::from("times"), Align::Right),
            ("irrep".into(), Align::Left),
            ("labels".into(), Align::Left),
            ("dimension".into(), Align::Right),
        ]);
        for term in &self.terms {
            table.push(term.cells.clone());
        }
        page.table(table);
        let count = self.terms.len();
        let noun = if count == 1 {
            "irrep"
        } else {
            "different irreps"
        };
        page.paragraph(
            Phrase::from(format!("{count} {noun}, dimension "))
                .then(self.dimension.value().clone())
                .then(" in all."),
        );
        page
    }
}
