package facts

import (
	"boardproof/checker/fault"
	"boardproof/checker/units"
	"boardproof/checker/working"
)

// branch is what one source or motor sends into a fault at the board.
type branch struct {
	name    string
	current working.Result[units.Ampere]
	rOverX  working.Result[units.Ratio]
	peak    working.Result[units.Ampere]
}

// branchOf chains c·Un/(√3·Z), R/X, κ and the peak for one impedance.
func (w *walk) branchOf(name string, z impedance, e end) branch {
	c, nominal := w.voltageFactor(e).As("c"), w.nominal()
	r, x := z.r.As("R_k").In(name), z.x.As("X_k").In(name)
	current := working.Compute(&fault.InitialCurrentFormula, func() (units.Ampere, error) {
		return fault.InitialCurrent(c.V(), nominal.V(), fault.Impedance{Resistance: r.V(), Reactance: x.V()})
	}, c, nominal, r, x).In(name)
	ratio := working.Apply2(&fault.ROverXFormula, func(r, x units.Ohm) (units.Ratio, error) {
		return fault.ROverX(fault.Impedance{Resistance: r, Reactance: x})
	}, z.peakR.As("R").In(name), z.peakX.As("X").In(name)).In(name)
	kappa := working.Apply1(&fault.PeakFactorFormula, fault.PeakFactor, ratio)
	peak := working.Apply2(&fault.PeakCurrentFormula, fault.PeakCurrent, kappa, current).In(name)
	return branch{name, current, ratio, peak}
}

// totalCurrent adds branch currents as complex numbers.
func totalCurrent(branches []branch) working.Result[units.Ampere] {
	if len(branches) == 1 {
		return branches[0].current
	}
	symbols := make([]fault.BranchSymbols, len(branches))
	values := make([]fault.BranchCurrent, len(branches))
	var operands []working.Operand
	for i, b := range branches {
		symbols[i] = fault.BranchSymbols{Current: "I\"_k " + b.name, ROverX: "R/X " + b.name}
		operands = append(operands, b.current.As(symbols[i].Current), b.rOverX.As(symbols[i].ROverX))
		values[i] = fault.BranchCurrent{Current: b.current.V(), ROverX: b.rOverX.V()}
	}
	f := fault.TotalCurrentFormula("I\"_k", "initial symmetrical short-circuit current of all branches", symbols...)
	return working.Compute(f, func() (units.Ampere, error) { return fault.TotalCurrent(values...) }, operands...)
}

// boundOfCurrent is a total that is not exceeded: the complex sum, or the plain sum
// where a branch rests on an extreme whose angle may be another one.
func boundOfCurrent(branches []branch) working.Result[units.Ampere] {
	assumed := false
	for _, b := range branches {
		b.current.How().Walk(func(w *working.Working) { assumed = assumed || w.Source == notStated })
	}
	if !assumed || len(branches) == 1 {
		return totalCurrent(branches)
	}
	return othersCurrent(branches, -1).As("I\"_k")
}

// totalPeak adds the peaks of the branches, which is never less than the true peak.
func totalPeak(branches []branch) working.Result[units.Ampere] {
	if len(branches) == 1 {
		return branches[0].peak
	}
	symbols := make([]string, len(branches))
	values := make([]units.Ampere, len(branches))
	operands := make([]working.Operand, len(branches))
	for i, b := range branches {
		symbols[i] = "i_p " + b.name
		operands[i], values[i] = b.peak.As(symbols[i]), b.peak.V()
	}
	f := fault.SumOfCurrentsFormula("i_p", "peak short-circuit current of all branches", fault.SumOfPeaksSource, symbols...)
	return working.Compute(f, func() (units.Ampere, error) { return fault.SumOfCurrents(values...) }, operands...)
}
