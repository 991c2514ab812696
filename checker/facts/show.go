package facts

import "boardproof/checker/units"

// Shown is a number in the quantity in which people speak of it: a Joule integral as
// the current that would bring it in the bars' own rated time.
type Shown struct {
	Number    float64
	Dimension *units.Dimension
	Suffix    string // " for 1 s"
}

// Show is the fact's number as people speak of it, in the light of the subject's
// other facts; the plain number if its term knows no other way.
func (f *Fact) Show(s *Subject) Shown {
	if f.Term.As != nil {
		if shown, ok := f.Term.As(s, f.Number); ok {
			return shown
		}
	}
	return Shown{Number: f.Number, Dimension: f.Term.Dimension}
}
