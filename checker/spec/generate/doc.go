// Package generate turns the vocabulary of board files, policies/board.yaml, into what is made from
// it: the Go structs, tables and reading functions of package spec, the JSON Schema for editors,
// and an example board that uses every field once.
//
// A word, a key or a unit is spelt once, in the vocabulary. An unsound vocabulary is refused with
// the line of each fault, so that nothing half right is ever written.
package generate
