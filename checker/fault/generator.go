package fault

import (
	"boardproof/checker/units"
	"boardproof/checker/working"
)

// SubtransientReactanceFormula is X"_d.
var SubtransientReactanceFormula = working.Formula{
	ID: "fault.subtransient_reactance", Symbol: "X\"_d", Name: "subtransient reactance of the generator",
	Equation: "{x\"_d}·{U_rG}²/{S_rG}", Source: iec60909("6.6.1", recomputed),
	Range: []working.Interval{limits[units.Percentage]("x\"_d", 0.01, 1), voltageOf("U_rG"), powerOf("S_rG")},
}

// SubtransientReactance returns the subtransient reactance of a generator.
//
//	X"_d = x"_d·U_rG² / S_rG
//
// Source: IEC 60909-0 6.6.1; confirmed by own-cross-check.yaml only.
func SubtransientReactance(relative units.Percentage, rated units.Volt, rating units.VoltAmpere) (units.Ohm, error) {
	return shareOfBase(&SubtransientReactanceFormula, relative, rated, rating)
}

// GeneratorCorrectionFormula is K_G.
var GeneratorCorrectionFormula = working.Formula{
	ID: "fault.generator_correction", Symbol: "K_G", Name: "correction factor of the generator",
	Equation: "{U_n}/({U_rG}·(1 + {p_G}))·{c_max}/(1 + {x\"_d}·{sinφ_rG})", Source: iec60909("6.6.1, eq. (18)", seen),
	Range: []working.Interval{
		voltageOf("U_n"), voltageOf("U_rG"), limits[units.Percentage]("p_G", 0, 0.15), factorOf("c_max"),
		limits[units.Percentage]("x\"_d", 0.01, 1), limits[units.Ratio]("sinφ_rG", 0, 1),
	},
	Note: "p_G only if the terminal voltage differs from the rated one for long",
}

// GeneratorData is what K_G follows from, in the order of the operands.
type GeneratorData struct {
	Nominal, Rated units.Volt       // U_n of the network, U_rG of the generator
	Control        units.Percentage // p_G, lasting deviation of the terminal voltage; nought if none
	VoltageFactor  units.Ratio      // c_max
	Subtransient   units.Percentage // x"_d
	SineRated      units.Ratio      // sinφ_rG: 0.6 at a power factor of 0.8
}

// GeneratorCorrection returns the correction factor of a generator without unit transformer.
//
//	K_G = U_n/(U_rG·(1 + p_G)) · c_max/(1 + x"_d·sinφ_rG)
//
// Source: IEC 60909-0 6.6.1, seen in two published sources; confirmed by
// own-cross-check.yaml only.
func GeneratorCorrection(g GeneratorData) (units.Ratio, error) {
	f := &GeneratorCorrectionFormula
	if err := f.CheckRange(float64(g.Nominal), float64(g.Rated), float64(g.Control), float64(g.VoltageFactor), float64(g.Subtransient), float64(g.SineRated)); err != nil {
		return 0, err
	}
	voltage := float64(g.Nominal) / (float64(g.Rated) * (1 + float64(g.Control)))
	return finite[units.Ratio](f, voltage*float64(g.VoltageFactor)/(1+float64(g.Subtransient)*float64(g.SineRated)))
}

// GeneratorResistanceFormula is R_Gf.
var GeneratorResistanceFormula = working.Formula{
	ID: "fault.generator_resistance", Symbol: "R_Gf", Name: "fictitious resistance of the generator",
	Equation: "0.15·{X\"_d} for {U_rG} ≤ 1 kV", Source: iec60909("6.6.1", seen),
	Range: []working.Interval{partOf("X\"_d"), limits[units.Volt]("U_rG", 1, 1000)},
	Note:  "fitted to the decay of the d.c. component: meant for the peak; its use for I\"_k lowers the current by 1.1 %",
}

// GeneratorResistance returns the fictitious resistance of a low-voltage generator, with
// which its peak current comes out right.
//
//	R_Gf = 0.15·X"_d  for U_rG ≤ 1 kV
//
// Source: IEC 60909-0 6.6.1, seen in two published sources; confirmed by κ = 1.645 in
// testdata/iec60909/peak-and-heat.yaml.
func GeneratorResistance(subtransient units.Ohm, rated units.Volt) (units.Ohm, error) {
	f := &GeneratorResistanceFormula
	if err := f.CheckRange(float64(subtransient), float64(rated)); err != nil {
		return 0, err
	}
	return finite[units.Ohm](f, 0.15*float64(subtransient))
}

