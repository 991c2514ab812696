package units

import (
	"math"
	"slices"
	"strings"
)

// A Dimension is one quantity: its name, its base unit and every writing of a unit it accepts.
// Dimensions are made by this package only and must not be changed.
type Dimension struct {
	Name string // as files and schemas name it, e.g. "joule_integral"
	Base string // the unit of the float64, e.g. "A2s"; empty for a bare number

	phrase    string          // with its article, e.g. "a joule integral"
	example   string          // a typical writing, e.g. "65 kA"
	usual     []string        // the units a hint proposes, most likely first; empty for a bare number
	shown     []measure       // the units Format prints, smallest first
	spellings map[string]size // every accepted writing of a unit
	ambiguous []string        // writings with two meanings in the trade, refused
}

// A measure is a unit that Format may choose.
type measure struct {
	symbol string
	size   size
	from   float64 // smallest magnitude, in the base unit, that is printed with it
}

// A size is one unit in base units: times · 10^exponent. Times is 1 for all decimal units, so that
// "12 mm" becomes the float64 nearest to 0.012 without a multiplication.
type size struct {
	times    float64
	exponent int
}

func (s size) inBase() float64 { return s.times * math.Pow10(s.exponent) }

// An entry is one line of the table of units.
type entry struct {
	measure
	printed   bool
	spellings []string
}

// shown makes an entry that Format chooses from the given magnitude (in the base unit) upward.
func shown(symbol string, exponent int, from float64, spellings ...string) entry {
	return entry{measure{symbol, size{1, exponent}, from}, true, append(spellings, symbol)}
}

// read makes an entry that is understood but never printed.
func read(symbol string, exponent int, spellings ...string) entry {
	return entry{measure{symbol: symbol, size: size{1, exponent}}, false, append(spellings, symbol)}
}

// times replaces the decimal size of an entry by factor · 10^exponent.
func (e entry) times(factor float64) entry {
	e.size.times = factor
	return e
}

// dimension puts the entries, smallest printed unit first, into d.
func dimension(d Dimension, entries ...entry) *Dimension {
	d.spellings = make(map[string]size)
	for _, e := range entries {
		if e.printed {
			d.shown = append(d.shown, e.measure)
		}
		for _, s := range e.spellings {
			for _, variant := range variants(s) {
				d.spellings[variant] = e.size
			}
		}
	}
	var doubtful []string
	for _, s := range d.ambiguous {
		doubtful = append(doubtful, variants(s)...)
	}
	d.ambiguous = doubtful
	return &d
}

// variants returns the ways a keyboard or a drawing program writes one unit.
func variants(symbol string) []string {
	all := []string{symbol}
	for _, sign := range []struct {
		good  string
		other []string
	}{
		{"²", []string{"2"}},
		{"µ", []string{"μ", "u"}},
		{"Ω", []string{"\u2126", "ohm", "Ohm"}},
	} {
		for _, s := range slices.Clone(all) {
			if !strings.Contains(s, sign.good) {
				continue
			}
			for _, o := range sign.other {
				all = append(all, strings.ReplaceAll(s, sign.good, o))
			}
		}
	}
	return all
}

// Dimensions returns all quantities in the order of the table.
func Dimensions() []*Dimension { return slices.Clone(dimensions) }

// DimensionNamed returns the quantity with that exact name, e.g. "apparent_power".
func DimensionNamed(name string) (*Dimension, bool) {
	for _, d := range dimensions {
		if d.Name == name {
			return d, true
		}
	}
	return nil, false
}

// Example returns a typical value as a file writes it, e.g. "65 kA".
func (d *Dimension) Example() string { return d.example }

// Phrase returns the quantity with its article for a sentence, e.g. "a joule integral".
func (d *Dimension) Phrase() string { return d.phrase }

// Spellings returns every accepted writing of a unit, sorted; empty for a bare number.
func (d *Dimension) Spellings() []string {
	all := make([]string, 0, len(d.spellings))
	for s := range d.spellings {
		if s != "" {
			all = append(all, s)
		}
	}
	slices.Sort(all)
	return all
}

// wanted returns the quantity with its usual units, smallest first: "a current in A or kA".
func (d *Dimension) wanted() string {
	if len(d.usual) == 0 {
		return d.phrase + " without unit"
	}
	names := slices.Clone(d.usual)
	slices.SortFunc(names, func(a, b string) int {
		if d.spellings[a].inBase() < d.spellings[b].inBase() {
			return -1
		}
		return 1
	})
	return d.phrase + " in " + either(names)
}

// wantedWithUnit returns "a current with its unit", or the bare phrase where there is no unit.
func (d *Dimension) wantedWithUnit() string {
	if len(d.usual) == 0 {
		return d.phrase
	}
	return d.phrase + " with its unit"
}

// owner returns the quantity one of whose units is written so, including the doubtful writings.
func owner(unit string) (*Dimension, bool) {
	for _, d := range dimensions {
		if _, ok := d.spellings[unit]; ok || slices.Contains(d.ambiguous, unit) {
			return d, true
		}
	}
	return nil, false
}

// either joins words: "a", "a or b", "a, b or c".
func either(words []string) string {
	if len(words) < 2 {
		return strings.Join(words, "")
	}
	last := len(words) - 1
	return strings.Join(words[:last], ", ") + " or " + words[last]
}
