// Package facts is the vocabulary of what is known about a board: the terms, the
// subjects (board, busbars, units …), and the walk that fills them from the file and
// the formulas.
//
// A [Term] names a quantity or a word once: rules, worksheet, report and queries all
// point at it. A [Fact] is a term's value for one subject, or what keeps it from
// having one. Rules see facts only.
package facts
