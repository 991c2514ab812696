package facts

import (
	"slices"

	"boardproof/checker/fault"
	"boardproof/checker/spec"
	"boardproof/checker/working"
)

// motors are the units whose motors feed a fault at bars connected with them: every
// motor of the schedule that is not behind a converter and not named as a standby. The
// list of standbys is a statement of the owner; a motor that is not on it counts.
func (w *walk) motors(together []string, e end) []*spec.Entry[spec.Unit] {
	if e == smallest {
		return nil // motors may be at rest when the smallest fault happens
	}
	var list []*spec.Entry[spec.Unit]
	for i := range w.board.Units.Entries {
		u := &w.board.Units.Entries[i]
		if !slices.Contains(together, u.Name) || !hasMotor(&u.Value) || w.isStandby(u.Name) {
			continue
		}
		if fed := u.Value.Load.FedThrough; fed.Said() && !fault.Feeding(fed.Value.Text()).FeedsFault() {
			continue
		} else if !fed.Said() && e == largestAtLeast {
			continue // it may sit behind a converter: it does not raise what is certain
		}
		list = append(list, u)
	}
	return list
}

// hasMotor reports whether something that turns hangs on a unit: every load does
// unless it is said that there is no motor in it.
func hasMotor(u *spec.Unit) bool {
	if u.Load.State == spec.Stated {
		return u.Load.Motor.State != spec.StatedNone
	}
	return u.Duty.Said() && u.Duty.Value == spec.UnitDutyMotorFeeder && u.Load.State != spec.StatedNone
}

func (w *walk) isStandby(unit string) bool {
	return slices.ContainsFunc(w.board.Standby.Items, func(n spec.Given[spec.Name]) bool { return n.Said() && n.Value.Text == unit })
}

// motorBranch is the short-circuit impedance of one motor.
func (w *walk) motorBranch(u *spec.Entry[spec.Unit]) impedance {
	load := &u.Value.Load
	rated := w.nominal().As("U_rM")
	current := stated(w, load.Current, "I_rM")
	z := working.Apply3(&fault.MotorImpedanceFormula, fault.MotorImpedance, rated, stated(w, load.Starting, "I_LR/I_rM"), current)
	ratio := working.Assumed(fault.LowVoltageMotorROverX, "R_M/X_M", "ratio R/X of a low-voltage motor with its cable", "the standard's value", fault.MotorROverXSource)
	x := working.Apply2(&fault.MotorReactanceFormula, fault.MotorReactance, z, ratio)
	return plain(working.Apply2(&fault.MotorResistanceFormula, fault.MotorResistance, x, ratio), x)
}
