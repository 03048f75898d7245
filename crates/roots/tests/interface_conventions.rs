//! Conventions promised to users: names, numbering, indices.

use roots::SimpleAlgebra;

fn algebra(name: &str) -> SimpleAlgebra {
    name.parse().unwrap()
}

/// [Slansky 1981], tables of irreps, from memory: which labels carry which name.
#[test]
fn slansky_names_and_labels() {
    let cases = [
        ("E6", "27", "(100000)"),
        ("E6", "78", "(000001)"),
        ("E7", "133", "(1000000)"),
        ("E7", "56", "(0000010)"),
        ("E8", "248", "(00000010)"),
        ("F4", "52", "(1000)"),
        ("F4", "26", "(0001)"),
        ("G2", "14", "(10)"),
        ("G2", "7", "(01)"),
        ("SO(10)", "16", "(00001)"),
        ("SO(10)", "16bar", "(00010)"),
        ("SO(10)", "126", "(00002)"),
        ("SU(5)", "10", "(0100)"),
        ("SU(5)", "35", "(0003)"),
        ("SU(5)", "40", "(0011)"),
        ("SU(5)", "45", "(0101)"),
        ("SU(4)", "10", "(200)"),
        ("SU(3)", "6", "(20)"),
        ("SU(3)", "6bar", "(02)"),
        ("SU(3)", "15", "(21)"),
        ("SU(3)", "15'", "(40)"),
        ("SO(8)", "8v", "(1000)"),
        ("SO(8)", "8s", "(0001)"),
        ("SO(8)", "8c", "(0010)"),
        ("SO(8)", "35v", "(2000)"),
        ("SO(8)", "56v", "(0011)"),
        ("SO(8)", "224vc", "(2010)"),
        ("SO(14)", "64", "(0000010)"),
        ("SO(12)", "32", "(000001)"),
        ("SO(12)", "32'", "(000010)"),
        ("SO(6)", "4", "(010)"),
        ("SU(2)", "13", "(12)"),
    ];
    for (name, written, labels) in cases {
        let irrep = algebra(name).read_irrep(written).unwrap();
        assert_eq!(irrep.bracketed(), labels, "{name} {written}");
        assert_eq!(irrep.name(), written, "{name} {labels}");
    }
}
