package protection

import (
	"errors"
	"math"

	"boardproof/checker/units"
	"boardproof/checker/working"
)

func interval[U units.Unit](symbol string, low, high U) working.Interval {
	return working.Interval{Symbol: symbol, Low: float64(low), High: float64(high), Dimension: low.Dimension()}
}

func finite(value float64) (units.Second, error) {
	if math.IsNaN(value) || math.IsInf(value, 0) {
		return 0, errors.New("the time is not a finite number for these inputs")
	}
	return units.Second(value), nil
}

// LongTimeDelayFormula is the time of an overload function.
var LongTimeDelayFormula = working.Formula{
	ID: "protection.long_time_delay", Symbol: "t_LT", Name: "long-time delay",
	Equation: "{t_r}·({m}·{I_r}/{I})²", Source: working.Source{Status: "the I²t law of electronic releases: common practice, no source"},
	Range: []working.Interval{interval[units.Second]("t_r", 0.01, 3600), interval[units.Multiple]("m", 1, 20), interval[units.Ampere]("I_r", 0.1, 1e5), interval[units.Ampere]("I", 0.1, 1e7)},
}

// LongTimeCurrents are the setting and the current.
type LongTimeCurrents struct {
	Pickup, Current units.Ampere
}

// LongTimeDelay returns the nominal time of an overload function whose delay is stated at a
// multiple of its setting.
//
//	t_LT = t_r·(m·I_r/I)²
//
// Source: common practice; confirmed by the own cross-check of 12.4 kA (17.6 s).
func LongTimeDelay(delay units.Second, at units.Multiple, c LongTimeCurrents) (units.Second, error) {
	if err := LongTimeDelayFormula.CheckRange(float64(delay), float64(at), float64(c.Pickup), float64(c.Current)); err != nil {
		return 0, err
	}
	return finite(inverseSquare(float64(delay), float64(at)*float64(c.Pickup), float64(c.Current)))
}

// RampDelayFormula is the time of a short-time function on its ramp.
var RampDelayFormula = working.Formula{
	ID: "protection.ramp_delay", Symbol: "t_ST", Name: "short-time delay on the ramp",
	Equation: "{t_sd}·({I_t}/{I})²", Source: working.Source{Status: "the I²t ramp of electronic releases: common practice, no source"},
	Range: []working.Interval{interval[units.Second]("t_sd", 0.001, 60), interval[units.Ampere]("I_t", 0.1, 1e6), interval[units.Ampere]("I", 0.1, 1e7)},
	Note:  "up to the corner I_t; from there the delay t_sd holds",
}

// RampCurrents are the corner of the ramp and the current.
type RampCurrents struct {
	Corner, Current units.Ampere
}

// RampDelay returns the nominal time of a short-time function with a ramp at a current not
// above its corner.
//
//	t_ST = t_sd·(I_t/I)²
//
// Source: common practice; confirmed by the corner, where it equals t_sd.
func RampDelay(delay units.Second, c RampCurrents) (units.Second, error) {
	if err := RampDelayFormula.CheckRange(float64(delay), float64(c.Corner), float64(c.Current)); err != nil {
		return 0, err
	}
	if c.Current > c.Corner {
		return 0, &working.RangeError{Symbol: "I", Found: units.Format(c.Current), Limit: "I ≤ I_t"}
	}
	return finite(inverseSquare(float64(delay), float64(c.Corner), float64(c.Current)))
}

// SlowEdgeFormula is the latest end of the arc.
var SlowEdgeFormula = working.Formula{
	ID: "protection.slow_edge", Symbol: "t_max", Name: "longest clearing time",
	Equation: "{t} + max({Δt}·{t}, {Δt_0}) + {t_b}", Source: working.Source{Status: "definition of the tolerances"},
	Range: []working.Interval{
		interval[units.Second]("t", 0, 1e5), interval[units.Percentage]("Δt", 0, 10), interval[units.Second]("Δt_0", 0, 10), interval[units.Second]("t_b", 0, 10),
	},
	Note: "t_b is nought where the curve is one of total clearing times",
}

// SlowEdgeTimes are nominal time, tolerances and break time in the order of the operands.
type SlowEdgeTimes struct {
	Nominal   units.Second
	Relative  units.Percentage
	Least     units.Second
	BreakTime units.Second
}

// SlowEdge returns the longest clearing time.
//
//	t_max = t + max(Δt·t, Δt_0) + t_b
//
// Source: definition; confirmed by equality with [Release.Clearing] and [Relay.Clearing].
func SlowEdge(s SlowEdgeTimes) (units.Second, error) {
	if err := SlowEdgeFormula.CheckRange(float64(s.Nominal), float64(s.Relative), float64(s.Least), float64(s.BreakTime)); err != nil {
		return 0, err
	}
	return finite(TimeTolerance{Slow: s.Relative, Least: s.Least}.slow(float64(s.Nominal)) + float64(s.BreakTime))
}
