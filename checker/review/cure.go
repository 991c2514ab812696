package review

import (
	"context"
	"fmt"
	"slices"
	"strings"

	"boardproof/checker/facts"
	"boardproof/checker/rules"
	"boardproof/checker/spec"
)

// Cure is a change of values that would clear a departure: each value in the next step
// the trade offers, the whole board judged again with it.
type Cure struct {
	Changes []Change
	Clears  []string // every departure that goes: "WTH-02 main A"
	Asks    []string // requirements that would then have to be clarified and were not before
	Short   string   // "peak withstand current 143 kA"
	Long    string   // with what it clears
}

// Change is one leaf of the file, or the same leaf of several subjects.
type Change struct {
	Paths    []string
	Label    string
	From, To string
}

// depth is how many values a cure may change: one, and one that this one calls for.
const depth = 2

// findCures looks for a cure of every departure, with the functions that found it.
func (r *Review) findCures(ctx context.Context) {
	for _, d := range r.Departures {
		if len(d.Rule.Cure) == 0 {
			d.NoCure = "this rule knows no single value that would clear it; the design has to change"
			continue
		}
		for _, lever := range d.Rule.Cure {
			start := attempt{board: r.Board, facts: r.Facts}
			if cure, ok := r.pull(ctx, d, lever, start, depth); ok {
				d.Cures = append(d.Cures, cure)
			}
		}
		if len(d.Cures) == 0 {
			d.NoCure = "no step of " + levers(d.Rule) + " clears it without a new departure"
		}
	}
}

func levers(rule *rules.Rule) string {
	names := make([]string, len(rule.Cure))
	for i, lever := range rule.Cure {
		names[i] = lever.Term.Label
	}
	return strings.Join(names, " or ")
}

// attempt is a board on the way to a cure.
type attempt struct {
	board   *spec.Board
	facts   *facts.Board
	changes []Change
}

// pull tries the steps of one lever in turn, smallest change first. The steps are
// scanned, not bisected: a larger step may be worse than a smaller one.
func (r *Review) pull(ctx context.Context, d *Departure, lever rules.CureLever, from attempt, left int) (Cure, bool) {
	for _, to := range steps(from.facts, d, lever) {
		next, ok := set(from, d, lever, to)
		if !ok {
			return Cure{}, false
		}
		verdicts, err := r.Pack.Judge(ctx, next.facts)
		if err != nil {
			return Cure{}, false
		}
		after := findings(next.board, r.Pack.Limits(), verdicts[0])
		if !cleared(d, after) {
			if asksLess(d, after) {
				if cure, ok := r.with(ctx, d, lever, next, left-1); ok {
					return cure, true
				}
			}
			continue
		}
		created := newDepartures(r.Findings, after)
		if len(created) == 0 {
			return r.cure(next, after), true
		}
		if left > 1 {
			if cure, ok := r.mend(ctx, created, next, left-1); ok {
				return cure, true
			}
		}
	}
	return Cure{}, false
}

// asksLess reports whether a change that does not clear a departure lowers what is
// required.
func asksLess(d *Departure, after []*Finding) bool {
	before, ok := d.Decisive()
	for _, f := range after {
		if f.Rule != d.Rule || f.Subject.Kind != d.Subject.Kind || f.Subject.ID != d.Subject.ID {
			continue
		}
		now, found := f.Decisive()
		return ok && found && before.Required.Fact != nil && now.Required.Fact != nil && now.Required.Fact.Number < before.Required.Fact.Number
	}
	return false
}

// with adds a second lever of the same rule to a word that was changed: a better
// interlock lowers what is required, and a smaller rating is then enough.
func (r *Review) with(ctx context.Context, d *Departure, first rules.CureLever, from attempt, left int) (Cure, bool) {
	if left == 0 || first.Term.Value == facts.Number {
		return Cure{}, false
	}
	for _, lever := range d.Rule.Cure {
		if lever.Term == first.Term {
			continue
		}
		if cure, ok := r.pull(ctx, d, lever, from, left); ok {
			return cure, true
		}
	}
	return Cure{}, false
}

// mend cures the departures that a change has created, if one further lever does.
func (r *Review) mend(ctx context.Context, created []*Finding, from attempt, left int) (Cure, bool) {
	for _, d := range departures(created) {
		for _, lever := range d.Rule.Cure {
			if cure, ok := r.pull(ctx, d, lever, from, left); ok {
				return cure, true
			}
		}
	}
	return Cure{}, false
}

