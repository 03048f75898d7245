//! GAP as the peer: its answers, and its time without its start-up.

use std::collections::BTreeMap;
use std::time::Duration;

use num_bigint::BigInt;
use outside_checks::gap::{numbers, run};
use roots::{Irrep, Numbering};

/// An answer of GAP: multiplicities by labels, and the time it took.
#[derive(Clone, Debug)]
pub struct Answer {
    /// Multiplicities by Dynkin labels in Slansky's order.
    pub terms: BTreeMap<Vec<i64>, BigInt>,
    /// The fastest of three runs.
    pub time: Duration,
}

const TIMED: &str = r#"
Timed := function(call)
  local i, start, took, best, answer;
  best := infinity;
  for i in [1..3] do
    GASMAN("collect");
    start := NanosecondsSinceEpoch();
    answer := call();
    took := NanosecondsSinceEpoch() - start;
    if took < best then best := took; fi;
  od;
  Print(best, " ", answer, "\n");
end;
"#;

/// The product of two irreps, as many times as there are cases; `None` without GAP.
#[must_use]
pub fn products(cases: &[[Irrep; 2]]) -> Option<Vec<Answer>> {
    let calls = cases.iter().map(|[left, right]| {
        let call = format!(
            "DecomposeTensorProduct(L,{},{})",
            labels(left),
            labels(right)
        );
        (left, call)
    });
    ask(calls)
}

/// The dominant weights of irreps; `None` without GAP.
#[must_use]
pub fn dominant_weights(cases: &[Irrep]) -> Option<Vec<Answer>> {
    let calls = cases.iter().map(|irrep| {
        let call = format!("DominantCharacter(L,{})", labels(irrep));
        (irrep, call)
    });
    ask(calls)
}

fn ask<'a>(calls: impl Iterator<Item = (&'a Irrep, String)>) -> Option<Vec<Answer>> {
    let mut script = TIMED.to_owned();
    let mut irreps = Vec::new();
    for (irrep, call) in calls {
        let of = irrep.algebra().cartan_type();
        script += &format!(
            "L := SimpleLieAlgebra(\"{}\",{},Rationals);\nRootSystem(L);\nTimed(function() return {call}; end);\n",
            of.family(),
            of.rank()
        );
        irreps.push(irrep);
    }
    let lines = run(&script)?;
    assert_eq!(lines.len(), irreps.len(), "one line per case");
    let answers = irreps.iter().zip(&lines);
    Some(answers.map(|(irrep, line)| answer(irrep, line)).collect())
}

fn answer(irrep: &Irrep, line: &str) -> Answer {
    let flat = numbers(line);
    let n = irrep.labels().len();
    let (time, flat) = flat.split_first().expect("a time");
    let (weights, counts) = flat.split_at(flat.len() / (n + 1) * n);
    let label = |label: &BigInt| -> i64 { label.try_into().expect("a label") };
    let weights = weights.chunks(n).map(|weight| {
        let labels: Vec<i64> = weight.iter().map(label).collect();
        Numbering::Bourbaki.to_slansky(irrep.algebra().cartan_type(), &labels)
    });
    Answer {
        terms: weights.zip(counts.iter().cloned()).collect(),
        time: Duration::from_nanos(time.try_into().expect("a time")),
    }
}

/// Labels as GAP takes them: it has Bourbaki's order for A, B, C, D and E, all that is timed here.
fn labels(irrep: &Irrep) -> String {
    let places = Numbering::Bourbaki.from_slansky(irrep.algebra().cartan_type(), irrep.labels());
    format!("{places:?}")
}
