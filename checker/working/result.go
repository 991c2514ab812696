package working

import (
	"errors"
	"fmt"
	"math"

	"boardproof/checker/place"
	"boardproof/checker/units"
)

// Basis is what a statement about the assembly rests on, weakest first.
type Basis int

// The order is the order of strength; the weakest input decides.
const (
	NoBasis    Basis = iota // nothing was claimed
	Declared                // somebody wrote it down
	Calculated              // computed from declared values by a published method
	Inspected               // seen on drawing or at the works
	Compared                // compared with a tested design
	Tested                  // shown by a test of this circuit
)

// String is the word used in reports.
func (b Basis) String() string {
	return [...]string{"no statement", "declared", "calculated", "inspected", "compared with a tested design", "tested"}[b]
}

// Leaf is where a value was written, and by whom.
type Leaf struct {
	Path  string // "busbars.main A.rated_current"
	Title string // "rated current"
	Place place.Place
	Via   []place.Place // the like: and basis: steps it came by
	From  string        // document
	Claim bool          // the tenderer's statement about the assembly, as opposed to a condition given by owner, site or network
	Basis Basis         // of a claim: declared, or better if evidence covers it
}

// Working is one line of a worksheet: a value, how it came about, and the lines it
// rests on. A line with a Leaf was read, one with a Formula was computed, one with
// an Assumption was neither said nor computed.
type Working struct {
	Symbol     string
	Name       string
	Number     float64 // SI, 12 significant digits
	Dimension  *units.Dimension
	Word       string // instead of a number
	Case       string // supply state or arrangement it belongs to
	Formula    *Formula
	Inputs     []*Working
	Leaf       *Leaf
	Assumption string // why this value was taken although nobody stated it
	Source     Source // of an assumption or a constant
}

// Text is the value as people write it.
func (w *Working) Text() string {
	if w.Dimension == nil {
		return w.Word
	}
	return w.Dimension.Format(w.Number)
}

// Walk calls visit for w and everything below it, each line once, w first.
func (w *Working) Walk(visit func(*Working)) {
	if w == nil {
		return
	}
	seen := map[*Working]bool{}
	var walk func(*Working)
	walk = func(w *Working) {
		if w == nil || seen[w] {
			return
		}
		seen[w] = true
		visit(w)
		for _, in := range w.Inputs {
			walk(in)
		}
	}
	walk(w)
}

// Basis is the weakest basis of all claims that w rests on; NoBasis if it rests on
// none (a number made of the owner's and the network's data only). A formula that is a
// model of something a standard wants tested makes it calculated at best.
func (w *Working) Basis() Basis {
	weakest := NoBasis
	modelled := false
	w.Walk(func(in *Working) {
		if in.Formula != nil && in.Formula.Model {
			modelled = true
		}
		if in.Leaf != nil && in.Leaf.Claim && (weakest == NoBasis || in.Leaf.Basis < weakest) {
			weakest = in.Leaf.Basis
		}
	})
	if modelled && weakest > Calculated {
		return Calculated
	}
	return weakest
}

// Operand is a result of any unit.
type Operand interface {
	Known() bool
	Missing() Lacks
	Beyond() *Outside
	How() *Working
}

// Result is a value with its working, or what it lacks, or where it is outside the
// range of its formula. The zero Result lacks something unnamed.
type Result[U units.Unit] struct {
	known   bool
	value   U
	lacks   Lacks
	outside *Outside
	how     *Working
}

// Outside says which formula could not be used, and why.
type Outside struct {
	Formula *Formula
	Reason  string // sentence with the limit
	Inputs  []*Working
}

// Known reports whether there is a value.
func (r Result[U]) Known() bool { return r.known }

// Value returns the value and whether there is one.
func (r Result[U]) Value() (U, bool) { return r.value, r.known }

// V is the value; zero when there is none. It is meant for the function handed to
// [Compute], which is called only when all operands are known.
func (r Result[U]) V() U { return r.value }

// Missing lists what is needed and was not said.
func (r Result[U]) Missing() Lacks {
	if !r.known && r.outside == nil && len(r.lacks) == 0 {
		return Lacks{{What: "a value that nobody named"}}
	}
	return r.lacks
}

// Beyond is set when a formula is not valid for its inputs.
func (r Result[U]) Beyond() *Outside { return r.outside }

// How is the worksheet line; nil when there is no value.
func (r Result[U]) How() *Working { return r.how }

// As is the same result under another symbol, as an operand of an equation that
// writes it differently.
func (r Result[U]) As(symbol string) Result[U] {
	if r.how != nil {
		how := *r.how
		how.Symbol = symbol
		r.how = &how
	}
	return r
}

// In is the same result marked with the supply state it belongs to.
func (r Result[U]) In(state string) Result[U] {
	if r.how != nil {
		how := *r.how
		how.Case = state
		r.how = &how
	}
	return r
}

func known[U units.Unit](value U, how *Working) Result[U] {
	if math.IsNaN(float64(value)) || math.IsInf(float64(value), 0) {
		return Result[U]{outside: &Outside{Formula: how.Formula, Reason: fmt.Sprintf("%s is not a finite number for these inputs", how.Symbol), Inputs: how.Inputs}}
	}
	how.Number = units.Round12(float64(value))
	how.Dimension = value.Dimension()
	return Result[U]{known: true, value: U(how.Number), how: how}
}

// Stated is a value read from a file.
func Stated[U units.Unit](value U, symbol, name string, leaf *Leaf) Result[U] {
	return known(value, &Working{Symbol: symbol, Name: name, Leaf: leaf})
}

// Assumed is a value that nobody stated, taken for a reason that the report repeats.
func Assumed[U units.Unit](value U, symbol, name, why string, source Source) Result[U] {
	return known(value, &Working{Symbol: symbol, Name: name, Assumption: why, Source: source})
}

// Constant is a value that belongs to a method and has no choice in it.
func Constant[U units.Unit](value U, symbol, name string, source Source) Result[U] {
	return known(value, &Working{Symbol: symbol, Name: name, Source: source})
}

// Lacking is a value that is not there, with what would have to be stated.
func Lacking[U units.Unit](lacks ...Lack) Result[U] { return Result[U]{lacks: Lacks(lacks).sorted()} }

// Compute applies formula f to operands. If all are known, compute is called once;
// its value gets a worksheet line with the operands as inputs. If not, the result
// lacks the union of what they lack, or is outside if one of them is. A
// *[RangeError] from compute makes the result outside; any other error does too,
// with its text as the reason: a formula that fails has no value.
func Compute[U units.Unit](f *Formula, compute func() (U, error), operands ...Operand) Result[U] {
	var inputs []*Working
	var lacks Lacks
	var outside *Outside
	for _, op := range operands {
		switch {
		case op.Known():
			inputs = append(inputs, op.How())
		case op.Beyond() != nil:
			if outside == nil {
				outside = op.Beyond()
			}
		default:
			lacks = lacks.Union(op.Missing())
		}
	}
	if len(lacks) > 0 {
		return Result[U]{lacks: lacks}
	}
	if outside != nil {
		return Result[U]{outside: outside}
	}
	value, err := compute()
	var limit *RangeError
	switch {
	case errors.As(err, &limit):
		return Result[U]{outside: &Outside{Formula: f, Reason: limit.Error(), Inputs: inputs}}
	case err != nil:
		return Result[U]{outside: &Outside{Formula: f, Reason: err.Error(), Inputs: inputs}}
	}
	return known(value, &Working{Symbol: f.Symbol, Name: f.Name, Formula: f, Inputs: inputs})
}
