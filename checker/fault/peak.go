package fault

import (
	"fmt"
	"math"
	"sync"

	"boardproof/checker/units"
	"boardproof/checker/working"
)

// PeakFactorFormula is κ.
var PeakFactorFormula = working.Formula{
	ID: "fault.peak_factor", Symbol: "κ", Name: "peak factor",
	Equation: "1.02 + 0.98·exp(−3·{R/X})", Source: iec60909("8.1.1, eq. (55)", recomputed),
	Range: []working.Interval{rOverXOf("R/X")},
}

// PeakFactor returns κ, the peak over √2 times the initial symmetrical current.
//
//	κ = 1.02 + 0.98·exp(−3·R/X)
//
// Valid for R/X ≥ 0; κ falls from 2 to 1.02. Source: IEC 60909-0 8.1.1; confirmed by
// testdata/iec60909/peak-and-heat.yaml.
func PeakFactor(rOverX units.Ratio) (units.Ratio, error) {
	f := &PeakFactorFormula
	if err := f.CheckRange(float64(rOverX)); err != nil {
		return 0, err
	}
	return finite[units.Ratio](f, 1.02+0.98*math.Exp(-3*float64(rOverX)))
}

// PeakCurrentFormula is i_p of one branch.
var PeakCurrentFormula = working.Formula{
	ID: "fault.peak_current", Symbol: "i_p", Name: "peak short-circuit current",
	Equation: "{κ}·√2·{I\"_k}", Source: iec60909("8.1.1, eq. (54)", recomputed),
	Range: []working.Interval{limits[units.Ratio]("κ", 1, 2), currentOf("I\"_k")},
	Note:  "per branch; the peaks of branches that meet at the fault are added",
}

// PeakCurrent returns the highest instantaneous value of the current of one branch.
//
//	i_p = κ·√2·I"_k
//
// Source: IEC 60909-0 8.1.1; confirmed by testdata/iec60909/reference-cases.yaml and
// peak-and-heat.yaml.
func PeakCurrent(factor units.Ratio, initial units.Ampere) (units.Ampere, error) {
	f := &PeakCurrentFormula
	if err := f.CheckRange(float64(factor), float64(initial)); err != nil {
		return 0, err
	}
	return finite[units.Ampere](f, float64(factor)*math.Sqrt2*float64(initial))
}

type ratioRow struct {
	above, to units.Ampere // to is +Inf in the last row
	n         units.Ratio
}

var peakRatios = sync.OnceValues(loadPeakRatios)

func loadPeakRatios() ([]ratioRow, error) {
	lines, err := rows("peak_ratio.csv", "above_ka", "to_ka", "cos_phi", "n")
	if err != nil {
		return nil, err
	}
	var out []ratioRow
	for i, line := range lines {
		v, err := line.numbers(1, 0, 3)
		if err != nil {
			return nil, err
		}
		r := ratioRow{units.Ampere(v[0] * 1e3), units.Ampere(math.Inf(1)), units.Ratio(v[1])}
		if line.cells[1] != anything {
			to, err := line.numbers(1e3, 1)
			if err != nil {
				return nil, err
			}
			r.to = units.Ampere(to[0])
		}
		if r.to <= r.above || i > 0 && (r.above != out[i-1].to || r.n <= out[i-1].n) {
			return nil, fmt.Errorf("%s: the rows do not join or the ratio does not rise", line.place)
		}
		out = append(out, r)
	}
	return out, nil
}

// PeakRatioFormula is n of IEC 61439-1.
var PeakRatioFormula = working.Formula{
	ID: "fault.peak_ratio", Symbol: "n", Name: "ratio of peak to short-time withstand current",
	Equation: "Table 7 for {I}", Source: working.Source{Standard: "IEC 61439-1", Edition: "2020", Clause: "Table 7", Status: recomputed},
	Range: []working.Interval{currentOf("I")},
	Note:  "for the test of an assembly; close to a large transformer the site's peak may be higher",
}

// PeakRatio returns the standardised ratio of peak to r.m.s. value of the rated short-time
// withstand current: the row in which the r.m.s. value lies, upper bound included.
//
//	n = Table 7 (I)
//
// Source: IEC 61439-1 Table 7; confirmed by testdata/iec60909/peak-ratio.yaml.
func PeakRatio(current units.Ampere) (units.Ratio, error) {
	if err := PeakRatioFormula.CheckRange(float64(current)); err != nil {
		return 0, err
	}
	table, err := peakRatios()
	if err != nil {
		return 0, err
	}
	for _, r := range table {
		if current > r.above && current <= r.to {
			return r.n, nil
		}
	}
	return 0, fmt.Errorf("table 7 has no row for %s", units.Format(current))
}
