package units

import "math"

// readableDigits is the number of significant digits that Format prints at most.
const readableDigits = 4

// Format prints v as people say it: "65 kA", "250 ms", "1600 kVA", "4.225 GA²s".
// See Dimension.Format.
func Format[U Unit](v U) string { return v.Dimension().Format(float64(v)) }

// Format prints v, given in the base unit, with a prefix that suits its size and up to four
// significant digits, rounded half away from zero, without trailing zeros and without exponent.
// Parse reads what Format prints while the number needs no more than 15 digits on either side of
// the point. What is NaN or infinite is printed as "not finite", which Parse refuses.
func (d *Dimension) Format(v float64) string { return d.format(v, readableDigits, nearest) }

// FormatDown prints v with at most the given number of significant digits (1 to 12), rounded toward
// minus infinity: for a withstand value that must not be flattered. What differs from v beyond the
// twelfth digit, in the unit that is printed, counts as noise of the calculation and not as
// different: 0.1 + 0.2 is printed as 0.3.
func (d *Dimension) FormatDown(v float64, digits int) string { return d.format(v, digits, down) }

// FormatUp is FormatDown toward plus infinity: for a duty that must not be belittled.
func (d *Dimension) FormatUp(v float64, digits int) string { return d.format(v, digits, up) }

func (d *Dimension) format(v float64, digits int, to direction) string {
	if math.IsNaN(v) || math.IsInf(v, 0) {
		return "not finite"
	}
	digits = max(digits, 1) // more than workingDigits there never are
	exact := decimalOf(v)
	if exact.digits == "" {
		return d.zero()
	}
	m := d.suited(v, exact.round(digits, to).magnitude())
	return join(m.express(v).round(digits, to).String(), m.symbol)
}

// express returns v, given in the base unit, in the unit m to 12 digits.
func (m measure) express(v float64) decimal {
	if m.size.times == 1 {
		return decimalOf(v).shift(-m.size.exponent)
	}
	return decimalOf(v / m.size.inBase())
}

// zero prints nought in the smallest printed unit that is a usual one: "0 A", not "0 µA".
func (d *Dimension) zero() string {
	for _, m := range d.shown {
		for _, u := range d.usual {
			if m.size == d.spellings[u] {
				return join("0", m.symbol)
			}
		}
	}
	return "0"
}

// suited returns the largest printed unit whose lower bound the magnitude reaches. A unit that is
// not decimal gives way where it would spoil a short number: 5400 s is 90 min, 1000 s stays.
func (d *Dimension) suited(v, magnitude float64) measure {
	chosen := d.shown[0]
	for _, m := range d.shown[1:] {
		if magnitude >= m.from && (m.size.times == 1 || len(m.express(v).digits) <= readableDigits) {
			chosen = m
		}
	}
	return chosen
}

// join puts a number and its unit together; a bare number stays bare.
func join(number, unit string) string {
	if unit == "" {
		return number
	}
	return number + " " + unit
}
