/** The signs that the Latin cuts of the text faces leave out. Added to the last place of every font stack. */
export const SIGNS = '≈≠≤≥≪≫±∓×÷−∝∞∫∑√∂∇∆→←↔⇒∈°′″⁻⁺⁰¹²³⁴⁵⁶⁷⁸⁹₀₁₂₃₄₅₆₇₈₉☉⊕ℏ';
