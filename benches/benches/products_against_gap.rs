//! Products and dominant weights beside GAP, in one run, as a table; the answers are asserted.
//!
//! `cargo bench -p benches --bench products_against_gap`. The physical limit of a product by
//! reflection is one visit to each weight of the smaller factor: the last column says how many
//! nanoseconds a visit takes, everything counted.

// Times are measured, and printed as decimals.
#![allow(clippy::float_arithmetic, clippy::cast_precision_loss)]

use std::collections::BTreeMap;
use std::time::Duration;

use benches::case::{self, ProductCase, WeightCase};
use benches::clock::{geometric_mean, microseconds, time};
use benches::peer::{self, Answer};
use num_bigint::BigInt;

fn main() {
    let products = case::products();
    let factors: Vec<_> = products.iter().map(|case| case.factors.clone()).collect();
    let answers = peer::products(&factors);
    if answers.is_none() {
        println!("GAP is not there: its columns are left out. Install gap-core to have them.");
    }
    heading("products");
    let rows = products.iter().enumerate();
    let ratios: Vec<f64> = rows
        .filter_map(|(i, case)| product(case, answers.as_ref().map(|answers| &answers[i])))
        .collect();
    summary(&ratios);

    let systems = case::weight_systems();
    let irreps: Vec<_> = systems.iter().map(|case| case.irrep.clone()).collect();
    let answers = peer::dominant_weights(&irreps);
    heading("dominant weights with multiplicities");
    let rows = systems.iter().enumerate();
    let ratios: Vec<f64> = rows
        .filter_map(|(i, case)| weight_system(case, answers.as_ref().map(|answers| &answers[i])))
        .collect();
    summary(&ratios);
}

fn heading(what: &str) {
    println!(
        "\n{what:<34} {:>12} {:>14} {:>8} {:>9} {:>12}",
        "ours/us", "GAP/us", "ratio", "weights", "ns/weight"
    );
}

fn summary(ratios: &[f64]) {
    if ratios.is_empty() {
        return;
    }
    let least = ratios.iter().copied().fold(f64::INFINITY, f64::min);
    println!(
        "geometric mean {:.0}, least {least:.0}",
        geometric_mean(ratios)
    );
}

fn product(case: &ProductCase, answer: Option<&Answer>) -> Option<f64> {
    let [left, right] = &case.factors;
    let product = left.product(right).expect("a product within the limits");
    assert_eq!(
        product.dimension(),
        left.dimension() * right.dimension(),
        "{}",
        case.name
    );
    let ours: BTreeMap<Vec<i64>, BigInt> = product
        .iter()
        .map(|(irrep, n)| {
            (
                irrep.labels().iter().map(|&label| label.into()).collect(),
                n.into(),
            )
        })
        .collect();
    let took = time(|| left.product(right));
    let touched = case::weights(left).min(case::weights(right));
    row(&case.name, took, touched, &ours, answer)
}

fn weight_system(case: &WeightCase, answer: Option<&Answer>) -> Option<f64> {
    let dominant = case.irrep.dominant_weights().expect("few dominant weights");
    let ours: BTreeMap<Vec<i64>, BigInt> = dominant
        .into_iter()
        .map(|(weight, n)| (weight.labels().to_vec(), n.into()))
        .collect();
    let took = time(|| case.irrep.dominant_weights());
    row(&case.name, took, ours.len() as u64, &ours, answer)
}

fn row(
    name: &str,
    took: Duration,
    touched: u64,
    ours: &BTreeMap<Vec<i64>, BigInt>,
    answer: Option<&Answer>,
) -> Option<f64> {
    let per_weight = microseconds(took) * 1e3 / touched as f64;
    let start = format!("{name:<34} {:>12.2}", microseconds(took));
    let Some(answer) = answer else {
        println!(
            "{start} {:>14} {:>8} {touched:>9} {per_weight:>12.1}",
            "-", "-"
        );
        return None;
    };
    assert_eq!(*ours, answer.terms, "{name}: the answers differ");
    let ratio = microseconds(answer.time) / microseconds(took);
    let gap = microseconds(answer.time);
    println!("{start} {gap:>14.0} {ratio:>8.0} {touched:>9} {per_weight:>12.1}");
    Some(ratio)
}
