package facts

import (
	"errors"
	"fmt"

	"boardproof/checker/fault"
	"boardproof/checker/network"
	"boardproof/checker/protection"
	"boardproof/checker/spec"
	"boardproof/checker/units"
	"boardproof/checker/working"
)

var (
	governingCurrent = working.Formula{
		ID: "facts.governing_current", Symbol: "I*", Name: "current of the branch at which the Joule integral is largest",
		Equation: "the current from {I_min} to {I_max} at which (I + {I_o})²·t is largest, t on the slow edge; looked for at both ends and at every break of the curve",
		Source:   working.Source{Status: "definition of the Joule integral"},
	}
	clearingTime = working.Formula{
		ID: "facts.clearing_time", Symbol: "t", Name: "longest clearing time at that current",
		Equation: "the slow edge of the curve at {I*}, break time included", Source: working.Source{Status: "from the settings and their tolerances"},
	}
	longestTime = working.Formula{
		ID: "facts.longest_time", Symbol: "t", Name: "longest clearing time of the branch",
		Equation: "the slow edge of the curve at {I_min}, break time included", Source: working.Source{Status: "from the settings and their tolerances"},
	}
	jouleOfFault = working.Formula{
		ID: "facts.joule_of_fault", Symbol: "I²t", Name: "Joule integral until cleared",
		Equation: "({I*} + {I_o})²·{t}", Source: working.Source{Standard: "IEC 61439-1", Edition: "2020", Clause: "5.3.5"},
		Note: "r.m.s. value of the a.c. component, as the rated short-time withstand current is; the currents of all branches flow until the slowest is cleared",
	}
)

// jouleIntegral is the largest Joule integral at bars in one supply state: for each
// source the largest over its current range with the device that clears it, all other
// branches flowing in full; then the largest of the sources. The first branches of
// upper and low are those of the ways, the others motors.
func (w *walk) jouleIntegral(ways []network.Branch, upper, low []branch) working.Result[units.AmpereSquaredSecond] {
	var cases []working.Case[units.AmpereSquaredSecond]
	for i, way := range ways {
		others := othersCurrent(upper, i)
		cases = append(cases, working.Case[units.AmpereSquaredSecond]{
			Name: way.Source, Result: quickest(way, func(device string) working.Result[units.AmpereSquaredSecond] {
				return w.heatThrough(device, low[i].current, upper[i].current, others)
			}),
		})
	}
	if len(cases) == 1 {
		return cases[0].Result
	}
	return working.Largest("I²t", "largest Joule integral of the branches", cases, nil).AtMost
}

// othersCurrent is the sum of all branch currents but one.
func othersCurrent(branches []branch, but int) working.Result[units.Ampere] {
	var symbols []string
	var values []units.Ampere
	var operands []working.Operand
	for i, b := range branches {
		if i != but {
			symbol := "I\"_k " + b.name
			symbols, values, operands = append(symbols, symbol), append(values, b.current.V()), append(operands, b.current.As(symbol))
		}
	}
	if len(operands) == 0 {
		return working.Assumed(units.Ampere(0), "I_o", "current of the other branches", "there are none", working.Source{})
	}
	f := fault.SumOfCurrentsFormula("I_o", "current of the other branches", working.Source{Status: "plain sum, never below the true one"}, symbols...)
	return working.Compute(f, func() (units.Ampere, error) { return fault.SumOfCurrents(values...) }, operands...)
}

// longestDuration is the longest time until every branch is cleared in one supply
// state: at the smallest current of each branch, where the slow edge is longest.
func (w *walk) longestDuration(ways []network.Branch, low []branch) working.Result[units.Second] {
	var cases []working.Case[units.Second]
	for i, way := range ways {
		cases = append(cases, working.Case[units.Second]{Name: way.Source, Result: quickest(way, func(device string) working.Result[units.Second] {
			return w.durationThrough(device, low[i].current)
		})})
	}
	if len(cases) == 1 {
		return cases[0].Result
	}
	return working.Largest("t", "longest time until the branches are cleared", cases, nil).AtMost
}

