package fault

import (
	"errors"
	"fmt"
	"math"
	"strings"

	"boardproof/checker/units"
	"boardproof/checker/working"
)

// InitialCurrentFormula is I"_k of a three-phase fault fed through one impedance.
var InitialCurrentFormula = working.Formula{
	ID: "fault.initial_current", Symbol: "I\"_k", Name: "initial symmetrical short-circuit current",
	Equation: "{c}·{U_n}/(√3·√({R_k}² + {X_k}²))", Source: iec60909("7.2, eq. (29)", recomputed),
	Range: []working.Interval{factorOf("c"), voltageOf("U_n"), partOf("R_k"), partOf("X_k")},
}

// InitialCurrent returns the initial symmetrical current of a three-phase fault.
//
//	I"_k = c·U_n / (√3·√(R_k² + X_k²))
//
// The impedance must not be nought. Source: IEC 60909-0 7.2; confirmed by
// testdata/iec60909/reference-cases.yaml and fault-levels.yaml.
func InitialCurrent(c units.Ratio, nominal units.Volt, z Impedance) (units.Ampere, error) {
	f := &InitialCurrentFormula
	if err := f.CheckRange(float64(c), float64(nominal), float64(z.Resistance), float64(z.Reactance)); err != nil {
		return 0, err
	}
	amount, err := Magnitude(z)
	if err != nil {
		return 0, err
	}
	if amount < 1e-9 {
		return 0, errors.New("the impedance up to the fault is nought")
	}
	return finite[units.Ampere](f, float64(c)*float64(nominal)/(math.Sqrt(3)*float64(amount)))
}

// LineToLineCurrentFormula is I"_k2.
var LineToLineCurrentFormula = working.Formula{
	ID: "fault.line_to_line_current", Symbol: "I\"_k2", Name: "initial line-to-line short-circuit current",
	Equation: "√3/2·{I\"_k}", Source: iec60909("7.3, eq. (47)", recomputed), Range: []working.Interval{currentOf("I\"_k")},
	Note: "far from generators: the negative-sequence impedance equals the positive one",
}

// LineToLineCurrent returns the initial current of a fault between two lines.
//
//	I"_k2 = √3/2 · I"_k
//
// Valid far from generators (Z_2 = Z_1). Source: IEC 60909-0 7.3; confirmed by
// testdata/iec60909/reference-cases.yaml (ik2).
func LineToLineCurrent(initial units.Ampere) (units.Ampere, error) {
	f := &LineToLineCurrentFormula
	if err := f.CheckRange(float64(initial)); err != nil {
		return 0, err
	}
	return finite[units.Ampere](f, math.Sqrt(3)/2*float64(initial))
}

// ZeroSequenceResistanceFormula and ZeroSequenceReactanceFormula are parts of a
// zero-sequence impedance from stated ratios.
var (
	ZeroSequenceResistanceFormula = working.Formula{
		ID: "fault.zero_sequence_resistance", Symbol: "R_0", Name: "zero-sequence resistance",
		Equation: "{R_1}·{R_0/R_1}", Source: working.Source{Status: identity},
		Range: []working.Interval{partOf("R_1"), limits[units.Ratio]("R_0/R_1", 0, 100)},
	}
	ZeroSequenceReactanceFormula = working.Formula{
		ID: "fault.zero_sequence_reactance", Symbol: "X_0", Name: "zero-sequence reactance",
		Equation: "{X_1}·{X_0/X_1}", Source: working.Source{Status: identity},
		Range: []working.Interval{partOf("X_1"), limits[units.Ratio]("X_0/X_1", 0, 100)},
	}
)

// ZeroSequenceResistance returns the zero-sequence resistance of an element.
//
//	R_0 = R_1 · R_0/R_1
//
// Source: definition; confirmed by testdata/iec60909/earth-faults.yaml and tr60909-4.yaml.
func ZeroSequenceResistance(positive units.Ohm, ratio units.Ratio) (units.Ohm, error) {
	return zeroSequence(&ZeroSequenceResistanceFormula, positive, ratio)
}

// ZeroSequenceReactance returns the zero-sequence reactance of an element.
//
//	X_0 = X_1 · X_0/X_1
//
// Source: definition; confirmed by testdata/iec60909/earth-faults.yaml and tr60909-4.yaml
// (Z_0T1, Z_0T2 as published).
func ZeroSequenceReactance(positive units.Ohm, ratio units.Ratio) (units.Ohm, error) {
	return zeroSequence(&ZeroSequenceReactanceFormula, positive, ratio)
}

