package fault

import (
	"fmt"
	"math"

	"boardproof/checker/units"
	"boardproof/checker/working"
)

// Statuses of a source, weakest last.
const (
	seen       = "seen in published material"
	recomputed = "seen in published material and recomputed"
	fromMemory = "from memory, unconfirmed"
	identity   = "follows from the definition"
)

// iec60909 is a source in the standard this package follows.
func iec60909(clause, status string) working.Source {
	return working.Source{Standard: "IEC 60909-0", Edition: "2016", Clause: clause, Status: status}
}

// limits is the interval of an argument, both ends included.
func limits[U units.Unit](symbol string, low, high U) working.Interval {
	return working.Interval{Symbol: symbol, Low: float64(low), High: float64(high), Dimension: low.Dimension()}
}

// The intervals that many formulas share. Their ends are no limits of the standard; they
// are so wide that only a slip of a prefix falls outside, and they keep results finite.
func voltageOf(symbol string) working.Interval {
	return limits[units.Volt](symbol, 1, 550e3)
}

func powerOf(symbol string) working.Interval {
	return limits[units.VoltAmpere](symbol, 1, 100e9)
}

func currentOf(symbol string) working.Interval {
	return limits[units.Ampere](symbol, 1e-3, 1e6)
}

// partOf is a resistance or a reactance, which may be nought.
func partOf(symbol string) working.Interval {
	return limits[units.Ohm](symbol, 0, 1e6)
}

// impedanceOf is a magnitude, which may not be nought.
func impedanceOf(symbol string) working.Interval {
	return limits[units.Ohm](symbol, 1e-9, 1e6)
}

func factorOf(symbol string) working.Interval {
	return limits[units.Ratio](symbol, 0.8, 1.2)
}

func rOverXOf(symbol string) working.Interval {
	return limits[units.Ratio](symbol, 0, 1e6)
}

// finite turns a computed number into a quantity, or says that it is none.
func finite[U units.Unit](f *working.Formula, value float64) (U, error) {
	if math.IsNaN(value) || math.IsInf(value, 0) {
		return 0, fmt.Errorf("%s is not a finite number for these inputs", f.Symbol)
	}
	return U(value), nil
}
