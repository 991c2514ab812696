package fault

import (
	"errors"
	"fmt"
	"math"
	"math/cmplx"
	"strings"

	"boardproof/checker/units"
	"boardproof/checker/working"
)

// Impedance is resistance and reactance of one branch, both not negative.
type Impedance struct {
	Resistance, Reactance units.Ohm
}

func (z Impedance) complex() complex128 {
	return complex(float64(z.Resistance), float64(z.Reactance))
}

// Symbols are the symbols of the two parts of an impedance on a worksheet.
type Symbols struct {
	Resistance, Reactance string
}

var errNoBranch = errors.New("at least one branch is needed")

// MagnitudeFormula is |Z|.
var MagnitudeFormula = working.Formula{
	ID: "fault.magnitude", Symbol: "Z", Name: "impedance", Equation: "√({R}² + {X}²)",
	Source: working.Source{Status: identity}, Range: []working.Interval{partOf("R"), partOf("X")},
}

// Magnitude returns the amount of an impedance.
//
//	Z = √(R² + X²)
//
// Source: definition; confirmed by a 3-4-5 triangle.
func Magnitude(z Impedance) (units.Ohm, error) {
	if err := MagnitudeFormula.CheckRange(float64(z.Resistance), float64(z.Reactance)); err != nil {
		return 0, err
	}
	return finite[units.Ohm](&MagnitudeFormula, cmplx.Abs(z.complex()))
}

// ROverXFormula is R/X at the fault location or of a branch.
var ROverXFormula = working.Formula{
	ID: "fault.r_over_x", Symbol: "R/X", Name: "ratio of resistance to reactance", Equation: "{R}/{X}",
	Source: working.Source{Status: identity}, Range: []working.Interval{partOf("R"), impedanceOf("X")},
}

// ROverX returns the ratio of resistance to reactance.
//
//	R/X = R / X
//
// Valid for X > 0. Source: definition; confirmed by the ip values of
// testdata/iec60909/reference-cases.yaml.
func ROverX(z Impedance) (units.Ratio, error) {
	if err := ROverXFormula.CheckRange(float64(z.Resistance), float64(z.Reactance)); err != nil {
		return 0, err
	}
	return finite[units.Ratio](&ROverXFormula, float64(z.Resistance)/float64(z.Reactance))
}

// SeriesFormula is the sum of resistances, or of reactances, that carry the same current.
// The result has the given symbol and name, the operands the given symbols.
func SeriesFormula(symbol, name string, operands ...string) *working.Formula {
	return &working.Formula{
		ID: "fault.series", Symbol: symbol, Name: name, Equation: "{" + strings.Join(operands, "} + {") + "}",
		Source: working.Source{Status: identity},
	}
}

// SeriesOhms returns the sum of resistances, or of reactances, in series.
//
//	R = R_1 + R_2 + …
//
// Each part from 0 to 1 MΩ. Source: definition; confirmed by
// testdata/iec60909/reference-cases.yaml.
func SeriesOhms(parts ...units.Ohm) (units.Ohm, error) {
	if len(parts) == 0 {
		return 0, errNoBranch
	}
	part := working.Formula{Range: []working.Interval{partOf("a part of the sum")}}
	sum := 0.0
	for _, p := range parts {
		if err := part.CheckRange(float64(p)); err != nil {
			return 0, err
		}
		sum += float64(p)
	}
	return finite[units.Ohm](SeriesFormula("R", ""), sum)
}

// ParallelResistanceFormula is the resistance of branches in parallel.
func ParallelResistanceFormula(symbol, name string, branches ...Symbols) *working.Formula {
	return parallelFormula("fault.parallel_resistance", symbol, name, "Re", branches)
}

// ParallelReactanceFormula is the reactance of branches in parallel.
func ParallelReactanceFormula(symbol, name string, branches ...Symbols) *working.Formula {
	return parallelFormula("fault.parallel_reactance", symbol, name, "Im", branches)
}

func parallelFormula(id, symbol, name, part string, branches []Symbols) *working.Formula {
	terms := make([]string, len(branches))
	for i, b := range branches {
		terms[i] = fmt.Sprintf("1/({%s} + j·{%s})", b.Resistance, b.Reactance)
	}
	return &working.Formula{
		ID: id, Symbol: symbol, Name: name, Equation: part + " 1/(" + strings.Join(terms, " + ") + ")",
		Source: working.Source{Status: identity},
	}
}

// ParallelResistance returns the resistance of branches in parallel between the same two
// points.
//
//	R = Re 1/Σ 1/(R_i + j·X_i)
//
// No branch may be without impedance. Source: definition; confirmed by the parallel case
// D01 of testdata/iec60909/reference-cases.yaml and by testdata/iec60909/tr60909-4.yaml.
func ParallelResistance(branches ...Impedance) (units.Ohm, error) {
	z, err := parallel(branches)
	return units.Ohm(real(z)), err
}

// ParallelReactance returns the reactance of branches in parallel between the same two
// points.
//
//	X = Im 1/Σ 1/(R_i + j·X_i)
//
// Source and confirmation as for [ParallelResistance].
func ParallelReactance(branches ...Impedance) (units.Ohm, error) {
	z, err := parallel(branches)
	return units.Ohm(imag(z)), err
}

func parallel(branches []Impedance) (complex128, error) {
	if len(branches) == 0 {
		return 0, errNoBranch
	}
	var admittance complex128
	for _, b := range branches {
		amount, err := Magnitude(b)
		if err != nil {
			return 0, err
		}
		if amount < 1e-9 {
			return 0, errors.New("a branch without impedance cannot stand in parallel")
		}
		admittance += 1 / b.complex()
	}
	z := 1 / admittance
	if cmplx.IsNaN(z) || cmplx.IsInf(z) {
		return 0, errors.New("the parallel impedance is not a finite number for these inputs")
	}
	// An admittance in the fourth quadrant gives an impedance in the first; what is below
	// nought is rounding.
	return complex(math.Max(0, real(z)), math.Max(0, imag(z))), nil
}
