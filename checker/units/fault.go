package units

import (
	"strconv"
	"unicode/utf8"
)

// A FaultKind says why a text is no value. The strings are those of the kinds of package place.
type FaultKind string

// The kinds of faults.
const (
	Empty              FaultKind = "empty"               // there is no text
	NotANumber         FaultKind = "not a number"        // the text does not begin with a plain number
	NotFinite          FaultKind = "not finite"          // NaN or infinity in words or signs
	DecimalComma       FaultKind = "decimal comma"       // "6,5 kA"
	AmbiguousComma     FaultKind = "ambiguous comma"     // "1,600 kVA"
	ThousandsSeparator FaultKind = "thousands separator" // "1 600 kVA"
	TooManyDigits      FaultKind = "too many digits"     // more than a float64 can keep
	NoUnit             FaultKind = "no unit"             // "65" for a current
	UnknownUnit        FaultKind = "unknown unit"        // "65 KA"
	AmbiguousUnit      FaultKind = "ambiguous unit"      // "5 kA2s"
	OtherDimension     FaultKind = "wrong unit"          // "12 mm" for a current
	SeveralValues      FaultKind = "several values"      // "65 kA for 1 s"
)

// FaultKinds returns all kinds in the order of their declaration.
func FaultKinds() []FaultKind {
	return []FaultKind{Empty, NotANumber, NotFinite, DecimalComma, AmbiguousComma, ThousandsSeparator, TooManyDigits,
		NoUnit, UnknownUnit, AmbiguousUnit, OtherDimension, SeveralValues}
}

// A Fault says why a text was refused. Its parts are phrases ready for a sentence: what was found
// (text from the file already quoted and made harmless), what was expected, and what to write,
// beginning with the verb. They fit the fields of the same names of place.Problem.
type Fault struct {
	Kind FaultKind
	Got  string // `"65"`
	Want string // `a current with its unit`
	Hint string // `write "65 kA" or "65 A"`
}

// Error returns the fault as one sentence, lower case and without period.
func (f *Fault) Error() string {
	s := "found " + f.Got + ", expected " + f.Want
	if f.Hint != "" {
		s += "; " + f.Hint
	}
	return s
}

// quotedRunes is how much of a text is repeated in a message.
const quotedRunes = 60

// quote puts text between quotes for a message of one line: what cannot be printed is escaped,
// what is long is cut.
func quote(text string) string {
	n := 0
	for i := range text {
		if n == quotedRunes {
			text = text[:i] + "…"
			break
		}
		n++
	}
	if !utf8.ValidString(text) {
		return strconv.QuoteToASCII(text)
	}
	return strconv.Quote(text)
}
