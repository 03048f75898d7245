//! Conjugates of irreps, and whether they are real, pseudoreal or complex.

use std::fmt;

use crate::orthogonal_basis::{coordinates, dual, weyl_vector};
use crate::{CartanType, Family, RootSystem};

/// How an irrep relates to its conjugate.
#[derive(Clone, Copy, Debug, PartialEq, Eq, Hash)]
pub enum Reality {
    /// Equivalent to its conjugate, with a symmetric invariant form.
    Real,
    /// Equivalent to its conjugate, with an antisymmetric invariant form.
    Pseudoreal,
    /// Not equivalent to its conjugate.
    Complex,
}

impl fmt::Display for Reality {
    fn fmt(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
        f.write_str(match self {
            Self::Real => "real",
            Self::Pseudoreal => "pseudoreal",
            Self::Complex => "complex",
        })
    }
}

/// The node whose label the conjugate irrep has at `node`: minus the longest Weyl reflection as
/// a symmetry of the diagram.
pub(crate) const fn conjugate_node(cartan_type: CartanType, node: usize) -> usize {
    let n = cartan_type.rank();
    match cartan_type.family() {
        Family::A => n - 1 - node,
        Family::D if n % 2 == 1 && node + 2 >= n => 2 * n - 3 - node,
        Family::E if n == 6 && node < 5 => 4 - node,
        _ => node,
    }
}

/// For an irrep equivalent to its conjugate the invariant form is symmetric when
/// `2 (lambda, rho-check)`, the number of steps from its highest to its lowest weight, is even.
///
/// # Source
/// [Bourbaki 1975], VIII.7.5; [Slansky 1981], on heights.
pub(crate) fn reality(cartan_type: CartanType, labels: &[u32]) -> Reality {
    let conjugate = |node| labels[conjugate_node(cartan_type, node)];
    if (0..labels.len()).any(|node| labels[node] != conjugate(node)) {
        Reality::Complex
    } else if steps_are_even(cartan_type, labels) {
        Reality::Real
    } else {
        Reality::Pseudoreal
    }
}

fn steps_are_even(cartan_type: CartanType, labels: &[u32]) -> bool {
    let signed = labels.iter().map(|&label| i64::from(label));
    let Some(x) = coordinates(cartan_type, signed) else {
        return exceptional_steps_are_even(cartan_type, labels);
    };
    let rho = weyl_vector(dual(cartan_type)).expect("the dual of a classical type is classical");
    if cartan_type.family() == Family::A {
        // Rows n, ..., 0 stand for rho up to its trace n/2, and 2 (x_i, n - i - n/2) is whole.
        let n = i64::from(cartan_type.rank_u16());
        return x.iter().zip(rho).map(|(x, r)| x * (2 * r - n)).sum::<i64>() % 2 == 0;
    }
    // Both are doubled: four times the product stands where twice is meant.
    x.iter().zip(rho).map(|(x, r)| x * r).sum::<i64>() % 4 == 0
}

fn exceptional_steps_are_even(cartan_type: CartanType, labels: &[u32]) -> bool {
    let roots = RootSystem::exceptional(cartan_type);
    let odd = roots
        .positive_roots()
        .flat_map(|root| root.coroot().iter().zip(labels));
    odd.filter(|(c, label)| *c % 2 == 1 && *label % 2 == 1)
        .count()
        % 2
        == 0
}
