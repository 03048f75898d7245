//! Random spectra as plain data that can be turned, scaled and conjugated without the library.

use model::{Field, Group, Multiplet, Spectrum, Symmetry};
use num_bigint::BigInt;
use num_rational::BigRational;
use num_traits::Zero;
use proptest::prelude::*;

use crate::support::{signed, slow};

/// A spectrum to be.
#[derive(Clone, Debug)]
pub(super) struct Plan {
    pub(super) symmetries: Vec<Symmetry>,
    pub(super) contents: Vec<Content>,
}

/// A multiplet to be.
#[derive(Clone, Debug)]
pub(super) struct Content {
    pub(super) field: Field,
    pub(super) copies: u32,
    pub(super) parts: Vec<Part>,
}

/// What it is under one symmetry.
#[derive(Clone, Debug)]
pub(super) enum Part {
    Labels(Vec<u32>),
    Charge(BigRational),
    Discrete(i64),
}

impl Plan {
    pub(super) fn spectrum(&self) -> Spectrum {
        let mut spectrum = Spectrum::new(self.symmetries.iter().cloned()).unwrap();
        for (place, content) in self.contents.iter().enumerate() {
            let mut draft =
                Multiplet::draft(format!("m{place}"), content.field).copies(content.copies);
            for (symmetry, part) in self.symmetries.iter().zip(&content.parts) {
                let label = symmetry.label();
                draft = match (part, symmetry.group().simple()) {
                    (Part::Labels(labels), Some(algebra)) => {
                        draft.under(label, algebra.irrep(labels).unwrap())
                    }
                    (Part::Charge(charge), _) => draft.under(label, charge.clone()),
                    (Part::Discrete(charge), _) => draft.under(label, *charge),
                    (Part::Labels(_), None) => unreachable!("labels are for simple groups"),
                };
            }
            spectrum.add(draft).unwrap();
        }
        spectrum
    }
}

impl Content {
    pub(super) fn other_handed(&self) -> Self {
        let field = match self.field {
            Field::LeftHandedFermion | Field::ChiralSuperfield => Field::RightHandedFermion,
            Field::RightHandedFermion => Field::LeftHandedFermion,
            scalar => scalar,
        };
        Self {
            field,
            ..self.clone()
        }
    }

    pub(super) fn conjugate(&self, symmetries: &[Symmetry]) -> Self {
        let parts = symmetries.iter().zip(&self.parts);
        let parts = parts.map(|(symmetry, part)| match part {
            Part::Labels(labels) => {
                let algebra = slow(symmetry.group().simple().unwrap());
                let conjugate = algebra.conjugate(&signed(labels)).into_iter();
                Part::Labels(conjugate.map(|label| label.try_into().unwrap()).collect())
            }
            Part::Charge(charge) => Part::Charge(-charge),
            Part::Discrete(charge) => Part::Discrete(-charge),
        });
        Self {
            parts: parts.collect(),
            ..self.clone()
        }
    }

    pub(super) fn single(&self) -> Self {
        Self {
            copies: 1,
            ..self.clone()
        }
    }

    pub(super) fn scale(&mut self, place: usize, by: &BigRational) {
        if let Part::Charge(charge) = &mut self.parts[place] {
            *charge *= by;
        }
    }

    /// No charge left.
    pub(super) fn neutral(&self) -> Self {
        let parts = self.parts.iter().map(|part| match part {
            Part::Labels(labels) => Part::Labels(labels.clone()),
            Part::Charge(_) => Part::Charge(BigRational::zero()),
            Part::Discrete(_) => Part::Discrete(0),
        });
        Self {
            parts: parts.collect(),
            ..self.clone()
        }
    }

