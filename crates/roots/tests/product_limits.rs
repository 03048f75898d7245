//! What is too large, in the wrong algebra, or beyond 64 bits.

use num_bigint::BigUint;
use roots::{Error, Limits, Partition, ProductCache, ReductiveAlgebra, SimpleAlgebra};

fn algebra(name: &str) -> SimpleAlgebra {
    name.parse().unwrap()
}

/// The error gives a size, the limit and which limit to raise; raising it helps.
#[test]
fn limits_are_named_and_can_be_raised() {
    let e6 = algebra("E6");
    let factors = [e6.adjoint(), e6.adjoint()];
    let few = Limits::default().with_terms(4);
    let error = e6.product_within(&factors, &few).unwrap_err().to_string();
    assert!(
        error.contains("up to 73 terms") && error.contains("limit of 4"),
        "{error}"
    );
    assert!(error.contains("raise the limit on terms"), "{error}");
    assert_eq!(
        e6.product_within(&factors, &few.with_terms(5))
            .unwrap()
            .len(),
        5
    );
    let short = Limits::default().with_weights(72);
    let error = e6.product_within(&factors, &short).unwrap_err().to_string();
    assert!(error.contains("walk through 73 weights"), "{error}");
    let narrow = Limits::default().with_dominant_weights(1);
    let error = e6
        .product_within(&factors, &narrow)
        .unwrap_err()
        .to_string();
    assert!(
        error.contains("raise the limit on dominant weights"),
        "{error}"
    );
}

/// Tableaux stop at the limit on terms, and at a depth that any stack has room for.
#[test]
fn tableaux_stop_in_time() {
    let su2 = algebra("SU(2)");
    let large = su2.irrep(&[2_000_000_000]).unwrap();
    let few = Limits::default().with_terms(1000);
    let error = large.product_within(&large, &few).unwrap_err().to_string();
    assert!(error.contains("up to 2000000001 terms"), "{error}");
    let su257 = SimpleAlgebra::su(257).unwrap();
    let fundamental = |node: usize| {
        let labels: Vec<u32> = (0..256).map(|i| u32::from(i == node)).collect();
        su257.irrep(&labels).unwrap()
    };
    let product = fundamental(255).product(&fundamental(255)).unwrap();
    assert_eq!(product.len(), 2);
    let half = fundamental(127);
    let limits = Limits::default().with_weights(1_000_000);
    assert!(half.product_within(&half, &limits).is_err());
}

#[test]
fn factors_of_another_algebra() {
    let (su5, so10) = (algebra("SU(5)"), algebra("SO(10)"));
    let error = su5.adjoint().product(&so10.adjoint()).unwrap_err();
    assert!(matches!(error, Error::MixedAlgebras { .. }));
    assert!(su5.product(&[so10.adjoint()]).is_err());
    assert!(
        ProductCache::new()
            .product(&su5.adjoint(), &so10.adjoint())
            .is_err()
    );
}

/// Labels up to 2^32 - 1 are refused where their sum has no place, and exact below.
#[test]
fn labels_at_the_edge() {
    let su2 = algebra("SU(2)");
    let large = su2.irrep(&[u32::MAX - 10]).unwrap();
    assert!(
        large
            .product(&large)
            .unwrap_err()
            .to_string()
            .contains("smaller labels")
    );
    let doublet = su2.irrep(&[1]).unwrap();
    assert_eq!(large.product(&doublet).unwrap().len(), 2);
    let su3 = algebra("SU(3)");
    let large = su3.irrep(&[1_000_000_000, 1_000_000_000]).unwrap();
    let product = large.product(&su3.adjoint()).unwrap();
    assert_eq!(product.multiplicity(&large), 2u32.into());
    assert_eq!(product.dimension(), large.dimension() * 8u32);
}

/// Multiplicities beyond 64 and beyond 128 bits are exact: the dimension of the power says so.
#[test]
fn multiplicities_of_any_size() {
    for (name, degree) in [("SU(2)", 70), ("SU(2)", 300), ("SU(3)", 90), ("G2", 60)] {
        let irrep = if name == "G2" {
            algebra(name).adjoint()
        } else {
            algebra(name).irrep(&vec![1; algebra(name).rank()]).unwrap()
        };
        let power = irrep.tensor_power(degree).unwrap();
        let dimension = irrep.dimension().pow(u32::try_from(degree).unwrap());
        assert_eq!(power.dimension(), dimension, "{name} to {degree}");
    }
    // Catalan's number: the singlets in the 2n-th power of the doublet.
    let power = algebra("SU(2)")
        .irrep(&[1])
        .unwrap()
        .tensor_power(100)
        .unwrap();
    let singlets = power.multiplicity(&algebra("SU(2)").singlet());
    let product =
        |range: std::ops::RangeInclusive<u32>| -> BigUint { range.map(BigUint::from).product() };
    assert_eq!(singlets, product(51..=100) / product(1..=50) / 51u32);
}

#[test]
fn empty_and_single() {
    let g2 = algebra("G2");
    let none = g2.product(&[]).unwrap();
    assert_eq!(
        (none.len(), none.multiplicity(&g2.singlet())),
        (1, 1u32.into())
    );
    let one = g2.product(&[g2.adjoint()]).unwrap();
    assert_eq!(
        (one.len(), one.multiplicity(&g2.adjoint())),
        (1, 1u32.into())
    );
    let zeroth = g2.adjoint().power(&Partition::new(&[]).unwrap()).unwrap();
    assert_eq!(zeroth, none);
    // More antisymmetric indices than there are dimensions.
    assert!(
        algebra("SU(3)")
            .irrep(&[1, 0])
            .unwrap()
            .antisymmetric_power(4)
            .unwrap()
            .is_empty()
    );
}

/// The cache gives what the product gives, and forgets when it is full.
#[test]
fn cache_is_bounded() {
    let su3 = algebra("SU(3)");
    let mut cache = ProductCache::with_capacity(20);
    for a in 0..6 {
        for b in 0..6 {
            let (left, right) = (su3.irrep(&[a, b]).unwrap(), su3.irrep(&[b, 1]).unwrap());
            assert_eq!(
                *cache.product(&left, &right).unwrap(),
                left.product(&right).unwrap()
            );
            assert!(cache.len() <= 20);
        }
    }
}

/// Charges add up and multiplicities multiply over the factors of a product of algebras.
#[test]
fn reductive_products() {
    let whole: ReductiveAlgebra = "SU(3) x SU(3) x U(1)".parse().unwrap();
    let both = whole.read_irrep(&["8", "8", "1/2"]).unwrap();
    let product = whole.product(&[both.clone(), both.clone()]).unwrap();
    assert_eq!(product.dimension(), 4096u32.into());
    let expected = whole.read_irrep(&["8", "8", "1"]).unwrap();
    assert_eq!(product.multiplicity(&expected), 4u32.into());
    let other: ReductiveAlgebra = "SU(3) x U(1)".parse().unwrap();
    assert!(other.product(&[both]).is_err());
}
