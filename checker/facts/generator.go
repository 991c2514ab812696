package facts

import (
	"math"

	"boardproof/checker/fault"
	"boardproof/checker/spec"
	"boardproof/checker/units"
	"boardproof/checker/working"
)

// sineFormula is sin φ from the power factor.
var sineFormula = working.Formula{
	ID: "facts.sine", Symbol: "sinφ_rG", Name: "sine of the rated phase angle of the generator",
	Equation: "√(1 − {cosφ_rG}²)", Source: working.Source{Status: "definition"},
	Range: []working.Interval{{Symbol: "cosφ_rG", Low: 0.1, High: 1, Dimension: units.Ratio(0).Dimension()}},
}

func sine(cos units.Ratio) (units.Ratio, error) {
	if err := sineFormula.CheckRange(float64(cos)); err != nil {
		return 0, err
	}
	return units.Ratio(math.Sqrt(1 - float64(cos)*float64(cos))), nil
}

// generatorBranch is the corrected subtransient impedance for the largest current, and
// for the smallest the impedance that brings the sustained current: after its decay a
// generator feeds far less than at first.
func (w *walk) generatorBranch(s *spec.Source, e end) impedance {
	rated := w.fitting(s.Voltage, "U_rG", w.nominal(), 0.85, 1.15)
	rating := stated(w, s.Rating, "S_rG")
	if e == smallest {
		return w.sustainedBranch(s, rated, rating)
	}
	relative := stated(w, s.SubtransientReactance, "x\"_d")
	reactance := working.Apply3(&fault.SubtransientReactanceFormula, fault.SubtransientReactance, relative, rated, rating)
	control := working.Assumed(units.Percentage(0), "p_G", "lasting deviation of the generator's voltage", "none stated", working.Source{Standard: "IEC 60909-0", Clause: "6.6.1"})
	var sin working.Result[units.Ratio]
	switch {
	case s.PowerFactor.State != spec.NotSaid:
		sin = working.Apply1(&sineFormula, sine, stated(w, s.PowerFactor, "cosφ_rG"))
	case e == largest:
		sin = working.Assumed(units.Ratio(1), "sinφ_rG", Name(s.PowerFactor.At), "not stated; taken as 1, which makes the current largest", notStated)
	default:
		sin = working.Assumed(units.Ratio(0), "sinφ_rG", Name(s.PowerFactor.At), "not stated; taken as nought, which makes the current smallest", notStated)
	}
	c, nominal := w.voltageFactor(e).As("c_max"), w.nominal()
	k := working.Compute(&fault.GeneratorCorrectionFormula, func() (units.Ratio, error) {
		return fault.GeneratorCorrection(fault.GeneratorData{
			Nominal: nominal.V(), Rated: rated.V(), Control: control.V(), VoltageFactor: c.V(), Subtransient: relative.V(), SineRated: sin.V(),
		})
	}, nominal.As("U_n"), rated, control, c, relative, sin)
	fictitious := working.Apply2(&fault.GeneratorResistanceFormula, fault.GeneratorResistance, reactance, rated)
	r := fictitious
	if e == largest {
		// R_Gf fits the peak; the true resistance is smaller and lets more current through.
		r = working.Assumed(units.Ohm(0), "R_G", "resistance of the generator", "not stated; taken as nought, which makes the current largest", notStated)
	}
	corrected := func(r working.Result[units.Ohm]) working.Result[units.Ohm] {
		return working.Apply2(&fault.CorrectedGeneratorResistanceFormula, fault.CorrectedGeneratorResistance, k, r.As("R_G"))
	}
	x := working.Apply2(&fault.CorrectedGeneratorReactanceFormula, fault.CorrectedGeneratorReactance, k, reactance)
	return impedance{corrected(r), x, corrected(fictitious), x}
}

// sustainedFormula is the reactance that stands for a generator feeding its sustained
// current.
var sustainedFormula = working.Formula{
	ID: "facts.sustained_reactance", Symbol: "X_k", Name: "reactance that brings the generator's sustained current",
	Equation: "{c}·{U_n}/(√3·{I_k})", Source: working.Source{Status: "definition"},
}

func (w *walk) sustainedBranch(s *spec.Source, rated working.Result[units.Volt], rating working.Result[units.VoltAmpere]) impedance {
	multiple := stated(w, s.SustainedCurrent.Current, "k")
	if s.SustainedCurrent.State == spec.StatedNone {
		l := w.lack(s.SustainedCurrent.At)
		l.Because = "without excitation support the sustained current may fall below the rated current; state its value"
		multiple = working.Lacking[units.Multiple](l)
	}
	current := working.Apply2(&fault.RatedCurrentFormula, fault.RatedCurrent, rating.As("S_r"), rated.As("U_r"))
	sustained := working.Apply2(&fault.SustainedCurrentFormula, fault.SustainedCurrent, multiple, current.As("I_rG"))
	x := working.Apply3(&sustainedFormula, func(c units.Ratio, u units.Volt, i units.Ampere) (units.Ohm, error) {
		return units.Ohm(float64(c) * float64(u) / (math.Sqrt(3) * float64(i))), nil
	}, w.voltageFactor(smallest).As("c"), w.nominal(), sustained)
	r := working.Constant(units.Ohm(0), "R_k", "resistance beside the reactance that stands for the sustained current", working.Source{Status: "definition"})
	return plain(r, x)
}
