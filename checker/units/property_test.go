package units

import (
	"fmt"
	"math"
	"regexp"
	"strconv"
	"strings"
	"testing"

	"pgregory.net/rapid"
)

func drawDimension(t *rapid.T) *Dimension {
	return rapid.SampledFrom(Dimensions()).Draw(t, "dimension")
}

// drawValue draws a value in the base unit over the range a switchboard can meet.
func drawValue(t *rapid.T) float64 {
	v := rapid.Float64Range(1, 10).Draw(t, "mantissa") * math.Pow10(rapid.IntRange(-6, 11).Draw(t, "power"))
	if rapid.Bool().Draw(t, "negative") {
		return -v
	}
	return v
}

func TestFormattedValuesReadBack(t *testing.T) {
	t.Parallel()
	rapid.Check(t, func(t *rapid.T) {
		d, v := drawDimension(t), drawValue(t)
		text := d.Format(v)
		got, err := d.Parse(text)
		if err != nil {
			t.Fatalf("%s printed %v as %q: %v", d.Name, v, text, err)
		}
		if math.Abs(got-v) > math.Abs(v)*5.0001e-4 {
			t.Fatalf("%s printed %v as %q, which is %v", d.Name, v, text, got)
		}
		if digits := strings.Trim(strings.TrimRight(plainDecimal(firstWord(text)).digits, "0"), "-"); len(digits) > readableDigits {
			t.Fatalf("%q has %d significant digits", text, len(digits))
		}
		if strings.ContainsAny(firstWord(text), "eE") {
			t.Fatalf("%q has an exponent", text)
		}
	})
}

func firstWord(text string) string {
	first, _, _ := strings.Cut(text, " ")
	return first
}

func TestShortDecimalsPrintExactly(t *testing.T) {
	t.Parallel()
	rapid.Check(t, func(t *rapid.T) {
		d := drawDimension(t)
		if d == incidentEnergy { // its only printed unit is not decimal
			return
		}
		m := rapid.SampledFrom(d.shown).Filter(func(m measure) bool { return m.size.times == 1 }).Draw(t, "unit")
		short := decimal{digits: strings.TrimRight(fmt.Sprint(rapid.IntRange(1, 9999).Draw(t, "digits")), "0"), point: rapid.IntRange(-2, 5).Draw(t, "point")}
		v, err := d.Parse(join(short.String(), m.symbol))
		if err != nil {
			t.Fatal(err)
		}
		again, err := d.Parse(d.Format(v))
		if err != nil || again-v > math.Abs(v)*2.3e-16 || v-again > math.Abs(v)*2.3e-16 {
			t.Fatalf("%s %s is %v, printed as %q, read back as %v, %v", short, m.symbol, v, d.Format(v), again, err)
		}
	})
}

func TestDirectedFormatsEncloseTheValue(t *testing.T) {
	t.Parallel()
	rapid.Check(t, func(t *rapid.T) {
		d, v, digits := drawDimension(t), drawValue(t), rapid.IntRange(1, 12).Draw(t, "digits")
		lower, upper := printed(t, d, d.FormatDown(v, digits)), printed(t, d, d.FormatUp(v, digits))
		exact, hair := Round12(v), math.Abs(v)*1e-15 // a few units of the last place, from reading back
		if d == incidentEnergy || d == duration {
			hair = math.Abs(v) * 1.1e-11 // half a step of the twelfth digit in s and again in cal/cm2 or min
		}
		if lower > exact+hair || upper < exact-hair {
			t.Fatalf("%v is not between %q and %q", exact, d.FormatDown(v, digits), d.FormatUp(v, digits))
		}
		if width := upper - lower; width > math.Abs(v)*1.0001*math.Pow10(1-digits)+2*hair {
			t.Fatalf("%q to %q is wider than one step", d.FormatDown(v, digits), d.FormatUp(v, digits))
		}
	})
}

// printed reads a printed value back without the limit of 15 digits, which twelve significant digits
// of a very small value exceed.
func printed(t *rapid.T, d *Dimension, text string) float64 {
	number, unit, _ := strings.Cut(text, " ")
	size, ok := d.spellings[unit]
	v, err := strconv.ParseFloat(fmt.Sprintf("%se%d", number, size.exponent), 64)
	if err != nil || !ok {
		t.Fatalf("%q cannot be read back: %v", text, err)
	}
	return v * size.times
}

func TestRound12Properties(t *testing.T) {
	t.Parallel()
	rapid.Check(t, func(t *rapid.T) {
		v := drawValue(t)
		r := Round12(v)
		if Round12(r) != r {
			t.Fatalf("Round12 moves %v again", r)
		}
		if math.Abs(r-v) > math.Abs(v)*5.001e-12 {
			t.Fatalf("Round12(%v) is %v", v, r)
		}
	})
}

