package fault

import (
	"math"

	"boardproof/checker/units"
	"boardproof/checker/working"
)

// FeederImpedanceFromPowerFormula is Z_Q from the fault level.
var FeederImpedanceFromPowerFormula = working.Formula{
	ID: "fault.feeder_impedance_from_power", Symbol: "Z_Q", Name: "impedance of the feeding network",
	Equation: "{c_Q}·{U_nQ}²/{S\"_kQ}", Source: iec60909("6.2, eq. (6)", recomputed),
	Range: []working.Interval{factorOf("c_Q"), voltageOf("U_nQ"), powerOf("S\"_kQ")},
	Note:  "c of the feeder's own bus: 1.1 for the largest, 1.0 for the smallest current above 1 kV",
}

// FeederImpedanceFromPower returns the impedance of the feeding network at its own voltage.
//
//	Z_Q = c_Q·U_nQ² / S"_kQ
//
// Source: IEC 60909-0 6.2; confirmed by testdata/iec60909/reference-cases.yaml and
// lv-exercise.yaml.
func FeederImpedanceFromPower(c units.Ratio, nominal units.Volt, faultLevel units.VoltAmpere) (units.Ohm, error) {
	f := &FeederImpedanceFromPowerFormula
	if err := f.CheckRange(float64(c), float64(nominal), float64(faultLevel)); err != nil {
		return 0, err
	}
	return finite[units.Ohm](f, float64(c)*float64(nominal)*float64(nominal)/float64(faultLevel))
}

// FeederImpedanceFromCurrentFormula is Z_Q from the initial short-circuit current.
var FeederImpedanceFromCurrentFormula = working.Formula{
	ID: "fault.feeder_impedance_from_current", Symbol: "Z_Q", Name: "impedance of the feeding network",
	Equation: "{c_Q}·{U_nQ}/(√3·{I\"_kQ})", Source: iec60909("6.2, eq. (6)", recomputed),
	Range: []working.Interval{factorOf("c_Q"), voltageOf("U_nQ"), currentOf("I\"_kQ")},
	Note:  "c of the feeder's own bus: 1.1 for the largest, 1.0 for the smallest current above 1 kV",
}

// FeederImpedanceFromCurrent returns the impedance of the feeding network at its own voltage.
//
//	Z_Q = c_Q·U_nQ / (√3·I"_kQ)
//
// Source: IEC 60909-0 6.2; confirmed by testdata/iec60909/tr60909-4.yaml (Z_Qt of clauses 3
// and 4, as published).
func FeederImpedanceFromCurrent(c units.Ratio, nominal units.Volt, current units.Ampere) (units.Ohm, error) {
	f := &FeederImpedanceFromCurrentFormula
	if err := f.CheckRange(float64(c), float64(nominal), float64(current)); err != nil {
		return 0, err
	}
	return finite[units.Ohm](f, float64(c)*float64(nominal)/(math.Sqrt(3)*float64(current)))
}

// FeederReactanceFormula is X_Q when R_Q/X_Q is stated.
var FeederReactanceFormula = working.Formula{
	ID: "fault.feeder_reactance", Symbol: "X_Q", Name: "reactance of the feeding network",
	Equation: "{Z_Q}/√(1 + ({R_Q/X_Q})²)", Source: iec60909("6.2, eq. (7)", recomputed),
	Range: []working.Interval{impedanceOf("Z_Q"), rOverXOf("R_Q/X_Q")},
}

// FeederReactance returns the reactance of the feeding network from its impedance.
//
//	X_Q = Z_Q / √(1 + (R_Q/X_Q)²)
//
// Source: IEC 60909-0 6.2; confirmed by testdata/iec60909/reference-cases.yaml.
func FeederReactance(impedance units.Ohm, rOverX units.Ratio) (units.Ohm, error) {
	return reactanceOfImpedance(&FeederReactanceFormula, impedance, rOverX)
}

// FeederResistanceFormula is R_Q.
var FeederResistanceFormula = working.Formula{
	ID: "fault.feeder_resistance", Symbol: "R_Q", Name: "resistance of the feeding network",
	Equation: "{X_Q}·{R_Q/X_Q}", Source: working.Source{Status: identity},
	Range: []working.Interval{partOf("X_Q"), rOverXOf("R_Q/X_Q")},
}

// FeederResistance returns the resistance of the feeding network from its reactance.
//
//	R_Q = X_Q · R_Q/X_Q
//
// Source: definition; confirmed by testdata/iec60909/reference-cases.yaml.
func FeederResistance(reactance units.Ohm, rOverX units.Ratio) (units.Ohm, error) {
	return resistanceOfReactance(&FeederResistanceFormula, reactance, rOverX)
}

// FeederReactanceUnstatedFormula is X_Q when nobody states R_Q/X_Q.
var FeederReactanceUnstatedFormula = working.Formula{
	ID: "fault.feeder_reactance_unstated", Symbol: "X_Q", Name: "reactance of the feeding network",
	Equation: "0.995·{Z_Q}", Source: iec60909("6.2", recomputed),
	Range: []working.Interval{impedanceOf("Z_Q")}, Note: "the standard's values for a network whose R/X is not known",
}

// FeederReactanceUnstated returns the reactance of a feeding network whose R/X is not known.
//
//	X_Q = 0.995·Z_Q
//
// Source: IEC 60909-0 6.2; confirmed by testdata/iec60909/tr60909-4.yaml (Z_Qt as published).
func FeederReactanceUnstated(impedance units.Ohm) (units.Ohm, error) {
	f := &FeederReactanceUnstatedFormula
	if err := f.CheckRange(float64(impedance)); err != nil {
		return 0, err
	}
	return finite[units.Ohm](f, 0.995*float64(impedance))
}

