#!/usr/bin/env python3
"""Writes data/pdg_charges.toml: electric charges of quarks and leptons.

They are those of the open package `pdg`, which carries the Review of Particle Physics as its
publishers release it; the open package `particle`, made from the same Review by others, must
agree. To run it again:

    python3 -m venv /tmp/charges
    /tmp/charges/bin/pip install pdg==2026.0 particle==1.1.0
    /tmp/charges/bin/python scripts/pdg_charges.py > data/pdg_charges.toml
"""

from fractions import Fraction
from importlib.metadata import version
import warnings

warnings.simplefilter("ignore")

import particle
import pdg

KINDS = {
    "up-type quark": [2, 4, 6],
    "down-type quark": [1, 3, 5],
    "neutrino": [12, 14, 16],
    "charged lepton": [11, 13, 15],
}

HEAD = """\
# Electric charges of quarks and leptons, in units of the positron's.
# {citation}; data licensed under {license}.
# Made by scripts/pdg_charges.py; not to be edited.
source = "Review of Particle Physics, edition {edition}"
packages = ["pdg {pdg}", "particle {particle}"]
"""


def charge_in_thirds(number, review):
    """The charge times three, if both packages have the same."""
    decimal = review.get_particle_by_mcid(number).charge
    thirds = round(3 * decimal)
    if abs(3 * decimal - thirds) > 1e-9:
        raise SystemExit(f"particle {number}: {decimal} is no multiple of 1/3")
    other = particle.Particle.from_pdgid(number).three_charge
    if other != thirds:
        raise SystemExit(f"particle {number}: the packages have {thirds}/3 and {other}/3")
    return thirds


def main():
    review = pdg.connect()
    citation = review.citation.replace("<i>", "").replace("</i>", "")
    print(
        HEAD.format(
            citation=citation,
            license=review.license,
            edition=review.edition,
            pdg=version("pdg"),
            particle=version("particle"),
        )
    )
    print("particles = [")
    for kind, numbers in KINDS.items():
        for number in numbers:
            name = review.get_particle_by_mcid(number).name
            charge = Fraction(charge_in_thirds(number, review), 3)
            print(f'  {{ name = "{name}", number = {number}, kind = "{kind}", charge = "{charge}" }},')
    print("]")


if __name__ == "__main__":
    main()
