//! Identities that products, powers and characters keep, over random small irreps.

use num_bigint::{BigInt, BigUint};
use proptest::prelude::*;
use roots::{
    Character, Decomposition, Irrep, Limits, Partition, SimpleAlgebra, product_by_weight_division,
};

/// A random irrep of a random simple algebra of rank up to 8, of at most that dimension.
fn irrep_up_to(dimension: u32) -> impl Strategy<Value = Irrep> {
    let algebras: Vec<SimpleAlgebra> = SimpleAlgebra::up_to_rank(8).collect();
    let algebra = prop::sample::select(algebras);
    algebra.prop_flat_map(move |algebra| irrep_of(algebra, dimension))
}

/// Labels are raised at random nodes for as long as the dimension stays within the bound.
fn irrep_of(algebra: SimpleAlgebra, dimension: u32) -> impl Strategy<Value = Irrep> {
    let steps = prop::collection::vec(0..algebra.rank(), 0..8);
    steps.prop_map(move |steps| {
        let mut labels = vec![0; algebra.rank()];
        for node in steps {
            labels[node] += 1;
            if algebra.irrep(&labels).unwrap().dimension() > dimension.into() {
                labels[node] -= 1;
            }
        }
        algebra.irrep(&labels).unwrap()
    })
}

fn pair_up_to(dimension: u32) -> impl Strategy<Value = (Irrep, Irrep)> {
    irrep_up_to(dimension).prop_flat_map(move |left| {
        let right = irrep_of(left.algebra(), dimension);
        (Just(left), right)
    })
}

fn sum(left: &Decomposition, right: &Decomposition) -> Vec<(Irrep, BigUint)> {
    let mut irreps: Vec<Irrep> = left.irreps().chain(right.irreps()).cloned().collect();
    irreps.sort();
    irreps.dedup();
    irreps
        .into_iter()
        .map(|irrep| {
            let n = left.multiplicity(&irrep) + right.multiplicity(&irrep);
            (irrep, n)
        })
        .collect()
}

fn listed(sum: &Decomposition) -> Vec<(Irrep, BigUint)> {
    sum.iter().map(|(irrep, n)| (irrep.clone(), n)).collect()
}

proptest! {
    #![proptest_config(ProptestConfig::with_cases(120))]

    /// Dimension, index and class add up under products: dim(a x b) = dim a dim b,
    /// l(a x b) = l(a) dim b + dim a l(b), and every term has the class of the sum of labels.
    #[test]
    fn dimension_index_and_class_add_up((left, right) in pair_up_to(20_000)) {
        let product = left.product(&right).unwrap();
        prop_assert_eq!(product.dimension(), left.dimension() * right.dimension());
        let index = left.dynkin_index() * right.dimension() + left.dimension() * right.dynkin_index();
        prop_assert_eq!(product.dynkin_index(), index);
        let labels: Vec<u32> = left.labels().iter().zip(right.labels()).map(|(a, b)| a + b).collect();
        let top = left.algebra().irrep(&labels).unwrap();
        prop_assert_eq!(product.multiplicity(&top), BigUint::from(1u32));
        for irrep in product.irreps() {
            prop_assert_eq!(irrep.congruency(), top.congruency());
        }
    }

    /// Factors commute, and conjugation commutes with the product.
    #[test]
    fn order_and_conjugation((left, right) in pair_up_to(5_000)) {
        let product = left.product(&right).unwrap();
        prop_assert_eq!(&right.product(&left).unwrap(), &product);
        let conjugate = left.conjugate().product(&right.conjugate()).unwrap();
        prop_assert_eq!(conjugate, product.conjugate());
    }

    /// Reflection and weight-by-weight division give one answer.
    #[test]
    fn product_two_ways((left, right) in pair_up_to(700)) {
        let divided = product_by_weight_division(&left, &right, &Limits::default()).unwrap();
        prop_assert_eq!(left.product(&right).unwrap(), divided);
    }

    /// A single multiplicity is the one in the whole product, zero beside it.
    #[test]
    fn single_multiplicity((left, right) in pair_up_to(2_000)) {
        let algebra = left.algebra();
        let factors = [left.clone(), right.clone()];
        let product = left.product(&right).unwrap();
        for (irrep, n) in product.iter().take(12) {
            prop_assert_eq!(algebra.multiplicity_in_product(irrep, &factors).unwrap(), n);
        }
        let n = algebra.multiplicity_in_product(&left, &factors).unwrap();
        prop_assert_eq!(n, product.multiplicity(&left));
    }

    /// The product of characters is the character of the product.
    #[test]
    fn characters_multiply((left, right) in pair_up_to(300)) {
        let characters = Character::of(&left).unwrap().product(&Character::of(&right).unwrap()).unwrap();
        let product = left.product(&right).unwrap();
        prop_assert_eq!(&characters, &Character::of_sum(&product).unwrap());
        prop_assert_eq!(characters.decompose().unwrap(), product);
    }

    /// Sym^2 + Alt^2 is the square, and the three symmetries of degree 3 make the cube.
    #[test]
    fn powers_add_up_to_the_tensor_power(irrep in irrep_up_to(300)) {
        let square = irrep.product(&irrep).unwrap();
        let parts = sum(&irrep.symmetric_power(2).unwrap(), &irrep.antisymmetric_power(2).unwrap());
        prop_assert_eq!(parts, listed(&square));
    }

    /// Multiplicities are the same all over an orbit, whose size is the one the formula gives;
    /// weights add up to the dimension, and to zero.
    #[test]
    fn weight_systems(irrep in irrep_up_to(3_000)) {
        let algebra = irrep.algebra();
        let mut total = BigUint::from(0u32);
        let mut centre = vec![BigInt::from(0); algebra.rank()];
        for (weight, n) in irrep.dominant_weights().unwrap() {
            let orbit: Vec<_> = weight.orbit().collect();
            prop_assert_eq!(BigUint::from(orbit.len()), weight.orbit_size());
            let distinct: std::collections::HashSet<_> = orbit.iter().collect();
            prop_assert_eq!(distinct.len(), orbit.len());
            for other in &orbit {
                prop_assert_eq!(&other.dominant(), &weight);
                for (sum, &label) in centre.iter_mut().zip(other.labels()) {
                    *sum += label;
                }
            }
            total += n * orbit.len();
        }
        prop_assert_eq!(total, irrep.dimension());
        prop_assert!(centre.iter().all(|sum| *sum == BigInt::from(0)));
    }
}

