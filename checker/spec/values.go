package spec

import (
	"errors"
	"fmt"
	"regexp"
	"slices"
	"strconv"
	"strings"
	"unicode/utf8"

	"boardproof/checker/place"
	"boardproof/checker/units"
)

// longestText is the number of characters of a text.
const longestText = 2000

// quantityOf reads a number with its unit, or the mapping form {value, from, confirmed}.
func quantityOf[U units.Unit](s *slot) (U, State) {
	v, state := s.quantity(s.at.Leaf.dimension)
	return U(v), state
}

func (s *slot) quantity(d *units.Dimension) (float64, State) {
	confirmed := false
	if s.n.shape == mapping {
		whole := s.n
		value, ok := slot{}, false
		for i := range whole.keys {
			k := &whole.keys[i]
			inner := slot{r: s.r, at: s.at}
			inner.enter(k.value, k.at())
			switch k.name {
			case "value":
				value, ok = inner, true
			case "from":
				if name, ok := inner.documentName(); ok {
					s.at.From = name
				}
			case "confirmed":
				if _, more := inner.given(); more {
					confirmed, _ = inner.yesNo()
				}
			default:
				s.r.problem(place.Problem{Place: k.place, Path: s.at.Path + "." + k.name, Kind: place.UnknownKey, Got: "the key " + place.Quote(k.name),
					Want: "value, from or confirmed", Hint: nearestHint(k.name, []string{"value", "from", "confirmed"})})
			}
		}
		if !ok {
			s.problem(place.MissingKey, "a mapping without value", d.Phrase(), s.at.Leaf.writing())
			return 0, NotSaid
		}
		from := s.at.From
		*s = value
		s.at.From = from
		if _, more := s.given(); !more {
			return 0, NotSaid
		}
	}
	if s.n.shape != scalar {
		s.wrongShape()
		return 0, NotSaid
	}
	return s.measured(d, confirmed)
}

// measured reads a number with its unit and holds it against the ranges of the vocabulary.
func (s *slot) measured(d *units.Dimension, confirmed bool) (float64, State) {
	l := s.at.Leaf
	v, err := d.Parse(s.n.text)
	switch {
	case err != nil:
		s.unitFault(err, d, l.Example)
		return 0, NotSaid
	case !l.Possible.holds(v):
		s.problem(place.Impossible, place.Quote(s.n.text), "a value within what is possible here, "+l.Possible.Text, "is the unit right?")
		return 0, NotSaid
	case !l.Usual.holds(v) && !confirmed:
		if s.r.once(s.at.Place, "doubt", s.n.text) {
			s.r.doubts = append(s.r.doubts, Doubt{s.at, s.n.text, l.Usual.Text})
		}
		return v, Doubted
	}
	return v, Stated
}

// unitFault turns the fault of a quantity into a problem with the example of the leaf.
func (s *slot) unitFault(err error, d *units.Dimension, example string) {
	f := &units.Fault{}
	if !errors.As(err, &f) {
		s.problem(place.NotANumber, place.Quote(s.n.text), d.Phrase(), "write "+place.Quote(example))
		return
	}
	hint := f.Hint
	// Some examples are lists or tables; those of the dimension fit a single value.
	if plain := "write for example " + place.Quote(d.Example()); hint == plain && !strings.ContainsAny(example, "[{") {
		hint = "write for example " + place.Quote(example)
	}
	if none, ok := s.noneHint(); ok {
		hint = none
	}
	s.problem(place.Kind(f.Kind), f.Got, f.Want, hint)
}

// scalar returns the text of the slot, or reports that it is none.
func (s *slot) scalar() (string, bool) {
	if s.n.shape != scalar {
		s.wrongShape()
		return "", false
	}
	return s.n.text, true
}

// wordOf reads a word of a list.
func wordOf[W Word](s *slot) (W, State) {
	text, ok := s.scalar()
	if !ok {
		return 0, NotSaid
	}
	l := s.at.Leaf.Words
	if number := l.Number(text); number > 0 {
		return W(number), Stated
	}
	known := slices.Clone(l.Words)
	if s.at.Leaf.None {
		known = append(known, "none")
	}
	hint, ok := s.noneHint()
	if !ok {
		hint = nearestHint(text, known)
	}
	s.problem(place.UnknownWord, place.Quote(text), oneOf(known, 12), hint)
	return 0, NotSaid
}

