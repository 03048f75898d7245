//! Irreps of one algebra up to a bound.

use num_bigint::BigUint;
use roots::{CatalogBound, Error, Irrep, NameBook, Numbering, SimpleAlgebra};
use serde::Serialize;

use super::Answer;
use super::irrep::{Class, labels, name_phrase, written_name};
use crate::report::{Align, Page, Phrase, Table, Whole, to_json_line};

/// Irreps that a catalogue lists unless told otherwise.
pub const CATALOG_LIMIT: usize = 100_000;

/// What `gaugewright catalog` answers.
#[derive(Clone, Debug, Serialize)]
pub struct CatalogAnswer {
    algebra: String,
    numbering: String,
    #[serde(skip_serializing_if = "Option::is_none")]
    max_dimension: Option<Whole>,
    #[serde(skip_serializing_if = "Option::is_none")]
    max_index: Option<Whole>,
    irreps: Vec<CatalogEntry>,
    #[serde(skip)]
    of: SimpleAlgebra,
    #[serde(skip)]
    bound: CatalogBound,
}

/// One irrep of a catalogue.
#[derive(Clone, Debug, Serialize)]
pub struct CatalogEntry {
    labels: Vec<u32>,
    name: String,
    dimension: Whole,
    dynkin_index: Whole,
    cubic_index: Whole,
    reality: String,
    congruency: Class,
    #[serde(skip)]
    cells: [Phrase; 7],
}

impl CatalogAnswer {
    /// The irreps of `algebra` within `bound`, labels in `order`.
    ///
    /// # Errors
    /// [`Error::TooMany`] where there are more than `limit`.
    pub fn new(
        algebra: SimpleAlgebra,
        bound: CatalogBound,
        limit: usize,
        order: Numbering,
    ) -> Result<Self, Error> {
        let mut names = NameBook::new(algebra);
        let irreps = match &bound {
            CatalogBound::Dimension(most) => names.up_to_dimension(most, limit)?,
            CatalogBound::DynkinIndex(_) => algebra.irreps_within(&bound, limit)?,
        };
        let (max_dimension, max_index) = match &bound {
            CatalogBound::Dimension(most) => (Some(most.clone().into()), None),
            CatalogBound::DynkinIndex(most) => (None, Some(most.clone().into())),
        };
        Ok(Self {
            algebra: algebra.to_string(),
            numbering: order.to_string(),
            max_dimension,
            max_index,
            irreps: irreps
                .iter()
                .map(|irrep| entry(&mut names, irrep, order))
                .collect(),
            of: algebra,
            bound,
        })
    }

    /// The bound where none is given: dimension 1000, or twenty times the algebra's own.
    #[must_use]
    pub fn usual_bound(algebra: SimpleAlgebra) -> CatalogBound {
        CatalogBound::Dimension(BigUint::from((20 * algebra.dimension()).max(1000)))
    }
}

fn entry(names: &mut NameBook, irrep: &Irrep, order: Numbering) -> CatalogEntry {
    let (dimension, index, cubic) = (irrep.dimension(), irrep.dynkin_index(), irrep.cubic_index());
    let reality = irrep.reality().to_string();
    CatalogEntry {
        labels: labels(irrep, order),
        name: written_name(names, irrep, order),
        cells: [
            name_phrase(names, irrep, order),
            Phrase::labels(irrep.bracketed_in(order)),
            dimension.clone().into(),
            index.clone().into(),
            cubic.clone().into(),
            irrep.congruency().to_string().into(),
            reality.clone().into(),
        ],
        dimension: dimension.into(),
        dynkin_index: index.into(),
        cubic_index: cubic.into(),
        reality,
        congruency: Class(irrep.congruency()),
    }
}

impl Answer for CatalogAnswer {
    fn json(&self) -> String {
        to_json_line(self).expect("names and numbers have a JSON form")
    }

    fn page(&self) -> Page {
        let bound = match &self.bound {
            CatalogBound::Dimension(most) => format!(" up to dimension {most}"),
            CatalogBound::DynkinIndex(most) => format!(" up to Dynkin index {most}"),
        };
        let count = self.irreps.len();
        let noun = if count == 1 {
            " irrep of "
        } else {
            " irreps of "
        };
        let title = Phrase::from(count)
            .then(noun)
            .then(Phrase::algebra(self.of))
            .then(bound);
        let mut page = Page::titled(title);
        let mut table = Table::new([
            (Phrase::from("name"), Align::Left),
            ("labels".into(), Align::Left),
            ("dimension".into(), Align::Right),
            ("index".into(), Align::Right),
            ("cubic".into(), Align::Right),
            ("class".into(), Align::Right),
            ("reality".into(), Align::Left),
        ]);
        for irrep in &self.irreps {
            table.push(irrep.cells.clone());
        }
        page.table(table);
        page
    }
}
