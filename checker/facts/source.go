package facts

import (
	"math"

	"boardproof/checker/fault"
	"boardproof/checker/spec"
	"boardproof/checker/units"
	"boardproof/checker/working"
)

// end is one end of the fault range, and for the largest current which bound of it.
// They differ only where something optional was not said: a bound that could acquit
// takes the unfavourable extreme, one that could condemn the usual value.
type end int

const (
	largest        end = iota // no fault is larger: what was not said is taken so that the current is largest
	largestAtLeast            // the largest fault is at least this: what was not said is taken as usual
	smallest                  // the smallest, which burns longest
)

// notStated is the source of a value taken as an extreme.
var notStated = working.Source{Status: "not stated; the extreme on the safe side"}

// impedance is resistance and reactance of a branch up to the board, and the pair from
// which its peak follows: another one for a generator, and where a resistance was not
// said and the least damping is assumed.
type impedance struct {
	r, x         working.Result[units.Ohm]
	peakR, peakX working.Result[units.Ohm]
}

// plain is an impedance that also decides the peak.
func plain(r, x working.Result[units.Ohm]) impedance { return impedance{r, x, r, x} }

// conductorTemperature is that of the link when the smallest current flows: warm from
// load. For the largest current it is 20 °C by definition.
const conductorTemperature units.Celsius = 80

// voltageFactor is c at the board.
func (w *walk) voltageFactor(e end) working.Result[units.Ratio] {
	nominal, tolerance := w.nominal().As("U_n"), stated(w, w.board.System.VoltageTolerance, "ΔU")
	if e != smallest {
		return working.Apply2(&fault.VoltageFactorMaxFormula, fault.VoltageFactorMax, nominal, tolerance)
	}
	return working.Apply2(&fault.VoltageFactorMinFormula, fault.VoltageFactorMin, nominal, tolerance)
}

func (w *walk) nominal() working.Result[units.Volt] { return stated(w, w.board.System.Voltage, "U_n") }

// sourceImpedance is the impedance of a source and its link, by kind of source.
func (w *walk) sourceImpedance(s *spec.Entry[spec.Source], e end) impedance {
	kind := s.Value.Kind
	if !kind.Said() {
		return lacking(w.lack(kind.At))
	}
	var z impedance
	switch kind.Value {
	case spec.SourceKindTransformer:
		z = w.transformerBranch(&s.Value, e)
	case spec.SourceKindUtilitySupply:
		z = w.utilityBranch(&s.Value, e)
	case spec.SourceKindGenerator:
		z = w.generatorBranch(&s.Value, e)
	default:
		return lacking(capability("short-circuit current of "+s.Name+", a source of the kind "+kind.Value.Text(), s.Place))
	}
	return w.behindLink(z, &s.Value, e)
}

func lacking(l working.Lack) impedance {
	return plain(working.Lacking[units.Ohm](l), working.Lacking[units.Ohm](l))
}

// transformerBranch is the feeding network and the transformer, seen from the
// low-voltage side.
func (w *walk) transformerBranch(s *spec.Source, e end) impedance {
	rating := stated(w, s.Rating, "S_rT")
	low := w.fitting(s.Secondary, "U_rT", w.nominal(), 0.85, 1.15)
	network := w.networkBehind(s, low, e)

	uk := stated(w, s.Impedance.Value, "u_kr")
	if !s.Impedance.Measured.Said() {
		tolerance := working.Apply1(&fault.ImpedanceToleranceFormula, fault.ImpedanceTolerance, uk)
		f, limit := &fault.SmallestImpedanceFormula, fault.SmallestImpedance
		if e == smallest {
			f, limit = &fault.LargestImpedanceFormula, fault.LargestImpedance
		}
		uk = working.Apply2(f, func(declared, tolerance units.Percentage) (units.Percentage, error) {
			return limit(fault.Toleranced{Declared: declared, Tolerance: tolerance})
		}, uk, tolerance)
	}
	z := working.Apply3(&fault.TransformerImpedanceFormula, fault.TransformerImpedance, uk.As("u_kr"), low, rating)
	r := w.transformerResistance(s, low, rating, e)
	x := working.Apply2(&fault.TransformerReactanceFormula, func(z, r units.Ohm) (units.Ohm, error) {
		return fault.TransformerReactance(fault.TransformerParts{Impedance: z, Resistance: r})
	}, z, r)
	if e != smallest {
		relative := working.Apply3(&fault.RelativeReactanceFormula, fault.RelativeReactance, x, rating, low)
		k := working.Apply2(&fault.TransformerCorrectionFormula, fault.TransformerCorrection, w.voltageFactor(largest), relative)
		r = working.Apply2(&fault.CorrectedResistanceFormula, fault.CorrectedResistance, k, r)
		x = working.Apply2(&fault.CorrectedReactanceFormula, fault.CorrectedReactance, k, x)
	}
	return plain(
		series("R", "resistance of network and transformer", network.r.As("R_Qt"), r.As("R_TK")),
		series("X", "reactance of network and transformer", network.x.As("X_Qt"), x.As("X_TK")),
	)
}

