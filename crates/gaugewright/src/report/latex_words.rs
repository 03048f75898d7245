//! Words as LaTeX that a bare `pdflatex` can set: its own characters made plain, and what is not
//! ASCII as commands of the kernel. What those do not reach stands as `U+4E2D`.

use std::fmt::Write as _;

use unicode_normalization::UnicodeNormalization;

/// Commands by character; in each line first the character, then what stands for it.
const TEXT: &str = r#"
\ \textbackslash{}
~ \textasciitilde{}
^ \textasciicircum{}
< $<$
> $>$
| $|$
& \&
% \%
$ \$
# \#
_ \_
{ \{
} \}
[ {[}
] {]}
" \char34{}
` \`{}
ß \ss{}
æ \ae{}
Æ \AE{}
œ \oe{}
Œ \OE{}
ø \o{}
Ø \O{}
ł \l{}
Ł \L{}
ı \i{}
ȷ \j{}
§ \S{}
¶ \P{}
© \copyright{}
¡ !`
¿ ?`
– --
— ---
‘ `{}
’ '{}
“ ``{}
” ''{}
… \ldots{}
† \dag{}
‡ \ddag{}
"#;

/// As [`TEXT`], set as mathematics.
const MATHEMATICS: &str = r"
α \alpha
β \beta
γ \gamma
δ \delta
ε \varepsilon
ϵ \epsilon
ζ \zeta
η \eta
θ \theta
ϑ \vartheta
ι \iota
κ \kappa
λ \lambda
μ \mu
µ \mu
ν \nu
ξ \xi
ο o
π \pi
ϖ \varpi
ρ \rho
ϱ \varrho
ς \varsigma
σ \sigma
τ \tau
υ \upsilon
φ \varphi
ϕ \phi
χ \chi
ψ \psi
ω \omega
Α \mathrm{A}
Β \mathrm{B}
Γ \Gamma
Δ \Delta
Ε \mathrm{E}
Ζ \mathrm{Z}
Η \mathrm{H}
Θ \Theta
Ι \mathrm{I}
Κ \mathrm{K}
Λ \Lambda
Μ \mathrm{M}
Ν \mathrm{N}
Ξ \Xi
Ο \mathrm{O}
Π \Pi
Ρ \mathrm{P}
Σ \Sigma
Τ \mathrm{T}
Υ \Upsilon
Φ \Phi
Χ \mathrm{X}
Ψ \Psi
Ω \Omega
ℓ \ell
ħ \hbar
ℏ \hbar
∂ \partial
× \times
÷ \div
± \pm
∓ \mp
− -
· \cdot
∗ *
∘ \circ
° {}^{\circ}
¬ \neg
⊗ \otimes
⊕ \oplus
→ \to
← \leftarrow
↔ \leftrightarrow
⇒ \Rightarrow
≤ \leq
≥ \geq
≠ \neq
≈ \approx
≃ \simeq
≡ \equiv
∼ \sim
∝ \propto
∞ \infty
∈ \in
⊂ \subset
⊃ \supset
√ \surd
∑ \sum
∏ \prod
∫ \int
′ {}^{\prime}
″ {}^{\prime\prime}
⁰ {}^{0}
¹ {}^{1}
² {}^{2}
³ {}^{3}
⁴ {}^{4}
⁵ {}^{5}
⁶ {}^{6}
⁷ {}^{7}
⁸ {}^{8}
⁹ {}^{9}
⁺ {}^{+}
⁻ {}^{-}
₀ {}_{0}
₁ {}_{1}
₂ {}_{2}
₃ {}_{3}
₄ {}_{4}
₅ {}_{5}
₆ {}_{6}
₇ {}_{7}
₈ {}_{8}
₉ {}_{9}
";

/// Accents: the combining character, over text, over mathematics.
const ACCENTS: [(char, &str, &str); 13] = [
    ('\u{300}', "\\`", "\\grave"),
    ('\u{301}', "\\'", "\\acute"),
    ('\u{302}', "\\^", "\\hat"),
    ('\u{303}', "\\~", "\\tilde"),
    ('\u{304}', "\\=", "\\bar"),
    ('\u{305}', "\\=", "\\overline"),
    ('\u{306}', "\\u", "\\breve"),
    ('\u{307}', "\\.", "\\dot"),
    ('\u{308}', "\\\"", "\\ddot"),
    ('\u{30a}', "\\r", "\\mathring"),
    ('\u{30b}', "\\H", ""),
    ('\u{30c}', "\\v", "\\check"),
    ('\u{327}', "\\c", ""),
];

