package working

import (
	"boardproof/checker/units"
)

// Case is one of the circumstances over which the worst is sought: a supply state,
// a current, a device, an electrode arrangement.
type Case[U units.Unit] struct {
	Name   string
	Result Result[U]
}

// Worst bounds the largest (or smallest) value over all circumstances. The true
// value lies between AtLeast and AtMost. One of the two is known as soon as one
// case is; the other only when every case is known and no further one is possible.
type Worst[U units.Unit] struct {
	AtLeast, AtMost Result[U]
	Governing       string // name of the case that decides, of those known
	Cases           []Case[U]
}

var (
	largestOf  = Formula{ID: "worst.largest", Symbol: "max", Name: "largest of the cases", Equation: "the largest of the cases"}
	smallestOf = Formula{ID: "worst.smallest", Symbol: "min", Name: "smallest of the cases", Equation: "the smallest of the cases"}
)

// Largest bounds the largest value. open lists what keeps the set of cases from
// being complete (an open collection, a case that cannot be computed); basis are
// the lines that prove it complete and so belong under AtMost.
func Largest[U units.Unit](symbol, name string, cases []Case[U], open Lacks, closedBy ...*Working) Worst[U] {
	w := Worst[U]{Cases: cases}
	w.AtLeast, w.AtMost, w.Governing = bound(&largestOf, symbol, name, cases, open, closedBy, func(a, b U) bool { return a > b })
	return w
}

// Smallest bounds the smallest value; see [Largest].
func Smallest[U units.Unit](symbol, name string, cases []Case[U], open Lacks, closedBy ...*Working) Worst[U] {
	w := Worst[U]{Cases: cases}
	w.AtMost, w.AtLeast, w.Governing = bound(&smallestOf, symbol, name, cases, open, closedBy, func(a, b U) bool { return a < b })
	return w
}

// bound returns the extreme over the known cases, and the same as a proof that no
// case goes beyond it, which exists only when nothing is open.
func bound[U units.Unit](kind *Formula, symbol, name string, cases []Case[U], open Lacks, closedBy []*Working, beyond func(a, b U) bool) (overKnown, proven Result[U], governing string) {
	f := *kind
	f.Symbol, f.Name = symbol, name
	lacks := open
	var outside *Outside
	var best *Case[U]
	var inputs []*Working
	for i := range cases {
		c := &cases[i]
		switch {
		case !c.Result.Known() && c.Result.Beyond() != nil:
			if outside == nil {
				outside = c.Result.Beyond()
			}
		case !c.Result.Known():
			lacks = lacks.Union(c.Result.Missing())
		default:
			if best == nil || beyond(c.Result.V(), best.Result.V()) {
				best = c
			}
			how := *c.Result.How()
			how.Case = c.Name
			inputs = append(inputs, &how)
		}
	}
	if best == nil && len(lacks) == 0 && outside == nil {
		lacks = Lacks{{What: "a supply state in which this point is live"}}
	}
	if best != nil {
		governing = best.Name
		overKnown = known(best.Result.V(), &Working{Symbol: symbol, Name: name, Case: best.Name, Formula: &f, Inputs: inputs})
	} else {
		overKnown = Result[U]{lacks: lacks, outside: outsideUnless(lacks, outside)}
	}
	switch {
	case len(lacks) > 0:
		proven = Result[U]{lacks: lacks}
	case outside != nil:
		proven = Result[U]{outside: outside}
	default:
		proven = known(best.Result.V(), &Working{Symbol: symbol, Name: name, Case: best.Name, Formula: &f, Inputs: append(inputs, closedBy...)})
	}
	return overKnown, proven, governing
}

func outsideUnless(lacks Lacks, outside *Outside) *Outside {
	if len(lacks) > 0 {
		return nil
	}
	return outside
}