// transformerResistance takes the stated load loss. If none was said it is asked: which resistance makes the current largest depends on everything
// else in the branch. Only the bound that could condemn takes the largest usual loss.
func (w *walk) transformerResistance(s *spec.Source, low working.Result[units.Volt], rating working.Result[units.VoltAmpere], e end) working.Result[units.Ohm] {
	if s.LoadLoss.State != spec.NotSaid {
		return working.Apply3(&fault.TransformerResistanceFromLossFormula, fault.TransformerResistanceFromLoss, stated(w, s.LoadLoss, "P_krT"), low, rating)
	}
	usual, err := fault.TypicalLoadLoss(rating.V())
	if e != largestAtLeast || !rating.Known() || err != nil {
		return working.Lacking[units.Ohm](w.lack(s.LoadLoss.At))
	}
	assumed := working.Assumed(usual.Largest, "P_krT", Name(s.LoadLoss.At), "not stated; the largest usual one", fault.TypicalLoadLossSource)
	return working.Apply3(&fault.TransformerResistanceFromLossFormula, fault.TransformerResistanceFromLoss, assumed, low, rating)
}

// networkBehind is the feeding network seen from the low-voltage side of a
// transformer.
func (w *walk) networkBehind(s *spec.Source, low working.Result[units.Volt], e end) impedance {
	n := &s.Network
	voltage := stated(w, n.Voltage, "U_nQ")
	high := w.fitting(s.Primary, "U_rTHV", voltage, 0.8, 1.25)
	ratio := working.Apply2(&fault.TransformationRatioFormula, func(high, low units.Volt) (units.Ratio, error) {
		return fault.TransformationRatio(fault.RatedVoltages{High: high, Low: low})
	}, high, low.As("U_rTLV"))
	formula, factor := &fault.FeederVoltageFactorMaxFormula, fault.FeederVoltageFactorMax
	if e == smallest {
		formula, factor = &fault.FeederVoltageFactorMinFormula, fault.FeederVoltageFactorMin
	}
	z := w.feeder(n, working.Apply1(formula, factor, voltage).As("c_Q"), voltage, e)
	return plain(
		working.Apply2(&fault.ReferredResistanceFormula, fault.ReferredResistance, z.r.As("R_Q"), ratio),
		working.Apply2(&fault.ReferredReactanceFormula, fault.ReferredReactance, z.x.As("X_Q"), ratio),
	)
}

