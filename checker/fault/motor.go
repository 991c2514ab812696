package fault

import (
	"math"

	"boardproof/checker/units"
	"boardproof/checker/working"
)

// R/X of asynchronous motors, IEC 60909-0: a group of low-voltage motors with its cables,
// and high-voltage motors below and from 1 MW per pair of poles.
const (
	LowVoltageMotorROverX   units.Ratio = 0.42
	SmallHighVoltageROverX  units.Ratio = 0.15
	LargeHighVoltageROverX  units.Ratio = 0.10
	RegenerativeDriveROverX units.Ratio = 0.10
)

// RegenerativeDriveMultiple is I_LR/I_rM to be used for a drive that can feed back, during
// the initial current and the peak only.
const RegenerativeDriveMultiple units.Multiple = 3

// UnstatedStartingMultiple is I_LR/I_rM of low-voltage motors whose starting current nobody
// states.
const UnstatedStartingMultiple units.Multiple = 5

// Where the constants of motors come from.
var (
	MotorROverXSource              = iec60909("6.10", seen)
	RegenerativeDriveSource        = iec60909("6.10, static converter drives", fromMemory)
	UnstatedStartingMultipleSource = iec60909("6.10", fromMemory)
)

// Feeding is how a motor is connected while it runs.
type Feeding string

// The ways a motor is fed.
const (
	Direct              Feeding = "direct"
	BypassedSoftStarter Feeding = "soft starter bypassed"
	Converter           Feeding = "converter"
	RegenerativeDrive   Feeding = "regenerative converter"
)

// FeedsFault reports whether a motor fed that way adds to the initial current and the
// peak. A motor behind a one-way converter adds nothing; a bypassed soft starter is no
// obstacle.
// Source: IEC 60909-0 6.10 for converters (from memory, unconfirmed); the bypass is common
// practice, no source.
func (f Feeding) FeedsFault() bool {
	return f == Direct || f == BypassedSoftStarter || f == RegenerativeDrive
}

// MotorApparentPowerFormula is S_rM.
var MotorApparentPowerFormula = working.Formula{
	ID: "fault.motor_apparent_power", Symbol: "S_rM", Name: "rated apparent power of the motor",
	Equation: "{P_rM}/({η}·{cosφ})", Source: iec60909("6.10", recomputed),
	Range: []working.Interval{limits[units.Watt]("P_rM", 1, 1e9), limits[units.Ratio]("η", 0.1, 1), limits[units.Ratio]("cosφ", 0.1, 1)},
}

// MotorRating is efficiency and power factor at rated load.
type MotorRating struct {
	Efficiency, PowerFactor units.Ratio
}

// MotorApparentPower returns the apparent power a motor takes at rated load.
//
//	S_rM = P_rM / (η·cosφ)
//
// Source: IEC 60909-0 6.10; confirmed by testdata/iec60909/tr60909-4.yaml clause 4 (Z_M as
// published).
func MotorApparentPower(power units.Watt, r MotorRating) (units.VoltAmpere, error) {
	f := &MotorApparentPowerFormula
	if err := f.CheckRange(float64(power), float64(r.Efficiency), float64(r.PowerFactor)); err != nil {
		return 0, err
	}
	return finite[units.VoltAmpere](f, float64(power)/(float64(r.Efficiency)*float64(r.PowerFactor)))
}

// RatedCurrentFormula is I_r of a three-phase machine.
var RatedCurrentFormula = working.Formula{
	ID: "fault.rated_current", Symbol: "I_r", Name: "rated current",
	Equation: "{S_r}/(√3·{U_r})", Source: working.Source{Status: identity},
	Range: []working.Interval{powerOf("S_r"), voltageOf("U_r")},
}

// RatedCurrent returns the line current of a three-phase machine at its rating.
//
//	I_r = S_r / (√3·U_r)
//
// Source: definition; confirmed by 1600 kVA at 400 V giving 2309 A.
func RatedCurrent(rating units.VoltAmpere, rated units.Volt) (units.Ampere, error) {
	f := &RatedCurrentFormula
	if err := f.CheckRange(float64(rating), float64(rated)); err != nil {
		return 0, err
	}
	return finite[units.Ampere](f, float64(rating)/(math.Sqrt(3)*float64(rated)))
}

