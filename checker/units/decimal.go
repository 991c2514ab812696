package units

import (
	"math"
	"strconv"
	"strings"
)

// workingDigits is the number of significant decimal digits that Round12 keeps. A float64 carries
// at least 15; the three left over absorb the noise of a calculation.
const workingDigits = 12

// Round12 returns v rounded to 12 significant digits, which removes the noise of a calculation
// without touching anything a person would write. It is the only place where that happens.
// NaN and infinities come back unchanged, negative zero as zero.
func Round12(v float64) float64 {
	if v == 0 || math.IsNaN(v) || math.IsInf(v, 0) {
		return v + 0
	}
	// The largest float64 rounds down, so what was just printed can always be read.
	rounded, _ := strconv.ParseFloat(strconv.FormatFloat(v, 'e', workingDigits-1, 64), 64)
	return rounded
}

// A decimal is ±0.DIGITS · 10^point, without zeros at either end of the digits; zero has no digits.
type decimal struct {
	negative bool
	digits   string
	point    int
}

// decimalOf returns the finite v to 12 significant digits.
func decimalOf(v float64) decimal {
	text := strconv.FormatFloat(math.Abs(v), 'e', workingDigits-1, 64)
	mantissa, exponent, _ := strings.Cut(text, "e")
	power, err := strconv.Atoi(exponent)
	if err != nil {
		return decimal{}
	}
	d := plainDecimal(mantissa)
	if d.digits == "" {
		return d
	}
	d.negative, d.point = v < 0, d.point+power
	return d
}

// plainDecimal reads ASCII digits with an optional minus and an optional point.
func plainDecimal(text string) decimal {
	whole, fraction, _ := strings.Cut(strings.TrimPrefix(text, "-"), ".")
	digits := strings.TrimLeft(whole+fraction, "0")
	point := len(digits) - len(fraction)
	digits = strings.TrimRight(digits, "0")
	if digits == "" {
		return decimal{}
	}
	return decimal{negative: strings.HasPrefix(text, "-"), digits: digits, point: point}
}

// shift returns d · 10^by.
func (d decimal) shift(by int) decimal {
	if d.digits != "" {
		d.point += by
	}
	return d
}

// direction is where a rounding goes.
type direction int

const (
	nearest direction = iota // half away from zero
	down                     // never above the value
	up                       // never below the value
)

// round returns d with at most n significant digits, n ≥ 1.
func (d decimal) round(n int, to direction) decimal {
	if len(d.digits) <= n {
		return d
	}
	away := d.digits[n] >= '5'
	if to != nearest {
		away = (to == down) == d.negative // what is cut off is never zero
	}
	kept := []byte(d.digits[:n])
	if away {
		i := n - 1
		for ; i >= 0 && kept[i] == '9'; i-- {
			kept[i] = '0'
		}
		if i < 0 {
			kept, d.point = []byte{'1'}, d.point+1
		} else {
			kept[i]++
		}
	}
	d.digits = strings.TrimRight(string(kept), "0")
	return d
}

// String returns d without exponent and without zeros that carry nothing.
func (d decimal) String() string {
	sign := ""
	if d.negative {
		sign = "-"
	}
	switch n := len(d.digits); {
	case n == 0:
		return "0"
	case d.point <= 0:
		return sign + "0." + strings.Repeat("0", -d.point) + d.digits
	case d.point >= n:
		return sign + d.digits + strings.Repeat("0", d.point-n)
	default:
		return sign + d.digits[:d.point] + "." + d.digits[d.point:]
	}
}

// magnitude returns |d| as the nearest float64.
func (d decimal) magnitude() float64 {
	if d.digits == "" {
		return 0
	}
	v, err := strconv.ParseFloat("0."+d.digits+"e"+strconv.Itoa(d.point), 64)
	if err != nil {
		return math.MaxFloat64
	}
	return v
}