// feeder is the impedance of a network at its own voltage, from fault level or
// current.
func (w *walk) feeder(n *spec.Network, c working.Result[units.Ratio], voltage working.Result[units.Volt], e end) impedance {
	level, current := n.FaultLevelMax, n.FaultCurrentMax
	if e == smallest {
		level, current = n.FaultLevelMin, n.FaultCurrentMin
	}
	var z working.Result[units.Ohm]
	switch {
	case upsideDown(n.FaultLevelMin, n.FaultLevelMax):
		z = working.Lacking[units.Ohm](w.contradicted(n.FaultLevelMin.At, "the smallest fault level is above the largest"))
	case upsideDown(n.FaultCurrentMin, n.FaultCurrentMax):
		z = working.Lacking[units.Ohm](w.contradicted(n.FaultCurrentMin.At, "the smallest fault current is above the largest"))
	case level.State == spec.NotSaid && current.State == spec.NotSaid:
		z = working.Lacking[units.Ohm](lackOf(w.lack(level.At), w.lack(current.At)))
	default:
		z = w.feederImpedance(level, current, c, voltage)
	}
	if n.RX.State == spec.NotSaid && e == largestAtLeast {
		x := working.Apply1(&fault.FeederReactanceUnstatedFormula, fault.FeederReactanceUnstated, z)
		rx := working.Assumed(fault.FeederROverXUnstated, "R_Q/X_Q", Name(n.RX.At), "not stated; the standard's value for such a network", fault.FeederROverXUnstatedSource)
		return plain(working.Apply2(&fault.FeederResistanceFormula, fault.FeederResistance, x, rx), x)
	}
	// Which angle makes the current largest depends on everything else in the branch, so
	// there is no extreme to take: the ratio is asked.
	rx := stated(w, n.RX, "R_Q/X_Q")
	x := working.Apply2(&fault.FeederReactanceFormula, fault.FeederReactance, z, rx)
	return plain(working.Apply2(&fault.FeederResistanceFormula, fault.FeederResistance, x, rx), x)
}

// feederImpedance follows from fault level or fault current; both together have to say
// the same within 1 %.
func (w *walk) feederImpedance(level spec.Given[units.VoltAmpere], current spec.Given[units.Ampere], c working.Result[units.Ratio], voltage working.Result[units.Volt]) working.Result[units.Ohm] {
	byLevel := working.Apply3(&fault.FeederImpedanceFromPowerFormula, fault.FeederImpedanceFromPower, c, voltage, stated(w, level, "S\"_kQ"))
	byCurrent := working.Apply3(&fault.FeederImpedanceFromCurrentFormula, fault.FeederImpedanceFromCurrent, c, voltage, stated(w, current, "I\"_kQ"))
	switch {
	case current.State == spec.NotSaid:
		return byLevel
	case level.State == spec.NotSaid || !byCurrent.Known():
		return byCurrent
	case byLevel.Known() && math.Abs(float64(byLevel.V()/byCurrent.V())-1) > 0.01:
		return working.Lacking[units.Ohm](w.contradicted(current.At, "fault level and fault current do not say the same"))
	}
	return byLevel
}

func upsideDown[U units.Unit](low, high spec.Given[U]) bool {
	return low.Said() && high.Said() && low.Value > high.Value
}

// contradicted asks for a leaf that speaks against another.
func (w *walk) contradicted(at spec.At, why string) working.Lack {
	l := w.lack(at)
	l.Because = why
	return l
}

// utilityBranch is a supply at low voltage, known by its fault current or level at
// the point of connection.
func (w *walk) utilityBranch(s *spec.Source, e end) impedance {
	return w.feeder(&s.Network, w.voltageFactor(e).As("c_Q"), w.nominal().As("U_nQ"), e)
}

// fitting is a rated voltage that has to be near the voltage of its network. One that
// is not would give an impedance that belongs to another network, so it is asked.
func (w *walk) fitting(g spec.Given[units.Volt], symbol string, to working.Result[units.Volt], low, high float64) working.Result[units.Volt] {
	rated := stated(w, g, symbol)
	if !rated.Known() || !to.Known() {
		return rated
	}
	if ratio := float64(rated.V() / to.V()); ratio >= low && ratio <= high {
		return rated
	}
	l := w.lack(g.At)
	l.Because = units.Format(rated.V()) + " does not fit a network of " + units.Format(to.V())
	return working.Lacking[units.Volt](l)
}

// series adds resistances or reactances that carry the same current.
func series(symbol, name string, parts ...working.Result[units.Ohm]) working.Result[units.Ohm] {
	symbols := make([]string, len(parts))
	operands := make([]working.Operand, len(parts))
	values := make([]units.Ohm, len(parts))
	for i, p := range parts {
		operands[i], values[i] = p, p.V()
		if how := p.How(); how != nil {
			symbols[i] = how.Symbol
		}
	}
	return working.Compute(fault.SeriesFormula(symbol, name, symbols...), func() (units.Ohm, error) { return fault.SeriesOhms(values...) }, operands...)
}
