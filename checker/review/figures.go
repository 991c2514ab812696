package review

import (
	"cmp"
	"slices"

	"boardproof/checker/facts"
	"boardproof/checker/working"
)

// Quantity is one key figure, of all subjects for which it is the same.
type Quantity struct {
	Subjects []string
	Fact     *facts.Fact // of the first
}

// Assumption is a value that nobody stated and that was used all the same, or a
// choice that the method leaves open.
type Assumption struct {
	Name   string
	Value  string
	Why    string
	Source working.Source
	Used   int // lines of the worksheet that rest on it directly
}

// keyQuantities lists the key figures in the order of terms, then of subjects.
func keyQuantities(b *facts.Board) []Quantity {
	var list []Quantity
	for _, s := range b.Subjects {
		for _, f := range s.Facts() {
			if !f.Term.Key {
				continue
			}
			i := slices.IndexFunc(list, func(q Quantity) bool { return sameFigure(q.Fact, f) })
			if i < 0 {
				list = append(list, Quantity{Fact: f})
				i = len(list) - 1
			}
			list[i].Subjects = append(list[i].Subjects, s.ID)
		}
	}
	slices.SortStableFunc(list, func(a, b Quantity) int { return cmp.Compare(a.Fact.Term.ID, b.Fact.Term.ID) })
	return list
}

func sameFigure(a, b *facts.Fact) bool {
	return a.Term == b.Term && a.Known && b.Known && a.Number == b.Number && a.How.Case == b.How.Case
}

// assumptions collects what was assumed in any figure of the board, each once.
func assumptions(b *facts.Board) []Assumption {
	seen := map[*working.Working]bool{}
	byText := map[string]*Assumption{}
	for _, s := range b.Subjects {
		for _, f := range s.Facts() {
			if f.How == nil {
				continue
			}
			f.How.Walk(func(w *working.Working) {
				if w.Assumption == "" || seen[w] {
					return
				}
				seen[w] = true
				key := w.Name + w.Text() + w.Assumption
				if byText[key] == nil {
					byText[key] = &Assumption{Name: w.Name, Value: w.Text(), Why: w.Assumption, Source: w.Source}
				}
				byText[key].Used++
			})
		}
	}
	list := make([]Assumption, 0, len(byText))
	for _, a := range byText {
		list = append(list, *a)
	}
	slices.SortFunc(list, func(a, b Assumption) int {
		return cmp.Or(cmp.Compare(a.Name, b.Name), cmp.Compare(a.Value, b.Value), cmp.Compare(a.Why, b.Why))
	})
	return list
}
