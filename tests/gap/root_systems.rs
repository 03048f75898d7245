//! Cartan matrices, positive roots, Weyl groups and dimensions of every type up to rank 8.
//!
//! GAP's order of the nodes is not taken from anywhere: it is the one that turns its Cartan matrix
//! into the library's. Where several do, they differ by a symmetry of the diagram.

use std::collections::BTreeSet;

use num_bigint::BigInt;
use roots::{CartanMatrix, Numbering, SimpleAlgebra};

use super::answers::{Answer, answers};
use crate::support::irrep;

/// For each node of the library, GAP's place for it.
fn places(answer: &Answer) -> Vec<usize> {
    let matrix = answer.algebra.cartan_matrix();
    let mut places = Vec::new();
    let found = extend(&matrix, &answer.cartan, &mut places);
    assert!(
        found,
        "{}: no order of nodes fits GAP's {:?}",
        answer.algebra, answer.cartan
    );
    places
}

fn extend(ours: &CartanMatrix, theirs: &[Vec<i64>], places: &mut Vec<usize>) -> bool {
    let i = places.len();
    if i == theirs.len() {
        return true;
    }
    for tried in 0..theirs.len() {
        if places.contains(&tried) {
            continue;
        }
        places.push(tried);
        let fits = (0..=i).all(|j| {
            i64::from(ours[(i, j)]) == theirs[tried][places[j]]
                && i64::from(ours[(j, i)]) == theirs[places[j]][tried]
        });
        if fits && extend(ours, theirs, places) {
            return true;
        }
        places.pop();
    }
    false
}

fn rearranged(places: &[usize], theirs: &[i64]) -> Vec<i64> {
    places.iter().map(|&place| theirs[place]).collect()
}

#[test]
fn every_type_is_asked() {
    let Some(answers) = answers() else { return };
    let asked: Vec<SimpleAlgebra> = answers.iter().map(|answer| answer.algebra).collect();
    // A1 to A8, B2 to B8, C2 to C8, D4 to D8, E6 to E8, F4, G2.
    assert_eq!(asked.len(), 8 + 7 + 7 + 5 + 3 + 1 + 1);
    assert!(answers.iter().all(|answer| answer.irreps.len() >= 20));
}

#[test]
fn cartan_matrices_and_positive_roots() {
    let Some(answers) = answers() else { return };
    for answer in answers {
        let places = places(answer);
        let system = answer.algebra.root_system();
        let ours: BTreeSet<Vec<i64>> = system
            .positive_roots()
            .map(|root| root.coefficients().iter().map(|&c| c.into()).collect())
            .collect();
        let theirs: BTreeSet<Vec<i64>> = answer
            .positive_roots
            .iter()
            .map(|root| rearranged(&places, root))
            .collect();
        assert_eq!(
            ours.len(),
            answer.positive_roots.len(),
            "{}",
            answer.algebra
        );
        assert_eq!(
            ours.len(),
            answer.algebra.positive_root_count(),
            "{}",
            answer.algebra
        );
        assert_eq!(ours, theirs, "{}", answer.algebra);
    }
}

/// GAP numbers E7 and E8 as Bourbaki does: their diagrams have no symmetry to hide a slip.
#[test]
fn bourbaki_numbering() {
    let Some(answers) = answers() else { return };
    for answer in answers {
        let name = answer.algebra.to_string();
        if ["E7", "E8"].contains(&name.as_str()) {
            let bourbaki = Numbering::Bourbaki.places(answer.algebra.cartan_type());
            let matrix = answer.algebra.cartan_matrix();
            for (i, &from) in bourbaki.iter().enumerate() {
                for (j, &to) in bourbaki.iter().enumerate() {
                    assert_eq!(i64::from(matrix[(from, to)]), answer.cartan[i][j], "{name}");
                }
            }
        }
    }
}

#[test]
fn weyl_groups() {
    let Some(answers) = answers() else { return };
    for answer in answers {
        let (algebra, system) = (answer.algebra, answer.algebra.root_system());
        assert_eq!(
            BigInt::from(algebra.weyl_group_order()),
            answer.weyl_group_order,
            "{algebra}"
        );
        let ours: Vec<i64> = system
            .exponents()
            .iter()
            .map(|&m| m.try_into().unwrap())
            .collect();
        assert_eq!(ours, answer.exponents, "{algebra}");
    }
}

#[test]
fn dimensions_of_random_irreps() {
    let Some(answers) = answers() else { return };
    for answer in answers {
        let places = places(answer);
        for (labels, dimension) in &answer.irreps {
            let irrep = irrep(answer.algebra, &rearranged(&places, labels));
            assert_eq!(BigInt::from(irrep.dimension()), *dimension, "{irrep:?}");
        }
    }
}
