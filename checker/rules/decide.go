package rules

import (
	"math"
	"slices"

	"boardproof/checker/facts"
)

// truth is whether a comparison or a body holds; missing if a fact it reads is not known and
// nothing else settles it.
type truth int

const (
	missing truth = iota
	fails
	holds
)

// known gives the facts of one subject and the limits by slot; nil where there is none.
type known struct{ subject, limits []*facts.Fact }

func (k known) of(o Operand) *facts.Fact {
	list := k.subject
	if o.Term.Kind == facts.Limits {
		list = k.limits
	}
	if o.slot >= len(list) || list[o.slot] == nil || !list[o.slot].Known {
		return nil
	}
	return list[o.slot]
}

// weigh evaluates one comparison without the engine.
func (c *Comparison) weigh(k known) truth {
	left, leftThere := k.value(c.Left)
	right, rightThere := k.value(c.Right)
	if !leftThere || !rightThere {
		return missing
	}
	if left.isWord != right.isWord {
		return fails
	}
	ok := false
	switch c.Operator {
	case ">=":
		ok = !left.isWord && left.number >= right.number
	case ">":
		ok = !left.isWord && left.number > right.number
	case "<=":
		ok = !left.isWord && left.number <= right.number
	case "<":
		ok = !left.isWord && left.number < right.number
	case "==":
		ok = left.number == right.number && left.word == right.word
	case "in":
		ok = left.isWord && slices.Contains(c.Right.Words, left.word)
	}
	if ok {
		return holds
	}
	return fails
}

// comparand is a number, a rank or a word.
type comparand struct {
	number float64
	word   string
	isWord bool
}

func (k known) value(o Operand) (comparand, bool) {
	if o.Term == nil {
		return comparand{word: o.Word, isWord: true}, true
	}
	f := k.of(o)
	switch {
	case f == nil:
		return comparand{}, false
	case o.Rank:
		return comparand{number: float64(f.Rank)}, true
	case o.Term.Value == facts.Number:
		return comparand{number: f.Number}, !math.IsNaN(f.Number) && !math.IsInf(f.Number, 0)
	}
	return comparand{word: f.Word, isWord: true}, true
}

// weigh says whether all comparisons of the body hold. One that fails settles it, whatever else is
// missing.
func (b *body) weigh(k known) truth {
	result := holds
	for i := range b.comparisons {
		switch b.comparisons[i].weigh(k) {
		case fails:
			return fails
		case missing:
			result = missing
		}
	}
	return result
}

// decision is what plain comparisons say of one subject: whether each body holds.
type decision struct{ truths []truth }

// decide weighs all bodies; truths is room for the result.
func (r *Rule) decide(k known, truths []truth) decision {
	truths = truths[:0]
	for i := range r.bodies {
		truths = append(truths, r.bodies[i].weigh(k))
	}
	return decision{truths}
}

// open collects what a Clarify verdict is about: see Verdict.Decisive.
func (r *Rule) open(d decision, k known) []Comparison {
	var list []Comparison
	for _, o := range []Outcome{Complies, Departs, Exempt} {
		for i := range r.bodies {
			if r.bodies[i].outcome != o || d.truths[i] != missing {
				continue
			}
			if list == nil {
				list = r.bodies[i].comparisons // shared until a second body joins
				continue
			}
			list = append(slices.Clip(list), r.bodies[i].comparisons...)
		}
	}
	if list != nil {
		return list
	}
	for i := range r.bodies {
		for j := range r.bodies[i].comparisons {
			if c := &r.bodies[i].comparisons[j]; r.bodies[i].outcome == Complies && c.weigh(k) == fails {
				list = append(list, *c)
			}
		}
	}
	return list
}
