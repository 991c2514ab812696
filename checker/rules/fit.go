package rules

import (
	"slices"
	"strings"

	"boardproof/checker/facts"
	"boardproof/checker/place"
)

// line resolves one comparison and checks that its sides can be compared, and that they can prove
// what they are meant to prove.
func (r *resolver) line(f lineForm, outcome Outcome) (Comparison, bool) {
	left, leftFine := r.operand(f, f.Left)
	right, rightFine := r.operand(f, f.Right)
	if !leftFine || !rightFine {
		return Comparison{}, false
	}
	c := Comparison{Operator: f.Operator, Left: left, Right: right}
	for _, check := range []func(Comparison) *refusal{nothingRead, unlike, sameTerm, wrongBound} {
		if said := check(c); said != nil {
			r.refuseLine(f, *said)
			return Comparison{}, false
		}
	}
	if said := wrongWay(c, outcome); said != nil {
		r.refuseLine(f, *said)
		return Comparison{}, false
	}
	return c, true
}

func nothingRead(c Comparison) *refusal {
	switch {
	case c.Left.Term == nil && c.Right.Term == nil:
		return &refusal{"two texts, which says nothing of the subject", "a term beside the word", "write s.<term> on one side"}
	case c.Left.Term != nil && c.Right.Term != nil && c.Left.Term.Kind == facts.Limits && c.Right.Term.Kind == facts.Limits:
		return &refusal{"two limits, which says nothing of the subject", "a term of the subject on one side", "write s.<term> on one side"}
	}
	return nil
}

func sameTerm(c Comparison) *refusal {
	if c.Left.Term != nil && c.Left.Term == c.Right.Term {
		return &refusal{c.Left.Text() + " beside itself, which holds whatever it is", "two different terms", ""}
	}
	return nil
}

// class is what can be compared with its like.
type class int

const (
	isLiteral class = iota
	isNumber
	isRank
	isWord
)

func (o Operand) class() class {
	switch {
	case o.Term == nil:
		return isLiteral
	case o.Rank:
		return isRank
	case o.Term.Value == facts.Number:
		return isNumber
	}
	return isWord
}

// unlike refuses sides that cannot be compared: another unit, another list, a text beside a number.
func unlike(c Comparison) *refusal {
	l, r := c.Left.class(), c.Right.class()
	if l == isLiteral || r == isLiteral {
		return unlikeLiteral(c)
	}
	names := c.Left.Text() + " and " + c.Right.Text()
	ordering := c.Operator != "=="
	switch {
	case l != r:
		return &refusal{names + ", " + classText(c.Left) + " beside " + classText(c.Right), "two terms of one quantity or one list", ""}
	case l == isNumber && !ordering:
		return &refusal{`"==" between numbers, which the last digit decides`, ">= or <=", "write >= or <="}
	case l == isNumber && c.Left.Term.Dimension != c.Right.Term.Dimension:
		return &refusal{names + ", " + measureOf(c.Left.Term) + " beside " + measureOf(c.Right.Term), "two terms of one quantity", ""}
	case l == isWord && ordering:
		return orderedWords(c)
	case l != isNumber && (c.Left.Term.ListID == "" || c.Left.Term.ListID != c.Right.Term.ListID):
		return &refusal{names + ", words of two lists", "two terms of one list of words", ""}
	}
	return nil
}

func unlikeLiteral(c Comparison) *refusal {
	term, words := c.Left, c.Right
	if term.Term == nil {
		term, words = c.Right, c.Left
	}
	switch term.class() {
	case isNumber:
		return &refusal{"a text beside " + term.Text() + ", which is " + measureOf(term.Term) + "; to the engine every text is larger than every number", "a term or a limit of the same quantity", "put the value into limits.yaml and write input.limits.<name>"}
	case isRank:
		return &refusal{"a text beside a rank", "a rank of the same list", "write " + strings.TrimSuffix(term.Text(), ".rank") + ".word == to name a word, or compare with the rank of a limit"}
	}
	if c.Operator != "==" && c.Operator != "in" {
		return orderedWords(c)
	}
	list := words.Words
	if list == nil {
		list = []string{words.Word}
	}
	for _, w := range list {
		if !slices.Contains(term.Term.Words, w) {
			hint := ""
			if near, ok := place.Nearest(w, term.Term.Words); ok {
				hint = `write "` + near + `"`
			}
			return &refusal{"the word " + place.Quote(w) + " for " + term.Term.ID, "one of " + strings.Join(term.Term.Words, ", "), hint}
		}
	}
	return nil
}

