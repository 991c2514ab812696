// Package spec reads a board file: YAML in, typed values with their places out. It is the only judge
// of the file at run time.
//
// Every value is one of three things: stated, stated none, or not said. What is given but says
// nothing ("tbc", "see drawing", an empty key) is not said and is remembered as a [Remark]; what is
// stated but unusual is a [Doubt] and is used by nobody until it is confirmed. A fault of the file
// is a place.Problem; [Read] returns all problems of all files at once, none caused by another.
//
// A value knows where it stands ([At]), through which `like:` and `basis:` steps it came, which
// document it was taken from, and which line of the vocabulary describes it ([Leaf]). A value that
// is not said knows the same of the line where it belongs.
//
// The structs, words and tables are generated from policies/board.yaml.
package spec

//go:generate go run gen.go
