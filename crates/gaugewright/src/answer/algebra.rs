//! Facts of one simple algebra.

use num_bigint::BigInt;
use num_rational::BigRational;
use roots::{Numbering, SimpleAlgebra};
use serde::Serialize;

use super::Answer;
use super::irrep::name_and_labels;
use crate::report::{Align, Exact, Page, Phrase, Table, Whole, to_json_line};

/// What `gaugewright algebra` answers. Lists with one entry per node are in `numbering`'s order.
#[derive(Clone, Debug, Serialize)]
pub struct AlgebraAnswer {
    algebra: String,
    cartan_type: String,
    rank: usize,
    dimension: usize,
    numbering: String,
    cartan_matrix: Vec<Vec<i8>>,
    inverse_cartan_matrix: Vec<Vec<Exact>>,
    /// Squared length of each simple root, the longest 2.
    simple_root_lengths: Vec<Exact>,
    positive_root_count: usize,
    /// Coefficients in simple roots, by height.
    positive_roots: Vec<Vec<u8>>,
    /// Coefficients of the highest root in simple roots.
    highest_root: Vec<u8>,
    /// Dynkin labels of the adjoint irrep.
    adjoint: Vec<u32>,
    coxeter_number: usize,
    dual_coxeter_number: usize,
    exponents: Vec<usize>,
    weyl_group_order: Whole,
    center: String,
    #[serde(skip)]
    of: SimpleAlgebra,
    #[serde(skip)]
    order: Numbering,
}

impl AlgebraAnswer {
    /// The facts of `algebra`, nodes in `order`.
    #[must_use]
    pub fn new(algebra: SimpleAlgebra, order: Numbering) -> Self {
        let roots = algebra.root_system();
        let cartan_type = algebra.cartan_type();
        let arranged = |values: &[u8]| order.from_slansky(cartan_type, values);
        Self {
            algebra: algebra.to_string(),
            cartan_type: cartan_type.to_string(),
            rank: algebra.rank(),
            dimension: algebra.dimension(),
            numbering: order.to_string(),
            cartan_matrix: cartan_matrix(algebra, order),
            inverse_cartan_matrix: inverse(algebra, order),
            simple_root_lengths: lengths(algebra, order),
            positive_root_count: algebra.positive_root_count(),
            positive_roots: roots
                .positive_roots()
                .map(|root| arranged(root.coefficients()))
                .collect(),
            highest_root: arranged(roots.highest_root().coefficients()),
            adjoint: order.from_slansky(cartan_type, algebra.adjoint().labels()),
            coxeter_number: roots.coxeter_number(),
            dual_coxeter_number: roots.dual_coxeter_number(),
            exponents: roots.exponents(),
            weyl_group_order: algebra.weyl_group_order().into(),
            center: algebra.center().to_string(),
            of: algebra,
            order,
        }
    }
}

fn cartan_matrix(algebra: SimpleAlgebra, order: Numbering) -> Vec<Vec<i8>> {
    let matrix = algebra.cartan_matrix();
    let places = order.places(algebra.cartan_type());
    let row = |&i: &usize| places.iter().map(|&j| matrix[(i, j)]).collect();
    places.iter().map(row).collect()
}

fn inverse(algebra: SimpleAlgebra, order: Numbering) -> Vec<Vec<Exact>> {
    let inverse = algebra.cartan_matrix().inverse();
    let places = order.places(algebra.cartan_type());
    let entry = |i, j| {
        let numerator = BigInt::from(inverse[(i, j)]);
        Exact::from(BigRational::new(numerator, inverse.denominator().into()))
    };
    let row = |&i: &usize| places.iter().map(|&j| entry(i, j)).collect();
    places.iter().map(row).collect()
}