func drawText(t *rapid.T) string {
	var all []string
	for _, d := range Dimensions() {
		all = append(append(all, d.Spellings()...), d.ambiguous...)
	}
	number := rapid.OneOf(
		rapid.StringMatching(`[-−]?[0-9]{1,4}(\.[0-9]{1,4})?`),
		rapid.StringMatching(`[-−+]?[0-9]{0,17}([.,][0-9]{0,17})?`),
		rapid.StringMatching(`[0-9 ,.'_eExX+-]{0,8}`),
		rapid.SampledFrom([]string{"NaN", "inf", "∞", "off", "٣"}),
	)
	space := rapid.SampledFrom([]string{"", " ", "\u00a0", "\u202f", "\u2009", "\t", "  ", "\n", "\u3000"})
	unit := rapid.OneOf(rapid.SampledFrom(all), rapid.Just(""), rapid.StringMatching(`[µmkMGAVsWJ2²/°% ]{0,4}`), rapid.String())
	return space.Draw(t, "before") + number.Draw(t, "number") + space.Draw(t, "between") + unit.Draw(t, "unit") + space.Draw(t, "after")
}

func patterns(t testing.TB) map[*Dimension]*regexp.Regexp {
	t.Helper()
	all := map[*Dimension]*regexp.Regexp{}
	for _, d := range Dimensions() {
		p, err := regexp.Compile(d.Pattern())
		if err != nil {
			t.Fatal(err)
		}
		all[d] = p
	}
	return all
}

func TestPatternAgreesWithParse(t *testing.T) {
	t.Parallel()
	compiled := patterns(t)
	accepted := 0
	rapid.Check(t, func(t *rapid.T) {
		text := drawText(t)
		for _, d := range Dimensions() {
			if checkAgreement(t, d, compiled[d], text) {
				accepted++
			}
		}
	})
	if accepted == 0 {
		t.Error("no generated text was accepted, so nothing was compared")
	}
	for _, d := range Dimensions() { // every writing of every unit, which the generator may miss
		for _, unit := range append(d.Spellings(), d.ambiguous...) {
			for _, other := range Dimensions() {
				checkAgreement(t, other, compiled[other], "6.5 "+unit)
			}
			for _, text := range []string{
				"6.5 " + strings.ReplaceAll(unit, " ", "\u00a0"),
				strings.Repeat("1", 15) + "." + strings.Repeat("1", 15) + unit,
				strings.Repeat("1", 16) + unit,
				"1." + strings.Repeat("1", 16) + unit,
			} {
				checkAgreement(t, d, compiled[d], text)
			}
		}
	}
}

type failer interface {
	Fatalf(format string, arguments ...any)
}

// checkAgreement compares Parse with Pattern and looks at the sentence of the fault.
func checkAgreement(t failer, d *Dimension, pattern *regexp.Regexp, text string) bool {
	v, err := d.Parse(text)
	if matches := pattern.MatchString(text); matches != (err == nil) {
		t.Fatalf("%s: pattern says %v to %q, Parse says %v", d.Name, matches, text, err)
	}
	if err == nil {
		if math.IsNaN(v) || math.IsInf(v, 0) {
			t.Fatalf("%s: %q became %v", d.Name, text, v)
		}
		return true
	}
	f, ok := err.(*Fault)
	if !ok {
		t.Fatalf("%s: %q gave a %T", d.Name, text, err)
	}
	s := f.Error()
	if f.Kind == "" || f.Got == "" || f.Want == "" || f.Hint == "" || strings.ContainsAny(s, "\n\r\t\x1b\u202e") {
		t.Fatalf("%s: %q gave %q of kind %q", d.Name, text, s, f.Kind)
	}
	return false
}

// TestHintsAreAccepted reads back what a hint tells people to write.
func TestHintsAreAccepted(t *testing.T) {
	t.Parallel()
	quoted := regexp.MustCompile(`"([^"\\]*)"`)
	rapid.Check(t, func(t *rapid.T) {
		d, text := drawDimension(t), drawText(t)
		_, err := d.Parse(text)
		if err == nil {
			return
		}
		f := err.(*Fault)
		if strings.HasPrefix(f.Hint, "write the number as ") {
			return
		}
		for _, m := range quoted.FindAllStringSubmatch(f.Hint, -1) {
			if _, again := d.Parse(m[1]); again != nil && again.(*Fault).Kind != TooManyDigits {
				t.Fatalf("%s: hint for %q is %s, but %v", d.Name, text, f.Hint, again)
			}
		}
	})
}

func FuzzParse(f *testing.F) {
	compiled := patterns(f)
	f.Fuzz(func(t *testing.T, text string) {
		for _, d := range Dimensions() {
			checkAgreement(t, d, compiled[d], text)
		}
	})
}
