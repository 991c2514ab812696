package fault

import (
	"errors"
	"math"

	"boardproof/checker/units"
	"boardproof/checker/working"
)

func relativeImpedanceOf(symbol string) working.Interval {
	return limits[units.Percentage](symbol, 0.001, 0.30)
}

// TransformerImpedanceFormula is Z_T.
var TransformerImpedanceFormula = working.Formula{
	ID: "fault.transformer_impedance", Symbol: "Z_T", Name: "impedance of the transformer",
	Equation: "{u_kr}·{U_rT}²/{S_rT}", Source: iec60909("6.3.1, eq. (7)", recomputed),
	Range: []working.Interval{relativeImpedanceOf("u_kr"), voltageOf("U_rT"), powerOf("S_rT")},
}

// TransformerImpedance returns the impedance of a two-winding transformer on the side whose
// rated voltage is given.
//
//	Z_T = u_kr·U_rT² / S_rT
//
// Source: IEC 60909-0 6.3.1; confirmed by testdata/iec60909/tr60909-4.yaml (Z_TK as
// published) and fault-levels.yaml.
func TransformerImpedance(impedance units.Percentage, rated units.Volt, rating units.VoltAmpere) (units.Ohm, error) {
	return shareOfBase(&TransformerImpedanceFormula, impedance, rated, rating)
}

// TransformerResistanceFromShareFormula is R_T from u_Rr.
var TransformerResistanceFromShareFormula = working.Formula{
	ID: "fault.transformer_resistance_from_share", Symbol: "R_T", Name: "resistance of the transformer",
	Equation: "{u_Rr}·{U_rT}²/{S_rT}", Source: iec60909("6.3.1, eq. (8)", recomputed),
	Range: []working.Interval{limits[units.Percentage]("u_Rr", 0, 0.1), voltageOf("U_rT"), powerOf("S_rT")},
}

// TransformerResistanceFromShare returns the resistance of a transformer from the resistive
// part of its short-circuit voltage.
//
//	R_T = u_Rr·U_rT² / S_rT
//
// Source: IEC 60909-0 6.3.1; confirmed by testdata/iec60909/tr60909-4.yaml clause 4.
func TransformerResistanceFromShare(share units.Percentage, rated units.Volt, rating units.VoltAmpere) (units.Ohm, error) {
	return shareOfBase(&TransformerResistanceFromShareFormula, share, rated, rating)
}

func shareOfBase(f *working.Formula, share units.Percentage, rated units.Volt, rating units.VoltAmpere) (units.Ohm, error) {
	if err := f.CheckRange(float64(share), float64(rated), float64(rating)); err != nil {
		return 0, err
	}
	return finite[units.Ohm](f, float64(share)*float64(rated)*float64(rated)/float64(rating))
}

// TransformerResistanceFromLossFormula is R_T from the load loss.
var TransformerResistanceFromLossFormula = working.Formula{
	ID: "fault.transformer_resistance_from_loss", Symbol: "R_T", Name: "resistance of the transformer",
	Equation: "{P_krT}·{U_rT}²/{S_rT}²", Source: iec60909("6.3.1, eq. (8)", recomputed),
	Range: []working.Interval{limits[units.Watt]("P_krT", 0, 10e6), voltageOf("U_rT"), powerOf("S_rT")},
}

// TransformerResistanceFromLoss returns the resistance of a transformer from its load loss
// at rated current.
//
//	R_T = P_krT·U_rT² / S_rT²
//
// Source: IEC 60909-0 6.3.1; confirmed by testdata/iec60909/tr60909-4.yaml clause 3 and
// reference-cases.yaml.
func TransformerResistanceFromLoss(loss units.Watt, rated units.Volt, rating units.VoltAmpere) (units.Ohm, error) {
	f := &TransformerResistanceFromLossFormula
	if err := f.CheckRange(float64(loss), float64(rated), float64(rating)); err != nil {
		return 0, err
	}
	perVolt := float64(rated) / float64(rating)
	return finite[units.Ohm](f, float64(loss)*perVolt*perVolt)
}

// TransformerReactanceFormula is X_T.
var TransformerReactanceFormula = working.Formula{
	ID: "fault.transformer_reactance", Symbol: "X_T", Name: "reactance of the transformer",
	Equation: "√({Z_T}² − {R_T}²)", Source: iec60909("6.3.1, eq. (9)", recomputed),
	Range: []working.Interval{impedanceOf("Z_T"), partOf("R_T")},
}

// TransformerParts are what the reactance of a transformer follows from.
type TransformerParts struct {
	Impedance, Resistance units.Ohm
}

