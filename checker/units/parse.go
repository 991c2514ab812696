package units

import (
	"slices"
	"strconv"
	"strings"
)

// maxDigits is the number of digits accepted on each side of the decimal point; a float64 carries
// 15 significant decimal digits unchanged.
const maxDigits = 15

// Parse reads a value with its unit, e.g. Parse[Ampere]("65 kA"). The error is always a *Fault.
func Parse[U Unit](text string) (U, error) {
	var zero U
	v, err := zero.Dimension().Parse(text)
	return U(v), err
}

// Parse reads a value with its unit and returns it in the base unit, always finite. The error is
// always a *Fault that says what was found, what is expected and what to write.
// The value is the float64 nearest to what is written; only min, h and cal/cm2 are multiplied.
func (d *Dimension) Parse(text string) (float64, error) {
	trimmed := strings.Trim(strings.Map(plainSpace, text), " ")
	number, rest, ok := cutNumber(trimmed)
	if !ok {
		return 0, d.explainNumber(text, trimmed)
	}
	unit := strings.TrimLeft(rest, " ")
	size, known := d.spellings[unit]
	if !known {
		if f := d.explainDisguised(text, trimmed, number); f != nil {
			return 0, f
		}
		return 0, d.explainUnit(text, number, unit)
	}
	if whole, fraction, _ := strings.Cut(strings.TrimPrefix(number, "-"), "."); len(whole) > maxDigits || len(fraction) > maxDigits {
		return 0, &Fault{Kind: TooManyDigits, Got: quote(text),
			Want: "at most 15 digits on each side of the decimal point", Hint: "write for example " + quote(d.example)}
	}
	v, err := strconv.ParseFloat(number+"e"+strconv.Itoa(size.exponent), 64)
	if err != nil {
		return 0, d.notANumber(text)
	}
	return v*size.times + 0, nil // + 0 turns negative zero into zero
}

func plainSpace(r rune) rune {
	if strings.ContainsRune(spaces, r) {
		return ' '
	}
	return r
}

// cutNumber splits "−6.5 kA" into "-6.5" and " kA"; ok is false unless digits, an optional point
// with digits on both sides and an optional minus stand at the start.
func cutNumber(text string) (number, rest string, ok bool) {
	body, negative := cutMinus(text)
	whole := leadingDigits(body)
	if whole == "" {
		return "", "", false
	}
	number, rest = whole, body[len(whole):]
	if strings.HasPrefix(rest, ".") {
		fraction := leadingDigits(rest[1:])
		if fraction == "" {
			return "", "", false
		}
		number, rest = number+"."+fraction, rest[1+len(fraction):]
	}
	if negative {
		number = "-" + number
	}
	return number, rest, true
}

func cutMinus(text string) (rest string, found bool) {
	for _, minus := range []string{"-", "\u2212"} {
		if rest, found = strings.CutPrefix(text, minus); found {
			return rest, true
		}
	}
	return text, false
}

func leadingDigits(text string) string {
	n := 0
	for n < len(text) && isDigit(text[n]) {
		n++
	}
	return text[:n]
}

func isDigit(c byte) bool { return '0' <= c && c <= '9' }

func allDigits(text string) bool { return text != "" && len(leadingDigits(text)) == len(text) }

// explainUnit says what is wrong with the unit behind a good number.
func (d *Dimension) explainUnit(text, number, unit string) *Fault {
	switch {
	case unit == "":
		return &Fault{Kind: NoUnit, Got: quote(text), Want: d.wantedWithUnit(), Hint: d.write(number, d.usual)}
	case slices.Contains(d.ambiguous, unit):
		thousands := join(plainDecimal(number).shift(3).String(), "A2s")
		return &Fault{Kind: AmbiguousUnit, Got: quote(text) + ", where k can stand for 10^3 or 10^6", Want: d.wanted(),
			Hint: "write " + quote(thousands) + " or " + quote(join(number, "MA2s"))}
	}
	if other, ok := owner(unit); ok {
		return &Fault{Kind: OtherDimension, Got: quote(text) + ", which is " + other.phrase, Want: d.wanted(),
			Hint: "write for example " + quote(d.example)}
	}
	if first, _, more := strings.Cut(unit, " "); more && d.spellings[first] != (size{}) {
		return &Fault{Kind: SeveralValues, Got: quote(text), Want: d.phrase + " and nothing else", Hint: d.write(number, []string{first})}
	}
	// No hint may join the number to a unit that means something else: 104 F is not 104 °C.
	f := &Fault{Kind: UnknownUnit, Got: quote(text), Want: d.wanted(), Hint: "write for example " + quote(d.example)}
	if alike := d.sameLetters(unit); len(alike) > 0 {
		f.Want = d.phrase + " with the capitals of its unit as in " + either(alike)
		f.Hint = d.write(number, alike)
	} else if alike := d.oneSlipAway(unit); len(alike) > 0 {
		f.Hint = d.write(number, alike)
	}
	return f
}

// write proposes the number with each of the units, or alone where there is none.
func (d *Dimension) write(number string, units []string) string {
	if len(units) == 0 {
		return "write " + quote(number)
	}
	ways := make([]string, len(units))
	for i, u := range units {
		ways[i] = quote(join(number, u))
	}
	return "write " + either(ways)
}

// sameLetters returns the accepted units that differ from the written one in capitals only.
func (d *Dimension) sameLetters(unit string) []string {
	var alike []string
	for _, s := range d.Spellings() {
		if strings.EqualFold(s, unit) {
			alike = append(alike, s)
		}
	}
	return alike
}

// oneSlipAway returns the accepted units of three letters or more that become the written one by
// adding, dropping or changing one character after the first, which may be a prefix; at most three.
func (d *Dimension) oneSlipAway(unit string) []string {
	var alike []string
	for _, s := range d.Spellings() {
		if a, b := []rune(s), []rune(unit); len(a) >= 3 && len(b) >= 2 && a[0] == b[0] && oneSlip(a, b) {
			alike = append(alike, s)
		}
	}
	return alike[:min(len(alike), 3)]
}

func oneSlip(a, b []rune) bool {
	if len(a) < len(b) {
		a, b = b, a
	}
	i := 0
	for i < len(b) && a[i] == b[i] {
		i++
	}
	if len(a) == len(b) {
		return i < len(a) && slices.Equal(a[i+1:], b[i+1:])
	}
	return slices.Equal(a[i+1:], b[i:])
}
