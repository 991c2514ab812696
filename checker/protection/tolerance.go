package protection

import (
	"fmt"
	"math"

	"boardproof/checker/units"
	"boardproof/checker/working"
)

// Spread is how far a true pickup may lie from its setting, as factors on the setting: the
// device may trip from Low times the setting and is certain to trip from High times the
// setting. The zero Spread is refused, because nothing is exact by default.
type Spread struct {
	Low, High units.Ratio
}

// Exactly returns the spread of a pickup without tolerance, for calculations at nominal
// values.
func Exactly() Spread { return Spread{1, 1} }

// Times combines two independent deviations at their worst, such as those of a relay and of
// its current transformers.
func (s Spread) Times(other Spread) Spread {
	return Spread{s.Low * other.Low, s.High * other.High}
}

func (s Spread) problem(what string) error {
	low, high := float64(s.Low), float64(s.High)
	if !(low > 0 && low <= high && high <= 10) {
		return fmt.Errorf("the pickup tolerance of the %s is %v to %v times the setting, expected two factors that rise, such as 0.9 and 1.1", what, low, high)
	}
	return nil
}

// TimeTolerance is how far a true time may lie from its curve. The slow edge adds the
// larger of Slow and Least, the fast edge takes off the larger of Fast and Least. The zero
// TimeTolerance takes the curve as exact.
type TimeTolerance struct {
	Fast, Slow units.Percentage // of the time
	Least      units.Second     // in either direction
}

func (t TimeTolerance) slow(time float64) float64 {
	return time + math.Max(float64(t.Slow)*time, float64(t.Least))
}

func (t TimeTolerance) fast(time float64) float64 {
	return math.Max(0, time-math.Max(float64(t.Fast)*time, float64(t.Least)))
}

func (t TimeTolerance) problem(what string) error {
	fast, slow, least := float64(t.Fast), float64(t.Slow), float64(t.Least)
	if !(fast >= 0 && fast <= 1 && slow >= 0 && slow <= 10 && least >= 0 && least <= 10) {
		return fmt.Errorf("the time tolerance of the %s is -%s, +%s or %s, expected shares from 0 %% and a time from 0 s", what, units.Format(t.Fast), units.Format(t.Slow), units.Format(t.Least))
	}
	return nil
}

// PickupAssumption is a spread to take where a file states none, with the reason and the
// source that a worksheet repeats.
type PickupAssumption struct {
	Spread
	Why    string
	Source working.Source
}

// TimeAssumption is a time tolerance to take where a file states none.
type TimeAssumption struct {
	TimeTolerance
	Why    string
	Source working.Source
}

const fromMemory = "from memory, unconfirmed"

var breakerStandard = working.Source{Standard: "IEC 60947-2", Clause: "8.3.3.1", Status: fromMemory}

// What to assume of the releases of a circuit-breaker.
var (
	DefaultLongTimePickup = PickupAssumption{Spread{1.05, 1.30},
		"conventional non-tripping and tripping current of an overload release",
		working.Source{Standard: "IEC 60947-2", Clause: "Table 6", Status: fromMemory}}
	DefaultLongTimeDelay = TimeAssumption{TimeTolerance{Fast: 0.20, Slow: 0.20},
		"usual width of a long-time band", working.Source{Status: "common practice, no source"}}
	DefaultShortTimePickup = PickupAssumption{Spread{0.90, 1.10},
		"electronic short-time release within 10 %", breakerStandard}
	DefaultShortTimeDelay = TimeAssumption{TimeTolerance{Fast: 0.30},
		"the stated delay is taken as the upper edge of its band, the lower edge as 30 % less", working.Source{Status: fromMemory}}
	DefaultInstantaneousPickup = PickupAssumption{Spread{0.80, 1.20},
		"instantaneous release within 20 %",
		working.Source{Standard: "IEC 60947-2", Clause: "8.3.3.1.2", Status: "seen in one excerpt"}}
)

// What to assume of a measuring relay. The pickup of the relay and the error of its current
// transformers are combined with [Spread.Times].
var (
	DefaultRelayPickup = PickupAssumption{Spread{0.95, 1.05},
		"measuring error of a relay of class 5", working.Source{Standard: "IEC 60255-151", Status: fromMemory}}
	DefaultCurrentTransformer = PickupAssumption{Spread{0.90, 1.10},
		"ratio error of current transformers of class 10P, applied in both directions", working.Source{Standard: "IEC 61869-2", Status: fromMemory}}
	DefaultRelayError = RelayError{Assigned: 0.05, Least: 0.030}
	// DefaultRelayErrorSource belongs to [DefaultRelayError].
	DefaultRelayErrorSource = working.Source{Standard: "IEC 60255-151", Clause: "5.2",
		Status: "multiples of the assigned error seen in a manual that cites the clause; 5 % and 30 ms from memory, unconfirmed"}
)

// RelayError is the accuracy of the time of an inverse stage: the assigned error holds from
// ten times the setting; below it the standard allows a multiple of it.
type RelayError struct {
	Assigned units.Percentage
	Least    units.Second
}

// at is the time tolerance at a multiple of the setting: 2.5 times the assigned error below
// 5, 1.5 times below 10.
func (e RelayError) at(multiple float64) TimeTolerance {
	share := e.Assigned
	switch {
	case multiple < 5:
		share *= 2.5
	case multiple < 10:
		share *= 1.5
	}
	return TimeTolerance{Fast: share, Slow: share, Least: e.Least}
}
