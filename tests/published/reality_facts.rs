//! Which irreps are real, pseudoreal and complex, as [Slansky 1981] and every text has it.

use roots::Reality::{self, Complex, Pseudoreal, Real};

use crate::support::algebra;

#[test]
fn by_name() {
    let facts: [(&str, &str, Reality); 34] = [
        ("SU(3)", "3", Complex),
        ("SU(3)", "8", Real),
        ("SU(4)", "6", Real),
        ("SU(4)", "10", Complex),
        ("SU(6)", "20", Pseudoreal),
        ("SU(6)", "35", Real),
        ("SU(8)", "70", Real),
        ("SU(10)", "252", Pseudoreal),
        ("SO(5)", "4", Pseudoreal),
        ("SO(5)", "5", Real),
        ("SO(6)", "4", Complex),
        ("SO(7)", "8", Real),
        ("SO(8)", "8v", Real),
        ("SO(8)", "8s", Real),
        ("SO(8)", "8c", Real),
        ("SO(9)", "16", Real),
        ("SO(10)", "16", Complex),
        ("SO(10)", "126", Complex),
        ("SO(10)", "10", Real),
        ("SO(11)", "32", Pseudoreal),
        ("SO(12)", "32", Pseudoreal),
        ("SO(12)", "32'", Pseudoreal),
        ("SO(13)", "64", Pseudoreal),
        ("SO(14)", "64", Complex),
        ("SO(15)", "128", Real),
        ("SO(16)", "128", Real),
        ("SO(16)", "128'", Real),
        ("Sp(4)", "5", Real),
        ("Sp(6)", "14'", Pseudoreal),
        ("Sp(6)", "14", Real),
        ("E6", "27", Complex),
        ("E6", "78", Real),
        ("E7", "56", Pseudoreal),
        ("E7", "133", Real),
    ];
    for (name, written, reality) in facts {
        let irrep = algebra(name).read_irrep(written).unwrap();
        assert_eq!(irrep.reality(), reality, "{name} {written}");
    }
}

/// Even dimensions of SU(2) are pseudoreal, odd ones real.
#[test]
fn spins() {
    for twice_spin in 0..200 {
        let irrep = algebra("SU(2)").irrep(&[twice_spin]).unwrap();
        let expected = if twice_spin % 2 == 0 {
            Real
        } else {
            Pseudoreal
        };
        assert_eq!(irrep.reality(), expected, "{twice_spin}");
    }
}

/// Fundamentals of Sp(2N) are pseudoreal; everything of E8, F4 and G2 is real.
#[test]
fn whole_series() {
    for n in 2..=40 {
        let sp = algebra(&format!("Sp({})", 2 * n));
        let vector = sp.read_irrep(&(2 * n).to_string()).unwrap();
        assert_eq!(vector.reality(), Pseudoreal, "{sp}");
    }
    for name in ["E8", "F4", "G2"] {
        let algebra = algebra(name);
        for seed in 0..200u32 {
            let labels: Vec<u32> = (0..8)
                .map(|i| (seed >> i) & 1)
                .take(algebra.rank())
                .collect();
            assert_eq!(
                algebra.irrep(&labels).unwrap().reality(),
                Real,
                "{labels:?}"
            );
        }
    }
}

/// Spinors of SO(N) repeat with N modulo 8 (common practice: real for N = 0, 1, 7, pseudoreal for
/// 3, 4, 5, complex for 2, 6).
#[test]
fn spinors_repeat_after_eight() {
    for size in 5..=200usize {
        let so = algebra(&format!("SO({size})"));
        let labels: Vec<u32> = (1..=so.rank()).map(|i| u32::from(i == so.rank())).collect();
        let expected = match size % 8 {
            0 | 1 | 7 => Real,
            2 | 6 => Complex,
            _ => Pseudoreal,
        };
        assert_eq!(so.irrep(&labels).unwrap().reality(), expected, "{so}");
    }
}
