package rules

import (
	"strconv"
	"strings"

	"github.com/open-policy-agent/opa/v1/ast"

	"boardproof/checker/place"
)

// refusal is a form that is not let through: what was found and why it is unsafe, what is expected,
// what to write instead.
type refusal struct{ got, want, hint string }

const (
	positive  = "comparisons of facts that are there"
	verdicts  = "only the sets complies, departs and exempt"
	askTerm   = "ask for a term that holds the result"
	someShape = "some s in input.busbars, or another kind, as the first line of a body"
)

var (
	refuseNot           = refusal{`"not", which also holds when the fact is missing`, positive, "write the opposite comparison, such as < for >="}
	refuseEvery         = refusal{`"every", which also holds when the list is empty`, positive, "ask for a term that holds the worst member"}
	refuseComprehension = refusal{"a comprehension, which drops the members that lack the value", positive, "ask for a term that holds the total or the worst member"}
	refuseDefault       = refusal{`"default", which gives a verdict where nothing is known`, verdicts, "remove it; what is not proven is a query"}
	refuseElse          = refusal{`"else", which gives a verdict where nothing is known`, "one body per way of proof", "write a second body with its own comparisons"}
	refuseWith          = refusal{`"with", which puts other facts in the place of the board's`, positive, "remove it"}
	refuseAndOr         = refusal{`"and" or "or" inside a line, which hides what was compared`, "one comparison per line", "write a line for each part of an and, a body for each part of an or"}
	refuseTemplate      = refusal{"a text made of parts, which no list of words can check", "a word of the term's list", "write the word itself"}
	refuseNull          = refusal{`"null", which no fact ever is`, positive, "remove it; a missing fact is a query by itself"}
	refuseSet           = refusal{"a set with something else than texts, or an empty one", `a set of words such as {"yes", "partly"}`, "write each word between quotes"}
	refuseMembership    = refusal{`"in" with something else than a set of words`, `a term in {"word", "word"}`, "write the words between braces"}
	refuseNoSome        = refusal{"a body that does not begin with its subject", someShape, "write some s in input.<kind> before everything else"}
	refuseSecondSome    = refusal{`a second "some", which would pair one subject or board with another`, `one "some" in a body`, "ask for a term that holds what is needed of the other subject"}
	refuseSomeShape     = refusal{`a "some" with another name or form, which would hide what is read`, someShape, "call the subject s"}
	refuseSomeOver      = refusal{`a "some" over something else than a kind of subject`, someShape, "write some s in input.<kind>"}
	refuseNothingProven = refusal{"a rule without complies and departs, which could never judge anything", "at least one of them", ""}
	refuseOther         = refusal{"a form that is not known to be safe", positive, ""}
)

func refuseNoComparison(set string) refusal {
	return refusal{"a body of " + set + " without a comparison, which proves it of every subject", "at least one comparison", "compare a term of s with another term, a limit or a word"}
}

func refuseImport(path string) refusal {
	if path == "rego.v2" {
		return refusal{"import rego.v2, under which not holds when the fact is missing", "no import", "remove the line"}
	}
	return refusal{"the import " + place.Quote(path) + ", which lets a rule read more than its subject", "no import", "remove the line"}
}

func refuseFunction(name string) refusal {
	return refusal{"the function " + place.Quote(name) + ", whose operands no check can follow", verdicts, "write the comparison into the bodies, or " + askTerm}
}

func refuseHelper(name string) refusal {
	hint := "write the comparison into the bodies, or " + askTerm
	if near, ok := place.Nearest(name, sets); ok {
		hint = "write " + near
	}
	return refusal{"the rule " + place.Quote(name) + ", which is no verdict", verdicts, hint}
}

func refuseHead(name string) refusal {
	return refusal{place.Quote(name) + " as something else than a set of subjects", name + " contains " + keyOf(name) + " if { … }", ""}
}

func refuseKey(set string) refusal {
	return refusal{"a set " + set + " of something else", keyOf(set), "write " + set + " contains " + keyOf(set) + " if { … }"}
}

func keyOf(set string) string {
	if set == "exempt" {
		return `[s.id, "reason"]`
	}
	return "s.id"
}

func refuseSecondKind(first, second string) refusal {
	return refusal{"input." + second + " in a rule about input." + first, "one kind of subject in a rule", "write a rule of its own for " + second}
}

func refuseNumber(text string) refusal {
	return refusal{"the number " + text + ", a threshold without unit, clause or owner", "a term or a limit", "put it into limits.yaml and write input.limits.<name>"}
}

func refuseBoolean(text string) refusal {
	return refusal{text + ", which no fact ever is", `a word of the term's list`, `write == "yes" or == "no"`}
}

func refuseVariable(v ast.Var) refusal {
	name := string(v)
	switch {
	case v.IsWildcard():
		name = "_"
	case name == "s":
		return refusal{"s alone, which is the whole subject", "s.<term> or input.limits.<term>", "write the term that is meant"}
	}
	return refusal{"the name " + place.Quote(name) + ", behind which nobody sees what is compared", "s.<term> or input.limits.<term>", "write the term itself"}
}

func refuseBare(text string) refusal {
	return refusal{place.Quote(text) + " alone, which holds for any value", "a comparison", `write what it has to be, such as == "yes"`}
}

func refuseIndex(text string) refusal {
	return refusal{place.Quote(readable(text)) + ", which looks into other subjects or picks by position", "s.<term> or input.limits.<term>", "ask for a term that holds what is needed"}
}

func refuseReading(text string) refusal {
	return refusal{place.Quote(readable(text)) + ", which is more than the subject and the limits", "s.<term> or input.limits.<term>", "ask for a term that holds what is needed"}
}

// readable shows the engine's wildcard as it was written.
func readable(text string) string {
	for i := strings.Index(text, "$"); i >= 0; i = strings.Index(text, "$") {
		end := i + 1
		for end < len(text) && text[end] >= '0' && text[end] <= '9' {
			end++
		}
		text = text[:i] + "_" + text[end:]
	}
	return text
}

// arithmeticSigns are the calculations by the engine's names.
var arithmeticSigns = map[string]string{"plus": "+", "minus": "-", "mul": "*", "div": "/", "rem": "%", "and": "&", "or": "|"}

func refuseCall(name string) refusal {
	if sign, ok := arithmeticSigns[name]; ok {
		return refusal{"a calculation with " + sign + ", which the worksheet would not show", positive, askTerm}
	}
	if sign, ok := comparisonSigns[name]; ok {
		return refusal{"a comparison with " + sign + " inside another one", "one comparison per line", "write it as a line of its own"}
	}
	switch name {
	case "neq":
		return refusal{`"!=", which holds for every other word and for a slip of the pen`, positive, `name the words that are meant, with == or in {"…"}`}
	case "eq", "assign":
		return refusal{"a name for a value, behind which nobody sees what is compared", positive, "write the term itself, and == to compare words"}
	case "object.get":
		return refusal{"object.get, which makes up a value where none is given", positive, "read s.<term>; if it is missing the verdict is a query"}
	case "count", "sum", "min", "max", "product":
		return refusal{name + ", which passes over the members that lack the value", positive, askTerm}
	case "concat", "sprintf", "format_int":
		return refusal{name + ", which makes a text that no list of words can check", "a word of the term's list", "write the word itself"}
	case "internal.member_3":
		return refuseMembership
	}
	return refusal{"the call " + place.Quote(name) + ", whose result nobody can check by hand", positive, askTerm}
}

// count is "1 letter", "3 letters".
func count(n int, what string) string {
	if n == 1 {
		return "1 " + what
	}
	return strconv.Itoa(n) + " " + what + "s"
}
