package protection

import (
	"fmt"
	"math"

	"boardproof/checker/units"
)

// HeatPoint is the current at which a device lets through the largest Joule integral.
type HeatPoint struct {
	At            units.Ampere
	Time          units.Second
	JouleIntegral units.AmpereSquaredSecond
	By            string // the function that clears there
	JustBelow     bool   // At lies a hair below the current at which the slow edge jumps
}

// hair is the distance below a jump at which a current is reported: larger than the rounding of
// numbers in a worksheet, smaller than anything printed.
const hair = 1e-6

// LargestJouleIntegral returns the largest i²·t(i) on the slow edge for all currents from
// low to high: at both ends and just below and at every break between them. The result is
// an upper bound; where the maximum lies just below a jump it is taken in the limit.
//
// The error is a [NotClearing] if the device is not certain to clear the lower end: then
// there is no largest value. Source: definition of the Joule integral; confirmed by
// sampling.
func LargestJouleIntegral(d Device, low, high units.Ampere) (HeatPoint, error) {
	return LargestJouleIntegralWith(d, low, high, 0)
}

// LargestJouleIntegralWith is the largest (i + others)²·t(i): the device sees the current
// i of its own branch, while the fault carries the currents of other branches too.
func LargestJouleIntegralWith(d Device, low, high, others units.Ampere) (HeatPoint, error) {
	c, err := d.curve()
	if err != nil {
		return HeatPoint{}, err
	}
	if !(low > 0 && low <= high && high <= 1e7) {
		return HeatPoint{}, fmt.Errorf("the currents are %s to %s, expected two that rise from above 0 A to at most 10 MA", units.Format(low), units.Format(high))
	}
	if !(others >= 0 && others <= 1e7) {
		return HeatPoint{}, fmt.Errorf("the current of the other branches is %s, expected 0 A to 10 MA", units.Format(others))
	}
	if _, err := c.clearing(low); err != nil {
		return HeatPoint{}, err
	}
	var best HeatPoint
	try := func(i float64, justBelow bool) {
		at, reported := i, i
		if justBelow {
			at, reported = math.Nextafter(i, 0), math.Max(float64(low), i*(1-hair))
		}
		t, by := c.slowAt(at)
		total := i + float64(others)
		if heat := total * total * t; heat > float64(best.JouleIntegral) {
			best = HeatPoint{units.Ampere(reported), units.Second(t), units.AmpereSquaredSecond(heat), by, justBelow}
		}
	}
	try(float64(high), false)
	try(float64(low), false)
	for _, b := range c.breaks() {
		if b > low && b <= high {
			try(float64(b), false)
			try(float64(b), true)
		}
	}
	return best, nil
}