// FeederROverXUnstated is R_Q/X_Q of a feeding network whose ratio is not known, to go with
// [FeederReactanceUnstated].
const FeederROverXUnstated units.Ratio = 0.1

// FeederROverXUnstatedSource says where [FeederROverXUnstated] comes from.
var FeederROverXUnstatedSource = iec60909("6.2", recomputed)

// TransformationRatioFormula is t_r.
var TransformationRatioFormula = working.Formula{
	ID: "fault.transformation_ratio", Symbol: "t_r", Name: "rated transformation ratio",
	Equation: "{U_rTHV}/{U_rTLV}", Source: iec60909("6.2", recomputed),
	Range: []working.Interval{voltageOf("U_rTHV"), voltageOf("U_rTLV")},
}

// RatedVoltages are the rated voltages of the two windings of a transformer.
type RatedVoltages struct {
	High, Low units.Volt
}

// TransformationRatio returns the ratio of the rated voltages of a transformer.
//
//	t_r = U_rTHV / U_rTLV
//
// Source: IEC 60909-0 6.2; confirmed by testdata/iec60909/tr60909-4.yaml.
func TransformationRatio(v RatedVoltages) (units.Ratio, error) {
	f := &TransformationRatioFormula
	if err := f.CheckRange(float64(v.High), float64(v.Low)); err != nil {
		return 0, err
	}
	return finite[units.Ratio](f, float64(v.High)/float64(v.Low))
}

// ReferredResistanceFormula and ReferredReactanceFormula are the parts of Z_Q seen from the
// low-voltage side.
var (
	ReferredResistanceFormula = working.Formula{
		ID: "fault.referred_resistance", Symbol: "R_Qt", Name: "resistance of the feeding network, low-voltage side",
		Equation: "{R_Q}/{t_r}²", Source: iec60909("6.2, eq. (6)", recomputed),
		Range: []working.Interval{partOf("R_Q"), limits[units.Ratio]("t_r", 1e-3, 1e4)},
	}
	ReferredReactanceFormula = working.Formula{
		ID: "fault.referred_reactance", Symbol: "X_Qt", Name: "reactance of the feeding network, low-voltage side",
		Equation: "{X_Q}/{t_r}²", Source: iec60909("6.2, eq. (6)", recomputed),
		Range: []working.Interval{partOf("X_Q"), limits[units.Ratio]("t_r", 1e-3, 1e4)},
	}
)

// ReferredResistance returns a resistance seen through a transformer.
//
//	R_Qt = R_Q / t_r²
//
// Source: IEC 60909-0 6.2; confirmed by testdata/iec60909/tr60909-4.yaml.
func ReferredResistance(resistance units.Ohm, ratio units.Ratio) (units.Ohm, error) {
	return referred(&ReferredResistanceFormula, resistance, ratio)
}

// ReferredReactance returns a reactance seen through a transformer.
//
//	X_Qt = X_Q / t_r²
//
// Source: IEC 60909-0 6.2; confirmed by testdata/iec60909/tr60909-4.yaml.
func ReferredReactance(reactance units.Ohm, ratio units.Ratio) (units.Ohm, error) {
	return referred(&ReferredReactanceFormula, reactance, ratio)
}

func referred(f *working.Formula, part units.Ohm, ratio units.Ratio) (units.Ohm, error) {
	if err := f.CheckRange(float64(part), float64(ratio)); err != nil {
		return 0, err
	}
	return finite[units.Ohm](f, float64(part)/(float64(ratio)*float64(ratio)))
}

// ReferredCurrentFormula is the current in the lines on the high-voltage side.
var ReferredCurrentFormula = working.Formula{
	ID: "fault.referred_current", Symbol: "I_HV", Name: "current on the high-voltage side",
	Equation: "{I_LV}/{t_r}", Source: working.Source{Status: identity},
	Range: []working.Interval{currentOf("I_LV"), limits[units.Ratio]("t_r", 1e-3, 1e4)},
	Note:  "three-phase faults only: through a Dyn winding a line-to-earth current appears at 1/√3, a line-to-line current at 1.0 in one line",
}

// ReferredCurrent returns the current that a three-phase current on the low-voltage side
// makes on the high-voltage side.
//
//	I_HV = I_LV / t_r
//
// Source: definition of the ratio; confirmed by 41.8 kA at 400 V giving 1520 A at 11 kV.
func ReferredCurrent(current units.Ampere, ratio units.Ratio) (units.Ampere, error) {
	f := &ReferredCurrentFormula
	if err := f.CheckRange(float64(current), float64(ratio)); err != nil {
		return 0, err
	}
	return finite[units.Ampere](f, float64(current)/float64(ratio))
}

// reactanceOfImpedance splits an impedance by its R/X.
func reactanceOfImpedance(f *working.Formula, impedance units.Ohm, rOverX units.Ratio) (units.Ohm, error) {
	if err := f.CheckRange(float64(impedance), float64(rOverX)); err != nil {
		return 0, err
	}
	return finite[units.Ohm](f, float64(impedance)/math.Hypot(1, float64(rOverX)))
}

func resistanceOfReactance(f *working.Formula, reactance units.Ohm, rOverX units.Ratio) (units.Ohm, error) {
	if err := f.CheckRange(float64(reactance), float64(rOverX)); err != nil {
		return 0, err
	}
	return finite[units.Ohm](f, float64(reactance)*float64(rOverX))
}
