package fault

import (
	"math"

	"boardproof/checker/units"
	"boardproof/checker/working"
)

var durationRange = limits[units.Second]("T_k", 1e-3, 60)

// DirectCurrentHeatFormula is m.
var DirectCurrentHeatFormula = working.Formula{
	ID: "fault.direct_current_heat", Symbol: "m", Name: "factor for the heat of the d.c. component",
	Equation: "[exp(4·{f}·{T_k}·ln({κ} − 1)) − 1]/[2·{f}·{T_k}·ln({κ} − 1)]", Source: iec60909("11, eq. (103)", recomputed),
	Range: []working.Interval{limits[units.Hertz]("f", 10, 400), durationRange, limits[units.Ratio]("κ", 1.02, 2)},
	Note:  "at κ = 2 its limit, 2, is used",
}

// DirectCurrentHeat returns m, the heat of the decaying d.c. component relative to that of
// the a.c. component.
//
//	m = [exp(4·f·T_k·ln(κ − 1)) − 1] / [2·f·T_k·ln(κ − 1)]
//
// Valid for 1.02 ≤ κ ≤ 2; at κ = 2 the limit 2 is returned. Source: IEC 60909-0 clause on
// Joule integral; confirmed by testdata/iec60909/peak-and-heat.yaml.
func DirectCurrentHeat(frequency units.Hertz, duration units.Second, peakFactor units.Ratio) (units.Ratio, error) {
	f := &DirectCurrentHeatFormula
	if err := f.CheckRange(float64(frequency), float64(duration), float64(peakFactor)); err != nil {
		return 0, err
	}
	exponent := 2 * float64(frequency) * float64(duration) * math.Log(float64(peakFactor)-1)
	if exponent == 0 {
		return 2, nil
	}
	return finite[units.Ratio](f, math.Expm1(2*exponent)/exponent)
}

// AlternatingCurrentHeatFormula is n of the heat.
var AlternatingCurrentHeatFormula = working.Formula{
	ID: "fault.alternating_current_heat", Symbol: "n", Name: "factor for the heat of the a.c. component",
	Equation: "n of the decay from {I\"_k} to {I_k} within {T_k}", Source: iec60909("11, eq. (104)", recomputed),
	Range: []working.Interval{currentOf("I\"_k"), currentOf("I_k"), durationRange},
	Note:  "1 far from generators, and below I\"_k/I_k = 1.25",
}

// Decay is a current that falls from its initial to its steady value.
type Decay struct {
	Initial, Steady units.Ampere
}

// AlternatingCurrentHeat returns n, the heat of the a.c. component relative to that of the
// initial current lasting all the time. Far from generators it is 1.
//
//	n = 1/q² · {1 + T_d/(20·T_k)·[1 − e^(−20·T_k/T_d)]·(q − q')² + T_d/(2·T_k)·[1 − e^(−2·T_k/T_d)]·(q' − 1)²
//	    + T_d/(5·T_k)·[1 − e^(−10·T_k/T_d)]·(q − q') + 2·T_d/T_k·[1 − e^(−T_k/T_d)]·(q' − 1)
//	    + T_d/(5.5·T_k)·[1 − e^(−11·T_k/T_d)]·(q − q')·(q' − 1)}
//	q = I"_k/I_k, q' = q/(0.88 + 0.17·q), T_d = 3.1 s/q'
//
// Valid for I"_k ≥ I_k; below q = 1.25 it is 1. Source: IEC 60909-0 clause on Joule
// integral; confirmed by testdata/iec60909/peak-and-heat.yaml (example of IEC TR 60865-2)
// and by the mean square of the decaying current.
func AlternatingCurrentHeat(d Decay, duration units.Second) (units.Ratio, error) {
	f := &AlternatingCurrentHeatFormula
	if err := f.CheckRange(float64(d.Initial), float64(d.Steady), float64(duration)); err != nil {
		return 0, err
	}
	q := float64(d.Initial) / float64(d.Steady)
	if q < 1-1e-9 {
		return 0, &working.RangeError{Symbol: "I\"_k/I_k", Found: units.Format(units.Ratio(q)), Limit: "I\"_k/I_k ≥ 1"}
	}
	if q < 1.25 {
		return 1, nil
	}
	q1 := q / (0.88 + 0.17*q)
	x := float64(duration) * q1 / 3.1                                      // T_k/T_d
	mean := func(a float64) float64 { return -math.Expm1(-a*x) / (a * x) } // of e^(−a·t/T_d) over T_k
	n := 1 + mean(20)*(q-q1)*(q-q1) + mean(2)*(q1-1)*(q1-1) + 2*mean(10)*(q-q1) + 2*mean(1)*(q1-1) + 2*mean(11)*(q-q1)*(q1-1)
	return finite[units.Ratio](f, n/(q*q))
}

// ThermalEquivalentFormula is I_th.
var ThermalEquivalentFormula = working.Formula{
	ID: "fault.thermal_equivalent_current", Symbol: "I_th", Name: "thermal equivalent short-circuit current",
	Equation: "{I\"_k}·√({m} + {n})", Source: iec60909("11, eq. (102)", recomputed),
	Range: []working.Interval{currentOf("I\"_k"), limits[units.Ratio]("m", 0, 2), limits[units.Ratio]("n", 0, 1)},
	Note:  "for the heating of conductors; a short-time withstand current is compared with I\"_k, because its test contains the asymmetry",
}

// HeatFactors are m and n.
type HeatFactors struct {
	DirectCurrent, AlternatingCurrent units.Ratio
}

// ThermalEquivalentCurrent returns the steady current with the heat of the real one.
//
//	I_th = I"_k·√(m + n)
//
// Source: IEC 60909-0; confirmed by testdata/iec60909/reference-cases.yaml (ith) and
// peak-and-heat.yaml.
func ThermalEquivalentCurrent(initial units.Ampere, h HeatFactors) (units.Ampere, error) {
	f := &ThermalEquivalentFormula
	if err := f.CheckRange(float64(initial), float64(h.DirectCurrent), float64(h.AlternatingCurrent)); err != nil {
		return 0, err
	}
	return finite[units.Ampere](f, float64(initial)*math.Sqrt(float64(h.DirectCurrent)+float64(h.AlternatingCurrent)))
}

// JouleIntegralFormula is I²t.
var JouleIntegralFormula = working.Formula{
	ID: "fault.joule_integral", Symbol: "I²t", Name: "Joule integral",
	Equation: "{I}²·{t}", Source: working.Source{Status: identity},
	Range: []working.Interval{currentOf("I"), limits[units.Second]("t", 0, 36000)},
}

// JouleIntegral returns the heat of a constant r.m.s. current per unit of resistance.
//
//	I²t = I²·t
//
// Source: definition; confirmed by 65 kA for 1 s giving 4.225·10⁹ A²s.
func JouleIntegral(current units.Ampere, duration units.Second) (units.AmpereSquaredSecond, error) {
	f := &JouleIntegralFormula
	if err := f.CheckRange(float64(current), float64(duration)); err != nil {
		return 0, err
	}
	return finite[units.AmpereSquaredSecond](f, float64(current)*float64(current)*float64(duration))
}
