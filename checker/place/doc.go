// Package place says where in the input something stands and what is wrong there.
//
// A Problem is data: a place, a path in the file, a kind, what was found, what was expected, what to
// write instead. Sentence alone makes words of it. Problems gathers the faults of all files, so that
// a reader never stops at the first one, and prints them sorted, each under its line with a caret.
// Text from a file is never printed raw: Quote and the printer escape control, bidirectional and
// invisible characters.
package place