// durationThrough is the longest clearing time of one device at the smallest current.
func (w *walk) durationThrough(device string, low working.Result[units.Ampere]) working.Result[units.Second] {
	rel := w.releaseOf(device)
	if rel.lack != nil {
		return working.Lacking[units.Second](*rel.lack)
	}
	timed := longestTime
	timed.Note = "device: " + device
	return working.Compute(&timed, func() (units.Second, error) {
		band, err := rel.device.Clearing(low.V())
		return band.Slow, neverClears(device, err)
	}, append([]working.Operand{low.As("I_min")}, rel.operands...)...)
}

// neverClears says in words that a device is not certain to trip; other errors stay.
func neverClears(device string, err error) error {
	var never *protection.NotClearing
	if errors.As(err, &never) {
		return fmt.Errorf("%s is not certain to clear %s: it is from %s; the fault would last", device, units.Format(never.Current), units.Format(never.From))
	}
	return err
}

// quickest is the smallest result of the devices on a way that can be computed. A
// device that cannot does not help; if none can, what the nearest one lacks is asked.
func quickest[U units.Unit](way network.Branch, by func(device string) working.Result[U]) working.Result[U] {
	var best, nearest working.Result[U]
	for i, device := range way.Devices() {
		r := by(device)
		if r.Known() && (!best.Known() || r.V() < best.V()) {
			best = r
		}
		if i == 0 {
			nearest = r
		}
	}
	if best.Known() {
		return best
	}
	return nearest
}

// heatThrough is the Joule integral if one device has to clear its branch.
func (w *walk) heatThrough(device string, low, high, others working.Result[units.Ampere]) working.Result[units.AmpereSquaredSecond] {
	rel := w.releaseOf(device)
	if rel.lack != nil {
		return working.Lacking[units.AmpereSquaredSecond](*rel.lack)
	}
	operands := append([]working.Operand{low.As("I_min"), high.As("I_max"), others}, rel.operands...)
	var point protection.HeatPoint
	named := governingCurrent
	named.Note = "device: " + device
	at := working.Compute(&named, func() (units.Ampere, error) {
		var err error
		point, err = protection.LargestJouleIntegralWith(rel.device, low.V(), high.V(), others.V())
		return point.At, neverClears(device, err)
	}, operands...)
	timed := clearingTime
	timed.Note = "device: " + device + ", " + point.By
	t := working.Compute(&timed, func() (units.Second, error) { return point.Time, nil }, append([]working.Operand{at}, rel.operands...)...)
	return working.Apply3(&jouleOfFault, func(i, o units.Ampere, t units.Second) (units.AmpereSquaredSecond, error) {
		return units.AmpereSquaredSecond(float64(i+o) * float64(i+o) * float64(t)), nil
	}, at, others, t)
}

// release is a device made ready to be asked, with the lines it rests on; or what
// keeps it from being used.
type release struct {
	device   protection.Device
	operands []working.Operand
	lack     *working.Lack
}

// releaseOf reads the settings of a unit's release.
func (w *walk) releaseOf(unit string) release {
	u, ok := w.board.Units.Get(unit)
	if !ok {
		return release{lack: &working.Lack{What: "the unit " + unit}}
	}
	if !u.Value.Settings.Said() {
		l := w.lack(u.Value.Settings.At)
		return release{lack: &l}
	}
	p, ok := w.board.Protection.Get(u.Value.Settings.Value.Text)
	if !ok {
		l := w.lack(u.Value.Settings.At)
		return release{lack: &l}
	}
	if !p.Value.Kind.Said() {
		l := w.lack(p.Value.Kind.At)
		return release{lack: &l}
	}
	if p.Value.Kind.Value != spec.ProtectiveDeviceKindElectronicRelease {
		l := capability("clearing time of "+p.Name+", a device of the kind "+p.Value.Kind.Value.Text(), p.Place)
		return release{lack: &l}
	}
	return w.electronicRelease(&p.Value)
}