// steps lists the values to try, beyond the present one in the lever's direction.
func steps(board *facts.Board, d *Departure, lever rules.CureLever) []string {
	if lever.Series == nil {
		return nil
	}
	present := factOf(board, d.Finding, lever.Term.ID)
	if present == nil || !present.Known {
		return nil
	}
	var list []string
	for _, n := range lever.Series.Numbers {
		if lever.Direction == rules.Raise && n > present.Number || lever.Direction == rules.Lower && n < present.Number {
			list = append(list, lever.Term.Dimension.Format(n))
		}
	}
	for rank, word := range lever.Series.Words {
		if lever.Direction == rules.Raise && rank > present.Rank || lever.Direction == rules.Lower && rank < present.Rank {
			list = append(list, word)
		}
	}
	if lever.Direction == rules.Lower {
		slices.Reverse(list)
	}
	return list
}

func factOf(board *facts.Board, f *Finding, term string) *facts.Fact {
	for _, s := range board.Subjects {
		if s.Kind == f.Subject.Kind && s.ID == f.Subject.ID {
			return s.Fact(term)
		}
	}
	return nil
}

// set writes a value into the leaf behind a term, for every subject of the departure.
func set(from attempt, d *Departure, lever rules.CureLever, to string) (attempt, bool) {
	change := Change{Label: lever.Term.Label, To: to}
	board := from.board
	for _, id := range d.Subjects() {
		here := *d.Finding
		here.Subject = &facts.Subject{Kind: d.Subject.Kind, ID: id}
		fact := factOf(from.facts, &here, lever.Term.ID)
		if fact == nil || fact.How == nil || fact.How.Leaf == nil {
			return attempt{}, false
		}
		change.From = fact.Text()
		if !slices.Contains(change.Paths, fact.How.Leaf.Path) {
			change.Paths = append(change.Paths, fact.How.Leaf.Path)
		}
		changed, problems := board.With(fact.How.Leaf.Path, to)
		if problems.Len() > 0 {
			return attempt{}, false
		}
		board = changed
	}
	return attempt{board, facts.Of(board), append(slices.Clone(from.changes), change)}, true
}

func cleared(d *Departure, after []*Finding) bool {
	return !slices.ContainsFunc(after, func(f *Finding) bool {
		return f.Outcome == rules.Departs && f.Rule == d.Rule && f.Subject.Kind == d.Subject.Kind && slices.Contains(d.Subjects(), f.Subject.ID)
	})
}

// newDepartures are those that were not there before.
func newDepartures(before, after []*Finding) []*Finding {
	var list []*Finding
	for _, f := range after {
		if f.Outcome == rules.Departs && outcomeBefore(before, f) != rules.Departs {
			list = append(list, f)
		}
	}
	return list
}

func outcomeBefore(before []*Finding, f *Finding) rules.Outcome {
	for _, b := range before {
		if b.Rule == f.Rule && b.Subject.Kind == f.Subject.Kind && b.Subject.ID == f.Subject.ID {
			return b.Outcome
		}
	}
	return rules.Clarify
}

// cure says what a successful attempt changes and what becomes of it.
func (r *Review) cure(done attempt, after []*Finding) Cure {
	c := Cure{Changes: done.changes}
	for _, f := range after {
		before := outcomeBefore(r.Findings, f)
		name := f.Rule.ID + " " + f.Subject.ID
		switch {
		case before == rules.Departs && f.Outcome != rules.Departs:
			c.Clears = append(c.Clears, name)
			if f.Outcome == rules.Clarify {
				c.Asks = append(c.Asks, name)
			}
		case before != rules.Clarify && f.Outcome == rules.Clarify:
			c.Asks = append(c.Asks, name)
		}
	}
	var short, long []string
	for _, change := range c.Changes {
		short = append(short, change.Label+": "+change.To)
		long = append(long, fmt.Sprintf("%s: %s instead of %s (%s)", change.Label, change.To, change.From, strings.Join(change.Paths, ", ")))
	}
	c.Short = strings.Join(short, " and ")
	c.Long = strings.Join(long, ", and ") + "; clears " + strings.Join(c.Clears, ", ")
	if len(c.Asks) > 0 {
		c.Long += "; then to be clarified: " + strings.Join(c.Asks, ", ")
	}
	return c
}
