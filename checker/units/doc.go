// Package units holds the quantities of a switchboard review as types, and reads and prints them.
//
// A value in the program is a named float64 in the SI base unit of its quantity: Ampere, Metre,
// Second. Prefixes exist only at the border: Parse reads "65 kA" as people write it, Format prints
// it as people say it. A value that comes without its unit, with a unit of another quantity, or with
// a comma that can be read in two ways is refused with a Fault that says what to write; nothing is
// guessed.
//
// What is accepted, for every quantity:
//
//   - digits with at most one decimal point and at most one leading minus ("-" or U+2212), up to
//     15 digits on each side of the point
//   - spaces, no-break spaces and tabs around the number and the unit, or none
//   - capitals exactly as in the unit: mm and Mm, mVA and MVA are different things
//   - "2" or "²", "µ" (U+00B5), "μ" (U+03BC) or "u", "Ω", "ohm" or "Ohm"
package units