func orderedWords(c Comparison) *refusal {
	hint := "name the words that are meant, with == or in {\"…\"}"
	for _, o := range []Operand{c.Left, c.Right} {
		if o.Term != nil && o.Term.Value == facts.Ordered {
			hint = "write " + strings.TrimSuffix(o.Text(), ".word") + ".rank"
		}
	}
	return &refusal{`"` + c.Operator + `" between words, which would go by the alphabet`, "ranks of one list", hint}
}

func classText(o Operand) string {
	switch o.class() {
	case isRank:
		return "a rank"
	case isWord:
		return "a word"
	}
	return measureOf(o.Term)
}

// measureOf is "a current", "a word" or "an ordered word".
func measureOf(t *facts.Term) string {
	switch {
	case t.Value == facts.Word:
		return "a word"
	case t.Value == facts.Ordered:
		return "an ordered word"
	case t.Dimension == nil:
		return "a bare number"
	}
	return t.Dimension.Phrase()
}

const (
	atLeast = ".at_least"
	atMost  = ".at_most"
)

// wrongBound refuses a bound that does not prove the comparison. The true value of a worst-of lies
// between its bounds. "A is at least B" is proven by the lower bound of A and the upper bound of B;
// that holds in every set, because each set claims its comparisons.
func wrongBound(c Comparison) *refusal {
	larger, smaller := c.Left, c.Right
	switch c.Operator {
	case "<", "<=":
		larger, smaller = smaller, larger
	case "==", "in":
		for _, o := range []Operand{larger, smaller} {
			if o.Term != nil && (strings.HasSuffix(o.Term.ID, atLeast) || strings.HasSuffix(o.Term.ID, atMost)) {
				return &refusal{o.Text() + " with " + c.Operator + ", which a bound cannot prove", ">= or <=", ""}
			}
		}
		return nil
	}
	if stem, ok := strings.CutSuffix(larger.Term.ID, atMost); ok {
		return &refusal{larger.Text() + " on the larger side; the true value may be smaller, so it proves nothing", stem + atLeast + " there", "write " + strings.Replace(larger.Text(), atMost, atLeast, 1)}
	}
	if stem, ok := strings.CutSuffix(smaller.Term.ID, atLeast); ok {
		return &refusal{smaller.Text() + " on the smaller side; the true value may be larger, so it proves nothing", stem + atMost + " there", "write " + strings.Replace(smaller.Text(), atLeast, atMost, 1)}
	}
	return nil
}

// wrongWay refuses a limit that is met more easily the stricter it is said to be.
func wrongWay(c Comparison, outcome Outcome) *refusal {
	if outcome != Complies && outcome != Departs {
		return nil
	}
	larger, smaller := c.Left, c.Right
	switch c.Operator {
	case "<", "<=":
		larger, smaller = smaller, larger
	case "==", "in":
		return nil
	}
	if outcome == Departs {
		larger, smaller = smaller, larger
	}
	// For complies the stricter limit has to be the larger one on the smaller side, and the other
	// way round; a departure is the same with the sides exchanged.
	for _, l := range []struct {
		o     Operand
		wrong facts.Direction
		way   string
	}{{smaller, facts.Lower, "lower"}, {larger, facts.Higher, "higher"}} {
		if l.o.Term.Kind == facts.Limits && l.o.Term.Stricter == l.wrong {
			return &refusal{l.o.Text() + ", which limits.yaml calls stricter when " + l.way + ", on the side where that is met more easily", "the other side, or the other direction in limits.yaml", ""}
		}
	}
	return nil
}