// CorrectedGeneratorResistanceFormula and CorrectedGeneratorReactanceFormula are the parts
// of Z_GK.
var (
	CorrectedGeneratorResistanceFormula = working.Formula{
		ID: "fault.corrected_generator_resistance", Symbol: "R_GK", Name: "resistance of the generator, corrected",
		Equation: "{K_G}·{R_G}", Source: iec60909("6.6.1, eq. (17)", seen),
		Range: []working.Interval{correctionOf("K_G"), partOf("R_G")},
	}
	CorrectedGeneratorReactanceFormula = working.Formula{
		ID: "fault.corrected_generator_reactance", Symbol: "X_GK", Name: "reactance of the generator, corrected",
		Equation: "{K_G}·{X\"_d}", Source: iec60909("6.6.1, eq. (17)", seen),
		Range: []working.Interval{correctionOf("K_G"), partOf("X\"_d")},
	}
)

// CorrectedGeneratorResistance returns the resistance of a generator for the largest current.
//
//	R_GK = K_G·R_G
//
// Source: IEC 60909-0 6.6.1; confirmed by own-cross-check.yaml only.
func CorrectedGeneratorResistance(factor units.Ratio, resistance units.Ohm) (units.Ohm, error) {
	return corrected(&CorrectedGeneratorResistanceFormula, factor, resistance)
}

// CorrectedGeneratorReactance returns the reactance of a generator for the largest current.
//
//	X_GK = K_G·X"_d
//
// Source: IEC 60909-0 6.6.1; confirmed by own-cross-check.yaml only.
func CorrectedGeneratorReactance(factor units.Ratio, reactance units.Ohm) (units.Ohm, error) {
	return corrected(&CorrectedGeneratorReactanceFormula, factor, reactance)
}

var multipleRange = limits[units.Multiple]("k", 0, 20)

// SustainedCurrentFormula is I_k of a generator with excitation support.
var SustainedCurrentFormula = working.Formula{
	ID: "fault.sustained_current", Symbol: "I_k", Name: "sustained short-circuit current of the generator",
	Equation: "{k}·{I_rG}", Source: working.Source{Status: "declared by the generator's maker"},
	Range: []working.Interval{multipleRange, currentOf("I_rG")},
	Note:  "after the decay of 0.1 to 0.3 s; without excitation support it may fall below the rated current",
}

// SustainedCurrent returns the current a generator holds after its decay.
//
//	I_k = k·I_rG
//
// Source: the maker's declared multiple; confirmed by own-cross-check.yaml only (3.46 kA).
func SustainedCurrent(multiple units.Multiple, rated units.Ampere) (units.Ampere, error) {
	return timesRated(&SustainedCurrentFormula, multiple, rated)
}

// ConverterCurrentFormula is the constant current of a source behind a full converter.
var ConverterCurrentFormula = working.Formula{
	ID: "fault.converter_current", Symbol: "I\"_kPF", Name: "short-circuit current of the converter",
	Equation: "{k}·{I_r}", Source: iec60909("6.9 and 7.2", fromMemory),
	Range: []working.Interval{multipleRange, currentOf("I_r")},
	Note:  "added in amount for the largest current, left out for the smallest",
}

// ConverterCurrent returns the current that an inverter feeds into a fault. It counts in
// the largest current, added in amount, and is left out of the smallest.
//
//	I"_kPF = k·I_r
//
// Source: IEC 60909-0:2016, full-size converters, from memory, unconfirmed; no published
// case.
func ConverterCurrent(multiple units.Multiple, rated units.Ampere) (units.Ampere, error) {
	return timesRated(&ConverterCurrentFormula, multiple, rated)
}

func timesRated(f *working.Formula, multiple units.Multiple, rated units.Ampere) (units.Ampere, error) {
	if err := f.CheckRange(float64(multiple), float64(rated)); err != nil {
		return 0, err
	}
	return finite[units.Ampere](f, float64(multiple)*float64(rated))
}
