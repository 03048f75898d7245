//! Products, weight systems and powers, timed by criterion as group/case/contender.

use std::hint::black_box;

use benches::case;
use criterion::{BenchmarkId, Criterion, criterion_group, criterion_main};
use num_bigint::BigUint;
use roots::{Limits, product_by_weight_division};

fn products(criterion: &mut Criterion) {
    let mut group = criterion.benchmark_group("product");
    for case in case::products() {
        let [left, right] = &case.factors;
        let product = left.product(right).expect("a product within the limits");
        assert_eq!(product.dimension(), left.dimension() * right.dimension());
        group.bench_function(BenchmarkId::new(&case.name, "chosen"), |bencher| {
            bencher.iter(|| black_box(left.product(right)));
        });
    }
    let (left, right) = (case::irrep("E6", "27"), case::irrep("E6", "1728"));
    let divided = product_by_weight_division(&left, &right, &Limits::default());
    assert_eq!(divided, left.product(&right));
    group.bench_function(
        BenchmarkId::new("E6 27 x 1728", "weight division"),
        |bencher| {
            bencher.iter(|| {
                black_box(product_by_weight_division(
                    &left,
                    &right,
                    &Limits::default(),
                ))
            });
        },
    );
    group.finish();
}

fn weight_systems(criterion: &mut Criterion) {
    let mut group = criterion.benchmark_group("multiplicities");
    for case in case::weight_systems() {
        let weights = case.irrep.dominant_weights().expect("few dominant weights");
        let dimension: BigUint = weights.iter().map(|(w, n)| w.orbit_size() * n).sum();
        assert_eq!(dimension, case.irrep.dimension());
        group.bench_function(BenchmarkId::new(&case.name, "folded"), |bencher| {
            bencher.iter(|| black_box(case.irrep.dominant_weights()));
        });
    }
    group.finish();
}

fn powers(criterion: &mut Criterion) {
    let mut group = criterion.benchmark_group("power");
    let family = case::irrep("E6", "27");
    let fourth = family.symmetric_power(4).expect("a small power");
    // Symmetric tensors of degree 4 in 27 dimensions: 30 choose 4.
    assert_eq!(fourth.dimension(), 27_405u32.into());
    group.bench_function(BenchmarkId::new("E6 27", "symmetric 4"), |bencher| {
        bencher.iter(|| black_box(family.symmetric_power(4)));
    });
    let adjoint = case::irrep("SU(5)", "24");
    let power = adjoint.tensor_power(20).expect("within the limits");
    assert_eq!(power.dimension(), BigUint::from(24u32).pow(20));
    group.sample_size(10);
    group.bench_function(BenchmarkId::new("SU(5) 24", "tensor 20"), |bencher| {
        bencher.iter(|| black_box(adjoint.tensor_power(20)));
    });
    group.finish();
}

criterion_group!(benches, products, weight_systems, powers);
criterion_main!(benches);
