package review

import (
	"math"
	"slices"
	"strings"

	"boardproof/checker/facts"
	"boardproof/checker/place"
	"boardproof/checker/rules"
	"boardproof/checker/units"
)

// Compared is one comparison of a rule with its numbers put in: what was found, what
// is required, and by how much they differ.
type Compared struct {
	Found, Required Side
	AtLeast         bool // the found value has to be at least the required one; otherwise at most
	Equality        bool // a word has to be the required word; there is no margin
	Margin          float64
	Relative        float64 // margin over what is required, both as shown; comparable across units
	MarginText      string  // "5 kA short (4.5 %)", "12 kA to spare (11 %)"; empty if either side is unknown
}

// Side is one side of a comparison.
type Side struct {
	Fact  *facts.Fact // nil for a word written in the rule
	Label string
	Text  string // as printed, rounded towards the unfavourable side; empty if unknown
	Place place.Place
}

// compare puts the facts of a subject, and the limits of the library, into a
// comparison of a rule.
func compare(subject *facts.Subject, limits []*facts.Fact, c rules.Comparison) Compared {
	found, required := c.Sides()
	operator := c.Operator
	if found.Term == c.Right.Term && found.Term != nil {
		operator = mirrored(operator)
	}
	if c.Set == rules.Departs {
		operator = negated(operator)
	}
	out := Compared{
		Found: side(subject, limits, found), Required: side(subject, limits, required),
		AtLeast:  operator == ">=" || operator == ">",
		Equality: operator == "==" || operator == "in",
	}
	out.print(subject)
	return out
}

func side(subject *facts.Subject, limits []*facts.Fact, operand rules.Operand) Side {
	if operand.Term == nil {
		text := operand.Word
		if operand.Words != nil {
			text = "one of " + strings.Join(operand.Words, ", ")
		}
		return Side{Label: "word of the rule", Text: text}
	}
	s := Side{Label: operand.Term.Label}
	if operand.Term.Kind == facts.Limits {
		if i := slices.IndexFunc(limits, func(f *facts.Fact) bool { return f.Term == operand.Term }); i >= 0 {
			s.Fact = limits[i]
		}
	} else {
		s.Fact = subject.Fact(operand.Term.ID)
	}
	if s.Fact != nil {
		s.Place = placeOf(s.Fact)
	}
	return s
}

func mirrored(op string) string {
	return map[string]string{">=": "<=", "<=": ">=", ">": "<", "<": ">", "==": "=="}[op]
}

// negated is the demand that a departure breaks: "x < y departs" means x is to be at
// least y.
func negated(op string) string {
	return map[string]string{">=": "<", "<=": ">", ">": "<=", "<": ">=", "==": "=="}[op]
}

// print writes both sides with as many digits as it takes to tell them apart, the
// found value rounded against the board and the required one upwards in its demand.
func (c *Compared) print(subject *facts.Subject) {
	f, r := c.Found.Fact, c.Required.Fact
	if f != nil && f.Known && f.Term.Value != facts.Number {
		c.Found.Text = f.Word
	}
	if r != nil && r.Known && r.Term.Value != facts.Number {
		c.Required.Text = r.Word
		if c.AtLeast && r.Term.Value == facts.Ordered {
			c.Required.Text = "at least " + r.Word
		}
	}
	var found, required facts.Shown
	if f != nil && f.Known && f.Term.Value == facts.Number {
		found = f.Show(subject)
		c.Found.Text = round(found, !c.AtLeast, 3)
	}
	if r != nil && r.Known && r.Term.Value == facts.Number {
		required = r.Show(subject)
		c.Required.Text = round(required, c.AtLeast, 3)
	}
	if found.Dimension == nil || required.Dimension == nil || found.Dimension != required.Dimension {
		return
	}
	for digits := 3; digits <= 8; digits++ {
		c.Found.Text, c.Required.Text = round(found, !c.AtLeast, digits), round(required, c.AtLeast, digits)
		if c.Found.Text != c.Required.Text || found.Number == required.Number {
			break
		}
	}
	c.Margin = found.Number - required.Number
	if !c.AtLeast {
		c.Margin = -c.Margin
	}
	if required.Number != 0 {
		c.Relative = c.Margin / math.Abs(required.Number)
	}
	size := found.Dimension.FormatDown(math.Abs(c.Margin), 3)
	if c.Margin < 0 {
		size = found.Dimension.FormatUp(-c.Margin, 3)
	}
	percent := ""
	if required.Number != 0 {
		percent = " (" + units.Format(units.Percentage(roundTo(math.Abs(c.Margin/required.Number), 3))) + ")"
	}
	switch {
	case c.Margin < 0 && c.AtLeast:
		c.MarginText = size + " short" + percent
	case c.Margin < 0:
		c.MarginText = size + " too much" + percent
	case c.Margin == 0:
		c.MarginText = "no margin"
	default:
		c.MarginText = size + " to spare" + percent
	}
}

func round(s facts.Shown, up bool, digits int) string {
	if up {
		return s.Dimension.FormatUp(s.Number, digits) + s.Suffix
	}
	return s.Dimension.FormatDown(s.Number, digits) + s.Suffix
}

// roundTo rounds to decimals for a percentage of a margin.
func roundTo(v float64, decimals int) float64 {
	scale := math.Pow10(decimals)
	return math.Round(v*scale) / scale
}