fn lengths(algebra: SimpleAlgebra, order: Numbering) -> Vec<Exact> {
    let ratios = algebra.dynkin_diagram().length_ratios().to_vec();
    let longest = ratios.iter().copied().max().unwrap_or(1);
    let ratios = order.from_slansky(algebra.cartan_type(), &ratios);
    let scaled = |ratio: u8| BigRational::new((2 * ratio).into(), longest.into());
    ratios
        .into_iter()
        .map(|ratio| Exact::from(scaled(ratio)))
        .collect()
}

impl Answer for AlgebraAnswer {
    fn json(&self) -> String {
        to_json_line(self).expect("names and numbers have a JSON form")
    }

    fn page(&self) -> Page {
        let title = Phrase::algebra(&self.algebra)
            .then(", Cartan type ")
            .then(self.cartan_type.as_str());
        let mut page = Page::titled(title);
        let numbers =
            |numbers: &[usize]| -> Phrase { Phrase::join(numbers.iter().map(|&m| m.into()), ", ") };
        page.facts([
            ("rank", Phrase::from(self.rank)),
            ("dimension", self.dimension.into()),
            ("positive roots", self.positive_root_count.into()),
            ("Coxeter number", self.coxeter_number.into()),
            ("dual Coxeter number", self.dual_coxeter_number.into()),
            ("exponents", numbers(&self.exponents)),
            ("order of the Weyl group", self.of.weyl_group_order().into()),
            ("centre", self.center.as_str().into()),
            ("adjoint irrep", self.adjoint_phrase()),
            ("highest root", highest_root_phrase(&self.highest_root)),
        ]);
        if self.rank <= WIDEST_SHOWN {
            self.show_nodes(&mut page);
        }
        page
    }
}

/// The largest rank whose matrices fit a page.
const WIDEST_SHOWN: usize = 16;

impl AlgebraAnswer {
    fn adjoint_phrase(&self) -> Phrase {
        let adjoint = self.of.adjoint();
        let mut names = roots::NameBook::new(self.of);
        name_and_labels(&mut names, &adjoint, self.order)
    }

    fn show_nodes(&self, page: &mut Page) {
        page.section(format!(
            "Simple roots ({} numbering)",
            capitalised(&self.numbering)
        ));
        let nodes = (1..=self.rank).map(|node| (Phrase::from(node), Align::Right));
        let mut columns = vec![
            (Phrase::from("node"), Align::Right),
            ("length squared".into(), Align::Right),
            ("irrep".into(), Align::Left),
            ("Cartan matrix".into(), Align::Left),
        ];
        columns.extend(nodes);
        let mut table = Table::new(columns);
        let mut names = roots::NameBook::new(self.of);
        for (node, row) in self.cartan_matrix.iter().enumerate() {
            let place = self.order.places(self.of.cartan_type())[node];
            let mut labels = vec![0; self.rank];
            labels[place] = 1;
            let fundamental = self.of.irrep(&labels).expect("one label per node");
            let cells = [
                Phrase::from(node + 1),
                self.simple_root_lengths[node].value().clone().into(),
                names.name(&fundamental).into(),
                Phrase::new(),
            ];
            let row = row.iter().map(|&entry| Phrase::from(BigInt::from(entry)));
            table.push(cells.into_iter().chain(row));
        }
        page.table(table);
    }
}

/// The sum of simple roots, e.g. `a1 + 2 a2`.
fn highest_root_phrase(coefficients: &[u8]) -> Phrase {
    let shown = 24;
    if coefficients.len() > shown {
        return format!(
            "the adjoint's highest weight, with {} simple roots",
            coefficients.len()
        )
        .into();
    }
    let terms = coefficients.iter().enumerate().map(|(node, &times)| {
        let root = format!("a{}", node + 1);
        Phrase::from(if times == 1 {
            root
        } else {
            format!("{times} {root}")
        })
    });
    Phrase::join(terms, " + ")
}

fn capitalised(word: &str) -> String {
    let mut letters = word.chars();
    letters.next().map_or_else(String::new, |first| {
        first.to_uppercase().chain(letters).collect()
    })
}
