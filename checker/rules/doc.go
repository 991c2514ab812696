// Package rules is the embedded engine: it loads packs of rules, refuses forms that could acquit a
// subject of which nothing is known, and judges. It knows terms and subjects, no switchboards.
//
// A pack is a folder: one Rego file per rule, limits.yaml with what an owner may tighten, series.yaml
// with the steps of the trade, and beside each rule its cases. A rule file goes through three stages:
//
//   - read: the metadata block and the bodies are taken from the text; only a small part of the
//     language is let through (read.go), so that a proof is a positive comparison of facts that are
//     there;
//   - resolve: every name is looked up in the vocabulary; units, lists of words and the direction of
//     bounds have to fit (resolve.go);
//   - compile: the engine checks the text once more against a schema of the facts, in a sandbox that
//     offers the comparison operators and nothing else (engine.go).
//
// [Load] runs all three on an owner's pack. For the pack of this program the first stage runs in
// `go generate`, which writes policies/index.json; [LoadOwn] reads that, and the engine compiles when
// the first board is judged.
//
// A verdict is found twice: by the engine from the text of the rule, and by plain comparisons in Go
// (decide.go), which also tell the body that proved it. Where the two disagree nothing is proven.
//
//go:generate go run write_index.go
package rules
