package facts

import (
	"boardproof/checker/protection"
	"boardproof/checker/spec"
	"boardproof/checker/units"
	"boardproof/checker/working"
)

// electronicRelease makes the settings of an electronic release ready. A function that
// was not stated, or not wholly, is taken as absent: without it the fault lasts longer,
// not shorter. What a half-stated function lacks is asked only if no function is left.
func (w *walk) electronicRelease(d *spec.ProtectiveDevice) release {
	r := release{}
	included := d.CurveIncludesBreakTime.Said() && d.CurveIncludesBreakTime.Value
	out := protection.Release{CurveIncludesBreakTime: included, BreakTime: need(w, &r, d.BreakTime, "t_b")}
	if r.lack != nil {
		return r
	}
	var half *working.Lack
	keep := func(f release) bool {
		if f.lack != nil {
			if half == nil {
				half = f.lack
			}
			return false
		}
		r.operands = append(r.operands, f.operands...)
		return true
	}
	// An instantaneous function has cleared when the contacts have.
	own := units.Second(0)
	if included {
		own = out.BreakTime
	}
	if d.LongTime.State == spec.Stated {
		if f, long := w.longTime(d); keep(f) {
			out.LongTime = long
		}
	}
	if d.ShortTime.State == spec.Stated {
		if f, short := w.shortTime(&d.ShortTime); keep(f) {
			out.ShortTime = short
		}
	}
	if i := &d.Instantaneous; i.State == spec.Stated {
		var f release
		function := &protection.Instantaneous{Pickup: need(w, &f, i.Pickup, "I_i"), PickupTolerance: w.spread(&f, i.Tolerance, protection.DefaultInstantaneousPickup), Delay: own}
		if keep(f) {
			out.Instantaneous = function
		}
	}
	if o := &d.Override; o.State == spec.Stated {
		var f release
		function := &protection.Instantaneous{Pickup: need(w, &f, o.Pickup, "I_ov"), PickupTolerance: w.spread(&f, o.Tolerance, protection.DefaultInstantaneousPickup), Delay: own}
		if keep(f) {
			out.Override = function
		}
	}
	if out.LongTime == nil && out.ShortTime == nil && out.Instantaneous == nil && out.Override == nil {
		if half == nil {
			l := lackOf(w.lack(d.ShortTime.At), w.lack(d.LongTime.At), w.lack(d.Instantaneous.At))
			half = &l
		}
		r.lack = half
	}
	r.device = out
	return r
}

func (w *walk) longTime(d *spec.ProtectiveDevice) (f release, long *protection.LongTime) {
	l := &d.LongTime
	long = &protection.LongTime{
		Pickup: need(w, &f, l.Pickup, "I_r"), Delay: need(w, &f, l.Delay, "t_r"), At: need(w, &f, l.AtField, "m"),
		PickupTolerance: w.spread(&f, l.Tolerance, protection.DefaultLongTimePickup),
		TimeTolerance:   w.timeTolerance(&f, l.TimeTolerance, protection.DefaultLongTimeDelay),
	}
	switch {
	case !l.AtOf.Said():
		lack := w.lack(l.AtOf.At)
		f.lack = &lack
	case l.AtOf.Value == spec.MultipleOfRatedCurrent && long.Pickup > 0:
		long.At *= units.Multiple(need(w, &f, d.RatedCurrent, "I_n") / long.Pickup)
	}
	return f, long
}

func (w *walk) shortTime(s *spec.ShortTime) (f release, short *protection.ShortTime) {
	short = &protection.ShortTime{
		Pickup: need(w, &f, s.Pickup, "I_sd"), Delay: need(w, &f, s.Delay, "t_sd"),
		PickupTolerance: w.spread(&f, s.Tolerance, protection.DefaultShortTimePickup),
		TimeTolerance:   w.delayTolerance(&f, s.DelayTolerance, protection.DefaultShortTimeDelay),
	}
	switch {
	case !s.I2t.Said():
		lack := w.lack(s.I2t.At)
		f.lack = &lack
	case s.I2t.Value != spec.I2tRampOff:
		lack := capability("clearing time on the I²t ramp of the short-time function", s.I2t.Place)
		f.lack = &lack
	}
	return f, short
}

// need is a setting that a stated function cannot do without.
func need[U units.Unit](w *walk, r *release, g spec.Given[U], symbol string) U {
	s := stated(w, g, symbol)
	if !s.Known() && r.lack == nil {
		l := s.Missing()[0]
		r.lack = &l
	}
	r.operands = append(r.operands, s)
	return s.V()
}

// spread is the stated tolerance of a pickup. Where none was said the largest usual
// one is taken for the slow edge, since a stated one could be as large.
func (w *walk) spread(r *release, g spec.Given[units.Percentage], usual protection.PickupAssumption) protection.Spread {
	if g.State != spec.NotSaid {
		t := units.Ratio(need(w, r, g, "Δ"))
		return protection.Spread{Low: 1 - t, High: 1 + t}
	}
	wide := max(usual.High, 1+units.Ratio(g.Leaf.Usual.High))
	r.operands = append(r.operands, working.Assumed(units.Percentage(wide-1), "Δ", Name(g.At), "not stated; the largest usual one", notStated))
	return protection.Spread{Low: usual.Low, High: wide}
}

func (w *walk) timeTolerance(r *release, g spec.Given[units.Percentage], usual protection.TimeAssumption) protection.TimeTolerance {
	if g.State != spec.NotSaid {
		t := need(w, r, g, "Δt")
		return protection.TimeTolerance{Fast: t, Slow: t}
	}
	wide := max(usual.Slow, units.Percentage(g.Leaf.Usual.High))
	r.operands = append(r.operands, working.Assumed(wide, "Δt", Name(g.At), "not stated; the largest usual one", notStated))
	return protection.TimeTolerance{Fast: usual.Fast, Slow: wide}
}

func (w *walk) delayTolerance(r *release, g spec.Given[units.Second], usual protection.TimeAssumption) protection.TimeTolerance {
	if g.State != spec.NotSaid {
		return protection.TimeTolerance{Fast: usual.Fast, Least: need(w, r, g, "Δt_0")}
	}
	wide := max(usual.Least, units.Second(g.Leaf.Usual.High))
	r.operands = append(r.operands, working.Assumed(wide, "Δt_0", Name(g.At), "not stated; the largest usual one", notStated))
	return protection.TimeTolerance{Fast: usual.Fast, Least: wide}
}