// textOf reads one line of text.
func textOf(s *slot) (string, State) {
	text, ok := s.scalar()
	if !ok {
		return "", NotSaid
	}
	text = strings.TrimSpace(text)
	switch {
	case strings.ContainsAny(text, "\n\r"):
		s.problem(place.WrongShape, "several lines of text", "one line", "write the text on one line, between quotes")
	case utf8.RuneCountInString(text) > longestText:
		s.problem(place.TooLarge, fmt.Sprintf("a text of more than %d characters", longestText), "a short text", "put the text into a document and name it with from:")
	default:
		return text, Stated
	}
	return "", NotSaid
}

// dateOf reads a day, or a month where that is enough.
func dateOf(s *slot) (Date, State) {
	text, ok := s.scalar()
	if !ok {
		return Date{}, NotSaid
	}
	d, written, real := parseDate(text, s.at.Leaf.Kind == KindMonth)
	want := "a date as year-month-day"
	if s.at.Leaf.Kind == KindMonth {
		want = "a month as year-month, or a date"
	}
	switch {
	case !written:
		s.problem(place.WrongShape, place.Quote(text), want, s.at.Leaf.writing())
	case !real:
		s.problem(place.Impossible, place.Quote(text), "a date of the calendar from 1900 to 2199", "check year, month and day")
	default:
		return d, Stated
	}
	return Date{}, NotSaid
}

var wholeNumber = regexp.MustCompile(`^(0|[1-9][0-9]*)$`)

// countOf reads a whole number.
func countOf(s *slot) (int, State) {
	text, ok := s.scalar()
	if !ok {
		return 0, NotSaid
	}
	l := s.at.Leaf
	want := fmt.Sprintf("a whole number from %d to %d", l.Least, l.Most)
	if !wholeNumber.MatchString(text) {
		s.problem(place.NotANumber, place.Quote(text), want, l.writing())
		return 0, NotSaid
	}
	n, err := strconv.Atoi(text)
	if err != nil || n < l.Least || n > l.Most {
		s.problem(place.Impossible, place.Quote(text), want, "")
		return 0, NotSaid
	}
	return n, Stated
}

// yesNoOf reads yes or no.
func yesNoOf(s *slot) (bool, State) {
	if yes, ok := s.yesNo(); ok {
		return yes, Stated
	}
	return false, NotSaid
}

var yesAndNo = map[string]bool{
	"yes": true, "Yes": true, "YES": true, "true": true, "True": true, "TRUE": true,
	"no": false, "No": false, "NO": false, "false": false, "False": false, "FALSE": false,
}

func (s *slot) yesNo() (yes, ok bool) {
	if s.n.shape == scalar {
		if yes, ok := yesAndNo[s.n.text]; ok {
			return yes, true
		}
	}
	hint := "write yes or no"
	switch strings.ToLower(s.n.text) {
	case "on", "y", "1", "x":
		hint = "write yes"
	case "off", "n", "0":
		hint = "write no"
	}
	s.problem(place.UnknownWord, s.n.describe(), "yes or no", hint)
	return false, false
}

// nameOf reads a name that refers to an entry of a collection.
func nameOf(s *slot) (Name, State) {
	if _, ok := s.scalar(); !ok {
		return Name{}, NotSaid
	}
	collection, ok := s.findName(s.at.Leaf.Collections)
	if !ok {
		return Name{}, NotSaid
	}
	return Name{Text: s.n.text, In: collection}, Stated
}

// findName looks for the name in the collections, the first one first. Where a collection could not
// be read nothing is known of the name, and nothing is reported.
func (s *slot) findName(collections []string) (string, bool) {
	var known []string
	all := !s.r.incomplete
	for _, c := range collections {
		names, readable := s.r.names[c]
		if names[s.n.text] {
			return c, true
		}
		all = all && readable
		for name := range names {
			known = append(known, name)
		}
	}
	if !all {
		return "", false
	}
	where := strings.Join(collections, " or ")
	slices.Sort(known)
	hint := nearestHint(s.n.text, known)
	switch {
	case hint != "":
	case len(known) == 0:
		hint = "nothing is declared under " + where
	default:
		hint = "declared are " + strings.Join(quoteAll(known, 8), ", ")
	}
	s.problem(place.UnknownName, place.Quote(s.n.text), "a name declared under "+where, hint)
	return "", false
}

// ipCodeOf reads a degree of protection.
func ipCodeOf(s *slot) (IPCode, State) {
	text, ok := s.scalar()
	if !ok {
		return IPCode{}, NotSaid
	}
	code, ok := parseIPCode(text)
	if !ok {
		s.problem(place.UnknownWord, place.Quote(text), "an IP code such as IP42, IP2X or IPXXB", s.at.Leaf.writing())
		return IPCode{}, NotSaid
	}
	return code, Stated
}