proptest! {
    #![proptest_config(ProptestConfig::with_cases(40))]

    /// Newton's sums: n h_n = sum of p_k h_(n-k), by characters, against Frobenius' formula.
    #[test]
    fn symmetric_powers_by_newton_sums(irrep in irrep_up_to(30), degree in 2u32..5) {
        let character = Character::of(&irrep).unwrap();
        let mut symmetric = vec![Character::of(&irrep.algebra().singlet()).unwrap()];
        let mut antisymmetric = symmetric.clone();
        for n in 1..=degree {
            let next = |known: &[Character], alternate: bool| {
                let mut sum = Character::zero(irrep.algebra());
                for k in 1..=n {
                    let power_sum = character.adams(k).unwrap();
                    let term = power_sum.product(&known[(n - k) as usize]).unwrap();
                    sum = if alternate && k % 2 == 0 { sum.minus(&term) } else { sum.plus(&term) }.unwrap();
                }
                divided(&sum, n)
            };
            symmetric.push(next(&symmetric, false));
            antisymmetric.push(next(&antisymmetric, true));
        }
        prop_assert_eq!(
            irrep.symmetric_power(degree).unwrap(),
            symmetric[degree as usize].decompose().unwrap()
        );
        prop_assert_eq!(
            irrep.antisymmetric_power(degree).unwrap(),
            antisymmetric[degree as usize].decompose().unwrap()
        );
    }

    /// The tensor power is the sum over partitions of the power with that symmetry times the
    /// dimension of the symmetric group's irrep (Schur-Weyl duality).
    #[test]
    fn schur_weyl(irrep in irrep_up_to(30), degree in 1u32..5) {
        let whole = irrep.tensor_power(degree as usize).unwrap();
        let mut sum = Character::zero(irrep.algebra());
        for partition in Partition::all(degree).unwrap() {
            let part = Character::of_sum(&irrep.power(&partition).unwrap()).unwrap();
            let identity = Partition::column(degree).unwrap();
            let times = partition.symmetric_group_character(&identity);
            sum = sum.plus(&part.scaled(&times)).unwrap();
        }
        prop_assert_eq!(sum.decompose().unwrap(), whole);
    }
}

/// A character with every multiplicity divided by `n`.
fn divided(character: &Character, n: u32) -> Character {
    let mut quotient = Character::zero(character.algebra());
    for (irrep, times) in character.virtual_irreps().unwrap() {
        assert_eq!(&times % n, BigInt::from(0));
        let part = Character::of(&irrep).unwrap().scaled(&(times / n));
        quotient = quotient.plus(&part).unwrap();
    }
    quotient
}
