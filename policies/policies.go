// Package policies is the rule library: the rules, their limits and the steps of cures, as files.
// Nothing here is Go but the embedding.
package policies

import "embed"

// Files holds the rules, limits.yaml and series.yaml. The cases beside the rules are not embedded.
//
//go:embed */*.rego limits.yaml series.yaml
var Files embed.FS

// Index is what the rule files say, read in advance by go generate ./checker/rules.
//
//go:embed index.json
var Index []byte

// BoardSchema is the JSON Schema (draft-07) of a board file, made from board.yaml by go generate
// ./checker/spec, for editors.
//
//go:embed board.schema.json
var BoardSchema []byte