func zeroSequence(f *working.Formula, positive units.Ohm, ratio units.Ratio) (units.Ohm, error) {
	if err := f.CheckRange(float64(positive), float64(ratio)); err != nil {
		return 0, err
	}
	return finite[units.Ohm](f, float64(positive)*float64(ratio))
}

// Ratios of the zero-sequence impedance of a Dyn transformer with solidly earthed neutral,
// for units whose ratios nobody states. The high-voltage network does not take part.
const (
	DynReactanceRatio  units.Ratio = 0.95 // X_0/X_1
	DynResistanceRatio units.Ratio = 1.0  // R_0/R_1
)

// DynRatioSource says where the ratios of a Dyn transformer come from.
var DynRatioSource = working.Source{Standard: "IEC TR 60909-4", Clause: "3, data of the example", Status: seen}

// EarthFaultCurrentFormula is I"_k1.
var EarthFaultCurrentFormula = working.Formula{
	ID: "fault.earth_fault_current", Symbol: "I\"_k1", Name: "initial line-to-earth short-circuit current",
	Equation: "√3·{c}·{U_n}/√((2·{R_1} + {R_0})² + (2·{X_1} + {X_0})²)", Source: iec60909("7.5, eq. (53)", recomputed),
	Range: []working.Interval{factorOf("c"), voltageOf("U_n"), partOf("R_1"), partOf("X_1"), partOf("R_0"), partOf("X_0")},
	Note:  "far from generators: the negative-sequence impedance equals the positive one",
}

// Sequences are the impedances of an earth fault, in the order R_1, X_1, R_0, X_0.
type Sequences struct {
	Positive, Zero Impedance
}

// EarthFaultCurrent returns the initial current of a fault between one line and earth.
//
//	I"_k1 = √3·c·U_n / √((2·R_1 + R_0)² + (2·X_1 + X_0)²)
//
// Source: IEC 60909-0 7.5; confirmed by testdata/iec60909/earth-faults.yaml and
// tr60909-4.yaml.
func EarthFaultCurrent(c units.Ratio, nominal units.Volt, z Sequences) (units.Ampere, error) {
	f := &EarthFaultCurrentFormula
	r1, x1 := float64(z.Positive.Resistance), float64(z.Positive.Reactance)
	r0, x0 := float64(z.Zero.Resistance), float64(z.Zero.Reactance)
	if err := f.CheckRange(float64(c), float64(nominal), r1, x1, r0, x0); err != nil {
		return 0, err
	}
	loop := math.Hypot(2*r1+r0, 2*x1+x0)
	if loop < 1e-9 {
		return 0, errors.New("the impedance up to the fault is nought")
	}
	return finite[units.Ampere](f, math.Sqrt(3)*float64(c)*float64(nominal)/loop)
}

// EarthFaultROverXFormula is R/X of the loop of an earth fault, for its peak.
var EarthFaultROverXFormula = working.Formula{
	ID: "fault.earth_fault_r_over_x", Symbol: "R/X", Name: "ratio of resistance to reactance of the earth fault",
	Equation: "(2·{R_1} + {R_0})/(2·{X_1} + {X_0})", Source: iec60909("8.1", fromMemory),
	Range: []working.Interval{partOf("R_1"), partOf("X_1"), partOf("R_0"), partOf("X_0")},
	Note:  "the standard also allows the factor κ of the three-phase fault",
}

// EarthFaultROverX returns R/X of the loop of an earth fault.
//
//	R/X = (2·R_1 + R_0) / (2·X_1 + X_0)
//
// The operands of the Equation are R_1, X_1, R_0, X_0. Source: IEC 60909-0, from memory,
// unconfirmed; confirmed by the limit Z_0 = Z_1 only.
func EarthFaultROverX(z Sequences) (units.Ratio, error) {
	f := &EarthFaultROverXFormula
	r1, x1 := float64(z.Positive.Resistance), float64(z.Positive.Reactance)
	r0, x0 := float64(z.Zero.Resistance), float64(z.Zero.Reactance)
	if err := f.CheckRange(r1, x1, r0, x0); err != nil {
		return 0, err
	}
	if 2*x1+x0 < 1e-9 {
		return 0, errors.New("the reactance of the earth fault is nought")
	}
	return finite[units.Ratio](f, (2*r1+r0)/(2*x1+x0))
}

// BranchCurrent is the current one source sends into the fault, with the R/X of its path.
type BranchCurrent struct {
	Current units.Ampere
	ROverX  units.Ratio
}

// BranchSymbols are the symbols of a [BranchCurrent] on a worksheet.
type BranchSymbols struct {
	Current, ROverX string
}

