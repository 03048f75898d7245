//! What must be true of the anomalies of every spectrum, over random groups and contents.

mod plan;
mod traces;

use anomaly::{Condition, Report};
use num_bigint::BigInt;
use num_rational::BigRational;
use num_traits::Zero;
use plan::{Content, Plan, content, plan};
use proptest::prelude::*;

fn values(plan: &Plan) -> Vec<BigRational> {
    let report = report(plan);
    report
        .conditions()
        .iter()
        .map(|one| one.value().clone())
        .collect()
}

/// The report, coherent in itself and with the bare verdict.
fn report(plan: &Plan) -> Report {
    let spectrum = plan.spectrum();
    let report = Report::of(&spectrum).unwrap();
    for one in report.conditions() {
        let sum: BigRational = one.contributions().iter().sum();
        assert_eq!(&sum, one.value(), "{}", one.name());
        assert_eq!(one.contributions().len(), plan.contents.len());
    }
    assert_eq!(
        anomaly::is_consistent(&spectrum),
        Ok(report.is_consistent())
    );
    report
}

/// Conditions that are sums, not parities.
fn local(plan: &Plan) -> Vec<Condition> {
    let report = report(plan);
    let conditions = report.conditions().iter();
    conditions
        .filter(|one| one.kind() != anomaly::Kind::Global)
        .cloned()
        .collect()
}

/// Local conditions before and after, those of a Z(N) modulo N.
fn same(before: &[Condition], after: &[Condition]) -> Result<(), TestCaseError> {
    prop_assert_eq!(before.len(), after.len());
    for (before, after) in before.iter().zip(after) {
        let change = after.value() - before.value();
        match before.rule() {
            anomaly::Rule::Zero => prop_assert!(change.is_zero(), "{}", before.name()),
            anomaly::Rule::MultipleOf(n) => {
                prop_assert!((change / BigInt::from(n)).is_integer(), "{}", before.name());
            }
        }
    }
    Ok(())
}

fn plan_with_content() -> impl Strategy<Value = (Plan, Content)> {
    plan().prop_flat_map(|plan| {
        let more = content(plan.symmetries.clone());
        (Just(plan), more)
    })
}

proptest! {
    #![proptest_config(ProptestConfig::with_cases(128))]

    /// A field and its conjugate of the same handedness, or itself of the other, add nothing to a
    /// local condition, and an even number to each parity.
    #[test]
    fn a_vector_like_pair_changes_nothing((plan, more) in plan_with_content()) {
        let before = local(&plan);
        for partner in [more.conjugate(&plan.symmetries), more.other_handed()] {
            let mut with = plan.clone();
            with.contents.extend([more.clone(), partner]);
            same(&before, &local(&with))?;
            let parities = values(&with).into_iter().zip(values(&plan)).zip(report(&plan).conditions().to_vec());
            for ((after, before), one) in parities {
                if one.kind() == anomaly::Kind::Global {
                    prop_assert!(((after - before) / BigInt::from(2)).is_integer());
                }
            }
        }
    }

    /// A right-handed field is its left-handed conjugate, in every value; Z(N) modulo N.
    #[test]
    fn right_handed_is_conjugate_left_handed(plan in plan()) {
        let mut turned = plan.clone();
        for one in &mut turned.contents {
            *one = one.other_handed().conjugate(&plan.symmetries);
        }
        let (before, after) = (report(&plan), report(&turned));
        same(before.conditions(), after.conditions())?;
    }

    /// Real under everything: nothing local.
    #[test]
    fn a_real_irrep_adds_nothing((plan, more) in plan_with_content()) {
        let real = more.neutral().adjoints(&plan.symmetries);
        let mut with = plan.clone();
        with.contents.push(real);
        same(&local(&plan), &local(&with))?;
        prop_assert_eq!(report(&plan).is_consistent(), report(&with).is_consistent());
    }

    /// Charges of one U(1) times a number: each value times its power of it.
    #[test]
    fn scaled_charges(plan in plan(), above in -20i64..=20, below in 1i64..=20) {
        let by = BigRational::new(above.into(), below.into());
        for (place, symmetry) in plan.symmetries.iter().enumerate() {
            if !symmetry.group().is_u1() {
                continue;
            }
            let mut scaled = plan.clone();
            for one in &mut scaled.contents {
                one.scale(place, &by);
            }
            for (before, after) in report(&plan).conditions().iter().zip(report(&scaled).conditions()) {
                let enters = before.factors().iter().filter(|label| *label == symmetry.label());
                let power = i32::try_from(enters.count()).unwrap();
                prop_assert_eq!(&(before.value() * by.pow(power)), after.value(), "{}", before.name());
            }
        }
    }

    /// The order of multiplets is the order of their shares, and no more.
    #[test]
    fn order_of_multiplets(plan in plan(), turn in any::<prop::sample::Index>()) {
        let by = turn.index(plan.contents.len());
        let mut turned = plan.clone();
        turned.contents.rotate_left(by);
        for (before, after) in report(&plan).conditions().iter().zip(report(&turned).conditions()) {
            let mut shares = before.contributions().to_vec();
            shares.rotate_left(by);
            prop_assert_eq!(&shares, after.contributions());
            prop_assert_eq!(before.value(), after.value());
            prop_assert_eq!(before.cancels(), after.cancels());
        }
    }

    /// Copies are multiplets that are alike.
    #[test]
    fn copies_one_by_one(plan in plan()) {
        let mut apart = plan.clone();
        apart.contents.clear();
        for one in &plan.contents {
            apart.contents.extend((0..one.copies).map(|_| one.single()));
        }
        prop_assert_eq!(values(&plan), values(&apart));
        prop_assert_eq!(report(&plan).is_consistent(), report(&apart).is_consistent());
    }

    /// Scalars are not there.
    #[test]
    fn scalars_do_not_count(plan in plan()) {
        let mut fermions = plan.clone();
        fermions.contents.retain(|one| one.field.has_fermions());
        prop_assert_eq!(values(&plan), values(&fermions));
    }
}