    /// Each irrep that is no singlet made the adjoint, which is real and of even index.
    pub(super) fn adjoints(&self, symmetries: &[Symmetry]) -> Self {
        let parts = symmetries.iter().zip(&self.parts).map(|(symmetry, part)| {
            match (part, symmetry.group().simple()) {
                (Part::Labels(labels), Some(algebra)) if labels.iter().any(|&l| l > 0) => {
                    let algebra = slow(algebra);
                    let adjoint = algebra.labels_of(algebra.highest_root()).into_iter();
                    Part::Labels(adjoint.map(|label| label.try_into().unwrap()).collect())
                }
                _ => part.clone(),
            }
        });
        Self {
            parts: parts.collect(),
            ..self.clone()
        }
    }
}

fn charge() -> impl Strategy<Value = BigRational> {
    let small = (-12i64..=12, 1i64..=6).prop_map(|(a, b)| BigRational::new(a.into(), b.into()));
    let large = (
        any::<i64>(),
        any::<i64>().prop_filter("not zero", |b| *b != 0),
    );
    let large = large.prop_map(|(a, b)| BigRational::new(BigInt::from(a), BigInt::from(b)));
    prop_oneof![5 => small, 1 => large]
}

/// Labels of small sum; of rank 5 and above, those of the irreps that models are made of.
fn labels(rank: usize) -> impl Strategy<Value = Vec<u32>> {
    let nodes = if rank < 5 {
        (0..rank).collect()
    } else {
        vec![0, rank - 1]
    };
    let most = if rank < 5 { 2 } else { 1 };
    let nodes = prop::collection::vec(prop::sample::select(nodes), 0..=most);
    nodes.prop_map(move |nodes| {
        let mut labels = vec![0; rank];
        for node in nodes {
            labels[node] += 1;
        }
        labels
    })
}

fn part(group: Group) -> BoxedStrategy<Part> {
    match group {
        Group::Simple(algebra) => labels(algebra.rank()).prop_map(Part::Labels).boxed(),
        Group::U1 => charge().prop_map(Part::Charge).boxed(),
        Group::Discrete(_) => (-20i64..=20).prop_map(Part::Discrete).boxed(),
    }
}

/// A multiplet under these symmetries.
pub(super) fn content(symmetries: Vec<Symmetry>) -> impl Strategy<Value = Content> {
    let parts: Vec<_> = symmetries.iter().map(|one| part(one.group())).collect();
    let fields = [
        Field::LeftHandedFermion,
        Field::RightHandedFermion,
        Field::ChiralSuperfield,
        Field::ComplexScalar,
    ];
    let field = prop::sample::select(fields.to_vec());
    (field, 1u32..=4, parts).prop_map(|(field, copies, parts)| Content {
        field,
        copies,
        parts,
    })
}

fn symmetries() -> impl Strategy<Value = Vec<Symmetry>> {
    let simple = [
        "SU(2)", "SU(3)", "SU(4)", "SU(5)", "SO(5)", "SO(6)", "SO(7)", "SO(8)", "Sp(6)", "G2",
        "SO(10)", "E6",
    ];
    let simple = prop::collection::vec(prop::sample::select(simple.to_vec()), 0..=2);
    let others = prop::sample::select(vec!["U(1)", "U(1)", "U(1)", "Z(2)", "Z(3)", "Z(6)"]);
    let others = prop::collection::vec((others, prop::bool::weighted(0.8)), 1..=3);
    (simple, others).prop_map(|(simple, others)| {
        let simple = simple.into_iter().map(|name| (name, true));
        let all = simple.chain(others).enumerate();
        all.map(|(place, (name, is_gauged))| {
            let (label, group) = (format!("s{place}"), name.parse().unwrap());
            if is_gauged {
                Symmetry::gauge(label, group)
            } else {
                Symmetry::global(label, group)
            }
        })
        .collect()
    })
}

/// A spectrum of up to five multiplets under up to two simple groups and three others.
pub(super) fn plan() -> impl Strategy<Value = Plan> {
    symmetries().prop_flat_map(|symmetries| {
        let contents = prop::collection::vec(content(symmetries.clone()), 1..=5);
        (Just(symmetries), contents).prop_map(|(symmetries, contents)| Plan {
            symmetries,
            contents,
        })
    })
}
