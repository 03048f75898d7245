//! The verdict on a spectrum of twenty multiplets, as a scan asks for it.
//!
//! `cargo bench -p benches --bench anomaly_check`. Target: `is_consistent` below 5 microseconds.
//! The spectrum is that of [`families::twenty_multiplets`]: three families, field by field, under
//! SU(3) x SU(2) x U(1) x U(1), with two scalars; twelve conditions. The limit printed first is
//! the number of multiplications that the sums have at the least.

use std::hint::black_box;

use anomaly::{Report, is_consistent};
use benches::families;
use criterion::{Criterion, Throughput, criterion_group, criterion_main};
use gaugewright::answer::{Answer, AuditAnswer};

fn checks(criterion: &mut Criterion) {
    let text = families::twenty_multiplets();
    let model = families::read(&text);
    let spectrum = model.spectrum();
    assert_eq!(spectrum.multiplets().len(), 20);
    assert_eq!(is_consistent(spectrum), Ok(true));
    let report = Report::of(spectrum).expect("every charge is known");
    assert_eq!(report.conditions().len(), 12);
    assert!(report.is_consistent());
    println!(
        "limit: {} multiplications in {} conditions of 18 fermions",
        families::multiplications(spectrum),
        report.conditions().len()
    );

    let mut group = criterion.benchmark_group("anomaly");
    group.throughput(Throughput::Elements(1));
    group.bench_function("is_consistent/20 multiplets", |bencher| {
        bencher.iter(|| assert_eq!(is_consistent(black_box(spectrum)), Ok(true)));
    });
    group.bench_function("report/20 multiplets", |bencher| {
        bencher.iter(|| assert!(Report::of(black_box(spectrum)).is_ok_and(|r| r.is_consistent())));
    });
    group.finish();

    let mut group = criterion.benchmark_group("model");
    group.throughput(Throughput::Bytes(text.len() as u64));
    group.bench_function("parse/20 multiplets", |bencher| {
        bencher.iter(|| assert_eq!(families::read(black_box(&text)), model));
    });
    group.finish();

    audits(criterion, &model);
}

fn audits(criterion: &mut Criterion, model: &model::Model) {
    let mut group = criterion.benchmark_group("audit");
    for (name, model) in [("20 multiplets", model), ("demonstration", &model::demo())] {
        group.bench_function(format!("{name}/json"), |bencher| {
            bencher.iter(|| {
                let audit = AuditAnswer::new(
                    black_box(model).clone(),
                    gaugewright::roots::Numbering::default(),
                )
                .expect("known charges");
                assert!(!audit.is_refusal());
                audit.json()
            });
        });
    }
    group.finish();
}

criterion_group!(benches, checks);
criterion_main!(benches);
