//! The fixed spectrum of twenty multiplets, and what a check of it takes at the least.

use std::fmt::Write as _;

use model::{Group, Model, Spectrum};

/// Three families, every field a multiplet of its own, under SU(3) x SU(2) x U(1) x U(1): the
/// second U(1) is B-L times 1, 2 and -3 in the three families, which cancels within each. With the
/// Higgs doublet and the scalar that breaks the U(1), twenty multiplets: a model file.
#[must_use]
pub fn twenty_multiplets() -> String {
    let mut file = String::from("[model]\ntitle = \"Three families under two U(1)s\"\n");
    let symmetries = [
        ("colour", "SU(3)"),
        ("weak", "SU(2)"),
        ("hypercharge", "U(1)"),
        ("family charge", "U(1)"),
    ];
    for (label, algebra) in symmetries {
        let _ = writeln!(
            file,
            "[[symmetry]]\nlabel = \"{label}\"\nalgebra = \"{algebra}\""
        );
    }
    let left = "left-handed fermion";
    let right = "right-handed fermion";
    let fields = [
        ("quark doublet", left, "3", "2", "1/6", 1),
        ("up quark", right, "3", "1", "2/3", 1),
        ("down quark", right, "3", "1", "-1/3", 1),
        ("lepton doublet", left, "1", "2", "-1/2", -3),
        ("electron", right, "1", "1", "-1", -3),
        ("neutrino", right, "1", "1", "0", -3),
    ];
    for (family, times) in [(1, 1), (2, 2), (3, -3)] {
        for (label, field, colour, weak, hypercharge, thirds) in fields {
            let charge = format!("{}/3", thirds * times);
            let transforms = [colour, weak, hypercharge, charge.as_str()];
            multiplet(&mut file, &format!("{label} {family}"), field, transforms);
        }
    }
    let scalar = "complex scalar";
    multiplet(&mut file, "Higgs doublet", scalar, ["1", "2", "1/2", "0"]);
    multiplet(&mut file, "family scalar", scalar, ["1", "1", "0", "2"]);
    file
}

fn multiplet(file: &mut String, label: &str, field: &str, transforms: [&str; 4]) {
    let [colour, weak, hypercharge, charge] = transforms;
    let _ = writeln!(
        file,
        "[[multiplet]]\nlabel = \"{label}\"\nfield = \"{field}\"\ntransforms = {{ colour = \
         \"{colour}\", weak = \"{weak}\", hypercharge = \"{hypercharge}\", \"family charge\" = \
         \"{charge}\" }}"
    );
}

/// The model of that text.
///
/// # Panics
/// Never: the text is a model file.
#[must_use]
pub fn read(text: &str) -> Model {
    Model::from_toml(text).expect("a model file")
}

/// Multiplications without which no check of `spectrum` term by term can do: one for each charge,
/// index and multiplicity in a term beyond the first, where the term is not zero at sight.
#[must_use]
pub fn multiplications(spectrum: &Spectrum) -> usize {
    let terms = anomaly::Anomaly::all(spectrum).map(|anomaly| {
        let places = anomaly.symmetries();
        let fermions = spectrum.multiplets().iter().filter(|one| {
            let charged = |&place: &usize| !one.transformation(place).is_trivial();
            one.has_fermions() && places.iter().all(charged)
        });
        let charges = places
            .iter()
            .filter(|&&place| spectrum.symmetries()[place].group() == Group::U1);
        let indices = usize::from(charges.clone().count() < places.len());
        fermions.count() * (charges.count() + indices)
    });
    terms.sum()
}