// MotorImpedanceFormula is Z_M.
var MotorImpedanceFormula = working.Formula{
	ID: "fault.motor_impedance", Symbol: "Z_M", Name: "short-circuit impedance of the motor or group of motors",
	Equation: "{U_rM}/(√3·{I_LR/I_rM}·{I_rM})", Source: iec60909("6.10, eq. (26)", recomputed),
	Range: []working.Interval{voltageOf("U_rM"), limits[units.Multiple]("I_LR/I_rM", 1, 20), currentOf("I_rM")},
}

// MotorImpedance returns the impedance of a motor, or of motors in parallel with the sum of
// their rated currents.
//
//	Z_M = U_rM / (√3·(I_LR/I_rM)·I_rM)
//
// Source: IEC 60909-0 6.10; confirmed by testdata/iec60909/tr60909-4.yaml clause 4 and
// reference-cases.yaml C01.
func MotorImpedance(rated units.Volt, starting units.Multiple, current units.Ampere) (units.Ohm, error) {
	f := &MotorImpedanceFormula
	if err := f.CheckRange(float64(rated), float64(starting), float64(current)); err != nil {
		return 0, err
	}
	return finite[units.Ohm](f, float64(rated)/(math.Sqrt(3)*float64(starting)*float64(current)))
}

// MotorReactanceFormula is X_M.
var MotorReactanceFormula = working.Formula{
	ID: "fault.motor_reactance", Symbol: "X_M", Name: "reactance of the motor",
	Equation: "{Z_M}/√(1 + ({R_M/X_M})²)", Source: iec60909("6.10, eq. (27)", recomputed),
	Range: []working.Interval{impedanceOf("Z_M"), rOverXOf("R_M/X_M")},
}

// MotorReactance returns the reactance of a motor from its impedance.
//
//	X_M = Z_M / √(1 + (R_M/X_M)²)
//
// Source: IEC 60909-0 6.10; confirmed by testdata/iec60909/tr60909-4.yaml clause 4.
func MotorReactance(impedance units.Ohm, rOverX units.Ratio) (units.Ohm, error) {
	return reactanceOfImpedance(&MotorReactanceFormula, impedance, rOverX)
}

// MotorResistanceFormula is R_M.
var MotorResistanceFormula = working.Formula{
	ID: "fault.motor_resistance", Symbol: "R_M", Name: "resistance of the motor",
	Equation: "{X_M}·{R_M/X_M}", Source: working.Source{Status: identity},
	Range: []working.Interval{partOf("X_M"), rOverXOf("R_M/X_M")},
}

// MotorResistance returns the resistance of a motor from its reactance.
//
//	R_M = X_M · R_M/X_M
//
// Source: definition; confirmed by testdata/iec60909/tr60909-4.yaml clause 4.
func MotorResistance(reactance units.Ohm, rOverX units.Ratio) (units.Ohm, error) {
	return resistanceOfReactance(&MotorResistanceFormula, reactance, rOverX)
}

// NegligibleMotorCurrentFormula is the sum of rated currents below which motors may be left
// out.
var NegligibleMotorCurrentFormula = working.Formula{
	ID: "fault.negligible_motor_current", Symbol: "ΣI_rM", Name: "rated current of motors that may be left out",
	Equation: "0.01·{I\"_k}", Source: iec60909("6.10", fromMemory), Range: []working.Interval{currentOf("I\"_k")},
	Note: "I\"_k without the motors",
}

// NegligibleMotorCurrent returns the sum of rated motor currents up to which their
// contribution may be left out.
//
//	ΣI_rM = 0.01·I"_k
//
// Source: IEC 60909-0, from memory, unconfirmed; no published case.
func NegligibleMotorCurrent(withoutMotors units.Ampere) (units.Ampere, error) {
	f := &NegligibleMotorCurrentFormula
	if err := f.CheckRange(float64(withoutMotors)); err != nil {
		return 0, err
	}
	return finite[units.Ampere](f, 0.01*float64(withoutMotors))
}