// TransformerReactance returns the reactance of a transformer. The resistance must be
// smaller than the impedance.
//
//	X_T = √(Z_T² − R_T²)
//
// Source: IEC 60909-0 6.3.1; confirmed by testdata/iec60909/tr60909-4.yaml.
func TransformerReactance(p TransformerParts) (units.Ohm, error) {
	f := &TransformerReactanceFormula
	if err := f.CheckRange(float64(p.Impedance), float64(p.Resistance)); err != nil {
		return 0, err
	}
	if p.Resistance >= p.Impedance {
		return 0, errors.New("the resistance R_T " + units.Format(p.Resistance) + " is not smaller than the impedance Z_T " + units.Format(p.Impedance))
	}
	z, r := float64(p.Impedance), float64(p.Resistance)
	return finite[units.Ohm](f, math.Sqrt((z-r)*(z+r)))
}

// RelativeReactanceFormula is x_T.
var RelativeReactanceFormula = working.Formula{
	ID: "fault.relative_reactance", Symbol: "x_T", Name: "relative reactance of the transformer",
	Equation: "{X_T}·{S_rT}/{U_rT}²", Source: iec60909("6.3.3", recomputed),
	Range: []working.Interval{partOf("X_T"), powerOf("S_rT"), voltageOf("U_rT")},
}

// RelativeReactance returns the reactance of a transformer related to its rating.
//
//	x_T = X_T·S_rT / U_rT²
//
// Source: IEC 60909-0 6.3.3; confirmed by testdata/iec60909/tr60909-4.yaml (Z_TK).
func RelativeReactance(reactance units.Ohm, rating units.VoltAmpere, rated units.Volt) (units.Percentage, error) {
	f := &RelativeReactanceFormula
	if err := f.CheckRange(float64(reactance), float64(rating), float64(rated)); err != nil {
		return 0, err
	}
	return finite[units.Percentage](f, float64(reactance)*float64(rating)/(float64(rated)*float64(rated)))
}

// TransformerCorrectionFormula is K_T.
var TransformerCorrectionFormula = working.Formula{
	ID: "fault.transformer_correction", Symbol: "K_T", Name: "correction factor of the transformer",
	Equation: "0.95·{c_max}/(1 + 0.6·{x_T})", Source: iec60909("6.3.3, eq. (12a)", recomputed),
	Range: []working.Interval{factorOf("c_max"), limits[units.Percentage]("x_T", 0, 0.30)},
	Note:  "used for the largest current only; c_max of the low-voltage side",
}

// TransformerCorrection returns the correction factor of a network transformer. It belongs
// to the largest currents only (6.3.3 of the edition of 2016, seen indirectly).
//
//	K_T = 0.95·c_max / (1 + 0.6·x_T)
//
// Source: IEC 60909-0 6.3.3; confirmed by testdata/iec60909/tr60909-4.yaml (Z_TK as
// published).
func TransformerCorrection(cMax units.Ratio, relativeReactance units.Percentage) (units.Ratio, error) {
	f := &TransformerCorrectionFormula
	if err := f.CheckRange(float64(cMax), float64(relativeReactance)); err != nil {
		return 0, err
	}
	return finite[units.Ratio](f, 0.95*float64(cMax)/(1+0.6*float64(relativeReactance)))
}

func correctionOf(symbol string) working.Interval {
	return limits[units.Ratio](symbol, 0.5, 1.5)
}

// CorrectedResistanceFormula and CorrectedReactanceFormula are the parts of Z_TK.
var (
	CorrectedResistanceFormula = working.Formula{
		ID: "fault.corrected_resistance", Symbol: "R_TK", Name: "resistance of the transformer, corrected",
		Equation: "{K_T}·{R_T}", Source: iec60909("6.3.3", recomputed),
		Range: []working.Interval{correctionOf("K_T"), partOf("R_T")},
	}
	CorrectedReactanceFormula = working.Formula{
		ID: "fault.corrected_reactance", Symbol: "X_TK", Name: "reactance of the transformer, corrected",
		Equation: "{K_T}·{X_T}", Source: iec60909("6.3.3", recomputed),
		Range: []working.Interval{correctionOf("K_T"), partOf("X_T")},
	}
)

// CorrectedResistance returns the resistance of a transformer for the largest current.
//
//	R_TK = K_T·R_T
//
// Source: IEC 60909-0 6.3.3; confirmed by testdata/iec60909/tr60909-4.yaml.
func CorrectedResistance(factor units.Ratio, resistance units.Ohm) (units.Ohm, error) {
	return corrected(&CorrectedResistanceFormula, factor, resistance)
}

// CorrectedReactance returns the reactance of a transformer for the largest current.
//
//	X_TK = K_T·X_T
//
// Source: IEC 60909-0 6.3.3; confirmed by testdata/iec60909/tr60909-4.yaml.
func CorrectedReactance(factor units.Ratio, reactance units.Ohm) (units.Ohm, error) {
	return corrected(&CorrectedReactanceFormula, factor, reactance)
}

func corrected(f *working.Formula, factor units.Ratio, part units.Ohm) (units.Ohm, error) {
	if err := f.CheckRange(float64(factor), float64(part)); err != nil {
		return 0, err
	}
	return finite[units.Ohm](f, float64(factor)*float64(part))
}
