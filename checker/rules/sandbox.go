package rules

import (
	"github.com/open-policy-agent/opa/v1/ast"
)

// allowedBuiltins is everything a rule may call: comparison and membership. "eq" is what the compiler
// itself turns names into. An allow-list survives upgrades of the engine; a list of what is forbidden
// would not.
var allowedBuiltins = []string{"eq", "equal", "gt", "gte", "lt", "lte", "internal.member_2"}

// sandbox is what the compiler may know of: the allowed built-ins, and no host to fetch from. It has to
// be set on the compiler; as an option of a query it would not reach the rules.
func sandbox() *ast.Capabilities {
	all := ast.CapabilitiesForThisVersion()
	out := &ast.Capabilities{Features: all.Features, FutureKeywords: all.FutureKeywords, AllowNet: []string{}}
	for _, b := range all.Builtins {
		for _, name := range allowedBuiltins {
			if b.Name == name {
				out.Builtins = append(out.Builtins, b)
			}
		}
	}
	return out
}
