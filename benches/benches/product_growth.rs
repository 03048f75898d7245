//! How time grows with the weights of the smaller factor; memory; and the long jobs: a tensor
//! power of degree 20 and a million products of small irreps.
//!
//! `cargo bench -p benches --bench product_growth`. Memory is the peak resident set that Linux
//! reports for the whole process (`VmHWM`), read before and after the first thing done here.

// Times are measured, and printed as decimals.
#![allow(clippy::float_arithmetic, clippy::cast_precision_loss)]

use std::hint::black_box;
use std::time::Instant;

use benches::case::{irrep, weights};
use benches::clock::{microseconds, peak_memory_kilobytes, time};
use num_bigint::BigUint;
use roots::{CatalogBound, Irrep, Limits, ProductCache, SimpleAlgebra};

fn main() {
    memory();
    growth();
    tensor_power();
    million_products();
}

fn memory() {
    let (left, right) = (irrep("E8", "147250"), irrep("E8", "3875"));
    let before = peak_memory_kilobytes();
    let product = left.product(&right).expect("a product within the limits");
    assert_eq!(product.dimension(), left.dimension() * right.dimension());
    let after = peak_memory_kilobytes();
    match before.zip(after) {
        Some((before, after)) => println!(
            "memory: E8 147250 x 3875 peaks at {after} kB, of which {before} kB were there before"
        ),
        None => println!("memory: this system does not report the peak resident set"),
    }
}

fn growth() {
    println!(
        "\n{:<44} {:>9} {:>12} {:>12}",
        "growth", "weights", "ours/us", "ns/weight"
    );
    for (large, small) in growth_cases() {
        let product = large.product(&small).expect("a product within the limits");
        assert_eq!(product.dimension(), large.dimension() * small.dimension());
        let took = microseconds(time(|| large.product(&small)));
        let touched = weights(&small);
        let name = format!(
            "{} {} x {}",
            large.algebra(),
            large.bracketed(),
            small.bracketed()
        );
        println!(
            "{name:<44} {touched:>9} {took:>12.2} {:>12.1}",
            took * 1e3 / touched as f64
        );
    }
}

/// For SU(3) to SU(9), (1 0 ... 0 1) and (1 1 0 ... 0 1 1), for E8 its smallest irreps, each with the irrep
/// that has all labels 1.
fn growth_cases() -> Vec<(Irrep, Irrep)> {
    let mut cases = Vec::new();
    for n in 2..=8usize {
        let algebra = SimpleAlgebra::su(n + 1).expect("SU(3) to SU(9)");
        let large = algebra.irrep(&vec![1; n]).expect("one label per node");
        for depth in [1, 2] {
            let label = |node: usize| u32::from(node < depth) + u32::from(node + depth >= n);
            let labels: Vec<u32> = (0..n).map(label).collect();
            cases.push((
                large.clone(),
                algebra.irrep(&labels).expect("one label per node"),
            ));
        }
    }
    let e8: SimpleAlgebra = "E8".parse().expect("E8");
    let large = e8.irrep(&[1; 8]).expect("eight labels");
    for small in ["248", "3875", "30380", "147250", "2450240"] {
        cases.push((large.clone(), irrep("E8", small)));
    }
    cases
}

fn tensor_power() {
    let adjoint = irrep("SU(5)", "24");
    let start = Instant::now();
    let power = adjoint.tensor_power(20).expect("a power within the limits");
    let took = start.elapsed();
    assert_eq!(power.dimension(), BigUint::from(24u32).pow(20));
    let largest = power.iter().map(|(_, n)| n).max().expect("terms");
    println!(
        "\nSU(5) 24 to the 20th: {:.1} ms, {} terms, multiplicities up to {largest}",
        microseconds(took) / 1e3,
        power.len()
    );
}

fn million_products() {
    const MILLION: usize = 1_000_000;
    let su5: SimpleAlgebra = "SU(5)".parse().expect("SU(5)");
    let bound = CatalogBound::Dimension(100u32.into());
    let irreps = su5.irreps_within(&bound, 1000).expect("a short list");
    let count = irreps.len();
    let pair = |i: usize| (&irreps[i % count], &irreps[i / count % count]);
    let mut cache = ProductCache::new().with_limits(Limits::default());
    let start = Instant::now();
    let mut terms = 0;
    for i in 0..MILLION {
        let (left, right) = pair(i);
        terms += cache.product(left, right).expect("a small product").len();
    }
    let held = start.elapsed();
    let (mut fresh_terms, start) = (0, Instant::now());
    for i in 0..MILLION {
        let (left, right) = pair(i);
        fresh_terms += black_box(left.product(right))
            .expect("a small product")
            .len();
    }
    let fresh = start.elapsed();
    assert_eq!(terms, fresh_terms);
    println!(
        "a million products of the {} irreps of SU(5) up to dimension 100, {} of them different: \
         {:.0} ms with a cache held, {:.0} ms without",
        irreps.len(),
        cache.len(),
        microseconds(held) / 1e3,
        microseconds(fresh) / 1e3
    );
}
