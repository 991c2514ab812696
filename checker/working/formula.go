package working

import (
	"fmt"
	"strings"

	"boardproof/checker/units"
)

// Source says where a value, a table or an equation was published.
type Source struct {
	Standard string // "IEC 60909-0"
	Edition  string // "2016"; empty if the editions agree
	Clause   string // "6.3.3", "Table 1", "eq. (33)"
	Status   string // how well it was confirmed: "confirmed in a published copy", "from memory, unconfirmed", "common practice, no source"
}

// String joins what is known: "IEC 60909-0:2016 6.3.3 (from memory, unconfirmed)".
func (s Source) String() string {
	text := s.Standard
	if s.Edition != "" {
		text += ":" + s.Edition
	}
	if s.Clause != "" {
		text += " " + s.Clause
	}
	text = strings.TrimSpace(text)
	switch {
	case s.Status == "":
		return text
	case text == "":
		return s.Status
	}
	return text + " (" + s.Status + ")"
}

// Interval is the range of one input in which a formula is valid, both ends
// included, in SI units.
type Interval struct {
	Symbol    string
	Low, High float64
	Dimension *units.Dimension
}

// Contains reports whether v lies in the interval; NaN never does.
func (i Interval) Contains(v float64) bool { return v >= i.Low && v <= i.High }

// String is "0 ≤ R/X ≤ 10".
func (i Interval) String() string {
	return fmt.Sprintf("%s ≤ %s ≤ %s", i.Dimension.Format(i.Low), i.Symbol, i.Dimension.Format(i.High))
}

// Formula is one equation of a published method. It is declared once, beside the
// function that computes it, and appears on every worksheet that used it.
type Formula struct {
	ID       string // "fault.peak_factor", unique
	Symbol   string // of the result: "κ"
	Name     string // of the result: "peak factor"
	Equation string // right-hand side, each operand in braces: "1.02 + 0.98·exp(−3·{R/X})"
	Source   Source
	Range    []Interval // where it is valid; the function refuses outside it
	Note     string     // a choice made, in one sentence
	Model    bool       // stands for something that a standard wants tested: may condemn, not acquit
}

// Plain is the equation as printed in a book: "κ = 1.02 + 0.98·exp(−3·R/X)".
func (f *Formula) Plain() string {
	return f.Symbol + " = " + strings.NewReplacer("{", "", "}", "").Replace(f.Equation)
}

// With puts the numbers of the inputs in the place of their symbols.
func (f *Formula) With(inputs []*Working) string {
	pairs := make([]string, 0, 2*len(inputs)+4)
	for _, in := range inputs {
		pairs = append(pairs, "{"+in.Symbol+"}", in.Text())
	}
	pairs = append(pairs, "{", "", "}", "")
	return strings.NewReplacer(pairs...).Replace(f.Equation)
}

// RangeError says that an argument of a formula lies outside the range in which
// the formula is valid. Functions of the engineering packages return it.
type RangeError struct {
	Symbol string // of the argument
	Found  string // its value with unit
	Limit  string // the range: "0 ≤ R/X ≤ 10"
}

// Error names argument, value and limit.
func (e *RangeError) Error() string {
	return fmt.Sprintf("%s is %s, the formula holds for %s", e.Symbol, e.Found, e.Limit)
}

// CheckRange returns a *RangeError for the first value outside its interval. The
// values are given in the order of f.Range.
func (f *Formula) CheckRange(values ...float64) error {
	for i, interval := range f.Range {
		if i < len(values) && !interval.Contains(values[i]) {
			return &RangeError{Symbol: interval.Symbol, Found: interval.Dimension.Format(values[i]), Limit: interval.String()}
		}
	}
	return nil
}
