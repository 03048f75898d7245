//! [Bourbaki 1968], plates I to IX, from memory: diagrams, highest roots, exponents; and the
//! numbering of their nodes against Slansky's.

use roots::{Family, Numbering, SimpleAlgebra};

use crate::support::algebra;

/// Bonds of the plates, nodes from 1; the first node of a pair with a number above one has the
/// longer root.
fn plate(algebra: SimpleAlgebra) -> Vec<(usize, usize, i8)> {
    let n = algebra.rank();
    let chain = |to: usize| (1..to).map(|i| (i, i + 1, 1)).collect::<Vec<_>>();
    let mut bonds = chain(n - 1);
    match algebra.cartan_type().family() {
        Family::A => bonds = chain(n),
        Family::B => bonds.push((n - 1, n, 2)),
        Family::C => bonds.push((n, n - 1, 2)),
        Family::D => bonds.push((n - 2, n, 1)),
        Family::E => {
            bonds = vec![(1, 3, 1), (2, 4, 1)];
            bonds.extend((3..n).map(|i| (i, i + 1, 1)));
        }
        Family::F => bonds = vec![(1, 2, 1), (2, 3, 2), (3, 4, 1)],
        // Plate IX: alpha_1 is the short root.
        Family::G => bonds = vec![(2, 1, 3)],
    }
    bonds
}

/// Row i holds the Dynkin labels of simple root i.
fn plate_matrix(algebra: SimpleAlgebra) -> Vec<Vec<i8>> {
    let n = algebra.rank();
    let mut matrix = vec![vec![0; n]; n];
    for (i, row) in matrix.iter_mut().enumerate() {
        row[i] = 2;
    }
    for (long, short, ratio) in plate(algebra) {
        matrix[long - 1][short - 1] = -ratio;
        matrix[short - 1][long - 1] = -1;
    }
    matrix
}

#[test]
fn cartan_matrices_in_the_plates_numbering() {
    for algebra in SimpleAlgebra::up_to_rank(12) {
        let cartan_type = algebra.cartan_type();
        let places = Numbering::Bourbaki.places(cartan_type);
        let matrix = algebra.cartan_matrix();
        let renumbered: Vec<Vec<i8>> = places
            .iter()
            .map(|&i| places.iter().map(|&j| matrix[(i, j)]).collect())
            .collect();
        assert_eq!(renumbered, plate_matrix(algebra), "{algebra}");

        let names: Vec<usize> = (1..=algebra.rank()).collect();
        let there = Numbering::Bourbaki.from_slansky(cartan_type, &names);
        assert_eq!(
            Numbering::Bourbaki.to_slansky(cartan_type, &there),
            names,
            "{algebra}"
        );
        assert_eq!(
            Numbering::Slansky.from_slansky(cartan_type, &names),
            names,
            "{algebra}"
        );
    }
}

/// Highest root and exponents of the exceptional plates, Coxeter numbers with them.
#[test]
fn exceptional_plates() {
    let plates: [(&str, &[u8], &[usize], u64); 5] = [
        ("E6", &[1, 2, 2, 3, 2, 1], &[1, 4, 5, 7, 8, 11], 51_840),
        (
            "E7",
            &[2, 2, 3, 4, 3, 2, 1],
            &[1, 5, 7, 9, 11, 13, 17],
            2_903_040,
        ),
        (
            "E8",
            &[2, 3, 4, 6, 5, 4, 3, 2],
            &[1, 7, 11, 13, 17, 19, 23, 29],
            696_729_600,
        ),
        ("F4", &[2, 3, 4, 2], &[1, 5, 7, 11], 1_152),
        ("G2", &[3, 2], &[1, 5], 12),
    ];
    for (name, highest, exponents, order) in plates {
        let algebra = algebra(name);
        let roots = algebra.root_system();
        let coefficients = roots.highest_root().coefficients();
        let renumbered = Numbering::Bourbaki.from_slansky(algebra.cartan_type(), coefficients);
        assert_eq!(renumbered, highest, "{name}");
        assert_eq!(roots.exponents(), exponents, "{name}");
        assert_eq!(
            roots.coxeter_number(),
            exponents[exponents.len() - 1] + 1,
            "{name}"
        );
        assert_eq!(algebra.weyl_group_order(), order.into(), "{name}");
    }
}

/// Coxeter and dual Coxeter numbers, exponents and orders of the classical series.
#[test]
fn classical_plates() {
    let factorial = |n: usize| -> num_bigint::BigUint { (1..=n).product::<usize>().into() };
    for algebra in SimpleAlgebra::up_to_rank(12) {
        let n = algebra.rank();
        let two_to = num_bigint::BigUint::from(1u32) << n;
        let odd = |count: usize| (0..count).map(|i| 2 * i + 1).collect::<Vec<_>>();
        let (exponents, coxeter, dual, order, center) = match algebra.cartan_type().family() {
            Family::A => ((1..=n).collect(), n + 1, n + 1, factorial(n + 1), n + 1),
            Family::B => (odd(n), 2 * n, 2 * n - 1, two_to * factorial(n), 2),
            Family::C => (odd(n), 2 * n, n + 1, two_to * factorial(n), 2),
            Family::D => {
                let mut exponents = odd(n - 1);
                exponents.push(n - 1);
                exponents.sort_unstable();
                (
                    exponents,
                    2 * n - 2,
                    2 * n - 2,
                    (two_to >> 1u32) * factorial(n),
                    4,
                )
            }
            _ => continue,
        };
        let roots = algebra.root_system();
        assert_eq!(roots.exponents(), exponents, "{algebra}");
        assert_eq!(roots.coxeter_number(), coxeter, "{algebra}");
        assert_eq!(roots.dual_coxeter_number(), dual, "{algebra}");
        assert_eq!(roots.positive_roots().len(), n * coxeter / 2, "{algebra}");
        assert_eq!(algebra.dimension(), n * (coxeter + 1), "{algebra}");
        assert_eq!(algebra.weyl_group_order(), order, "{algebra}");
        let determinant = usize::try_from(algebra.cartan_matrix().determinant()).unwrap();
        assert_eq!(determinant, center, "{algebra}");
        assert_eq!(
            usize::try_from(algebra.center().order()).unwrap(),
            center,
            "{algebra}"
        );
    }
}

/// Dual Coxeter numbers of the exceptional algebras, as every table of them has (common practice).
#[test]
fn dual_coxeter_numbers() {
    for (name, dual) in [("E6", 12), ("E7", 18), ("E8", 30), ("F4", 9), ("G2", 4)] {
        assert_eq!(
            algebra(name).root_system().dual_coxeter_number(),
            dual,
            "{name}"
        );
    }
}