/// The words as LaTeX.
pub(super) fn escaped(words: &str) -> String {
    let mut out = String::with_capacity(words.len());
    let mut letters = words.nfd().peekable();
    let mut previous = None;
    while let Some(letter) = letters.next() {
        let mut accents = Vec::new();
        while let Some(accent) = letters.next_if(|&next| accent(next).is_some()) {
            accents.push(accent);
        }
        // Two of these in a row would be drawn together as one character.
        if matches!(letter, '-' | '\'' | ',') && previous == Some(letter) {
            out.push_str("{}");
        }
        previous = Some(letter);
        out.push_str(&accented(letter, &accents));
    }
    out
}

fn accent(c: char) -> Option<&'static (char, &'static str, &'static str)> {
    ACCENTS.iter().find(|(combining, ..)| *combining == c)
}

fn accented(letter: char, accents: &[char]) -> String {
    let known = || accents.iter().filter_map(|&c| accent(c));
    if let Some(symbol) = command(MATHEMATICS, letter) {
        let mut symbol = symbol.to_owned();
        let mut after = String::new();
        for (combining, _, over) in known() {
            match *over {
                "" => after.push_str(&by_number(*combining)),
                over => symbol = format!("{over}{{{symbol}}}"),
            }
        }
        return format!("${symbol}${after}");
    }
    let dotless = !accents.is_empty() && !accents.contains(&'\u{327}');
    let mut word = match letter {
        'i' if dotless => "\\i".to_owned(),
        'j' if dotless => "\\j".to_owned(),
        ' ' | '\n' | '\r' | '\t' | '\u{2009}' | '\u{202f}' => " ".to_owned(),
        '\u{a0}' => "~".to_owned(),
        plain if plain.is_ascii_alphanumeric() => plain.to_string(),
        other => match command(TEXT, other) {
            Some(command) => command.to_owned(),
            None if other.is_ascii_graphic() => other.to_string(),
            None => by_number(other),
        },
    };
    for (_, over, _) in known() {
        word = format!("{over}{{{word}}}");
    }
    word
}

fn command(list: &'static str, letter: char) -> Option<&'static str> {
    list.lines()
        .find_map(|line| line.strip_prefix(letter)?.strip_prefix(' '))
}

fn by_number(letter: char) -> String {
    let mut word = String::new();
    let _ = write!(word, "U+{:04X}", u32::from(letter));
    word
}

#[cfg(test)]
mod tests {
    use super::{MATHEMATICS, TEXT, escaped};

    #[test]
    fn each_character_has_one_command() {
        for list in [TEXT, MATHEMATICS] {
            let lines = list.lines().filter(|line| !line.is_empty());
            let mut letters: Vec<char> = lines
                .map(|line| {
                    let (letter, command) = line.split_once(' ').unwrap();
                    assert!(command.is_ascii() && !command.is_empty(), "{line}");
                    assert_eq!(letter.chars().count(), 1, "{line}");
                    letter.chars().next().unwrap()
                })
                .collect();
            letters.sort_unstable();
            let count = letters.len();
            letters.dedup();
            assert_eq!(letters.len(), count);
        }
    }

    #[test]
    fn words() {
        assert_eq!(escaped("a_b & 50%"), "a\\_b \\& 50\\%");
        assert_eq!(escaped("\u{3bd}\u{305}_R"), "$\\overline{\\nu}$\\_R");
        assert_eq!(escaped("Garc\u{ed}a \u{c5}"), "Garc\\'{\\i}a \\r{A}");
        assert_eq!(escaped("H\u{151}s"), "H\\H{o}s");
        assert_eq!(escaped("\u{4e2d}\u{1b}"), "U+4E2DU+001B");
        assert_eq!(escaped("a--b''"), "a-{}-b'{}'");
    }

    /// Whatever the words are, what pdflatex reads is ASCII, and braces and $ close.
    #[test]
    fn always_ascii() {
        for code in (0..0x3000)
            .chain(0x1_f900..0x1_fa00)
            .filter_map(char::from_u32)
        {
            let word = escaped(&format!("{code}\u{301}\u{327}"));
            assert!(
                word.is_ascii() && !word.contains(['\u{1b}', '\n']),
                "{word}"
            );
            let unescaped = word.replace("\\{", "").replace("\\}", "");
            let count = |c| unescaped.matches(c).count();
            assert_eq!(count('{'), count('}'), "{word}");
            assert_eq!(
                word.replace("\\$", "").matches('$').count() % 2,
                0,
                "{word}"
            );
        }
    }
}