// TotalCurrentFormula is the current of all branches, added as complex numbers.
func TotalCurrentFormula(symbol, name string, branches ...BranchSymbols) *working.Formula {
	terms := make([]string, len(branches))
	for i, b := range branches {
		terms[i] = fmt.Sprintf("{%s}/({%s} + j)·√(1 + {%s}²)", b.Current, b.ROverX, b.ROverX)
	}
	return &working.Formula{
		ID: "fault.total_current", Symbol: symbol, Name: name, Equation: "|" + strings.Join(terms, " + ") + "|",
		Source: iec60909("4.2.1, branches not meshed", recomputed),
		Note:   "the same as the sum of the admittances, because all branches are driven by the same c·U_n/√3",
	}
}

// TotalCurrent returns the current of sources that meet only at the fault.
//
//	I"_k = |Σ I"_ki·√(1 + (R_i/X_i)²) / (R_i/X_i + j)|
//
// Each branch current is that of [InitialCurrent] with the same c and U_n. A current of
// nought is allowed. Source: IEC 60909-0, sum of admittances; confirmed by the motor case C01 of
// testdata/iec60909/reference-cases.yaml.
func TotalCurrent(branches ...BranchCurrent) (units.Ampere, error) {
	if len(branches) == 0 {
		return 0, errNoBranch
	}
	allowed := working.Formula{Range: []working.Interval{limits[units.Ampere]("I\"_ki", 0, 1e6), rOverXOf("R_i/X_i")}}
	var active, reactive float64
	for _, b := range branches {
		if err := allowed.CheckRange(float64(b.Current), float64(b.ROverX)); err != nil {
			return 0, err
		}
		amount := math.Hypot(1, float64(b.ROverX))
		active += float64(b.Current) * float64(b.ROverX) / amount
		reactive += float64(b.Current) / amount
	}
	return finite[units.Ampere](TotalCurrentFormula("I\"_k", ""), math.Hypot(active, reactive))
}

// SumOfCurrentsFormula is the plain sum of currents: of peaks of branches, of rated currents
// of a group of motors, or of a converter's current added to a total.
func SumOfCurrentsFormula(symbol, name string, source working.Source, operands ...string) *working.Formula {
	return &working.Formula{
		ID: "fault.sum_of_currents", Symbol: symbol, Name: name, Equation: "{" + strings.Join(operands, "} + {") + "}", Source: source,
	}
}

// SumOfPeaksSource is the source of adding the peaks of branches that meet at the fault.
var SumOfPeaksSource = iec60909("8.1.1, non-meshed sources", fromMemory)

// SumOfCurrents returns the plain sum of currents, which is never smaller than their
// complex sum. A current of nought is allowed.
//
//	I = I_1 + I_2 + …
//
// Source for peaks: IEC 60909-0 8.1.1; confirmed by the motor case C01 of
// testdata/iec60909/reference-cases.yaml (ip_branch_sum).
func SumOfCurrents(currents ...units.Ampere) (units.Ampere, error) {
	if len(currents) == 0 {
		return 0, errNoBranch
	}
	allowed := working.Formula{Range: []working.Interval{limits[units.Ampere]("a current of the sum", 0, 1e7)}}
	sum := 0.0
	for _, i := range currents {
		if err := allowed.CheckRange(float64(i)); err != nil {
			return 0, err
		}
		sum += float64(i)
	}
	return finite[units.Ampere](&InitialCurrentFormula, sum)
}

// BranchShareFormula is the part of a fault current that one branch carries.
var BranchShareFormula = working.Formula{
	ID: "fault.branch_share", Symbol: "I_i/I", Name: "share of the branch in the fault current",
	Equation: "{I\"_ki}/{I\"_k}", Source: working.Source{Status: identity},
	Range: []working.Interval{limits[units.Ampere]("I\"_ki", 0, 1e6), currentOf("I\"_k")},
	Note:  "an arcing current is divided among the branches in the same shares",
}

// Share is the current of a branch and the total.
type Share struct {
	Branch, Total units.Ampere
}

// BranchShare returns the part of the fault current that one branch carries, at most 1.
//
//	I_i/I = I"_ki / I"_k
//
// Source: definition; confirmed by the limit of a single branch.
func BranchShare(s Share) (units.Ratio, error) {
	f := &BranchShareFormula
	if err := f.CheckRange(float64(s.Branch), float64(s.Total)); err != nil {
		return 0, err
	}
	if float64(s.Branch) > float64(s.Total)*(1+1e-9) {
		return 0, fmt.Errorf("the branch current %s is larger than the total %s", units.Format(s.Branch), units.Format(s.Total))
	}
	return finite[units.Ratio](f, math.Min(1, float64(s.Branch)/float64(s.Total)))
}
