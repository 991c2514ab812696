package facts

import (
	"boardproof/checker/protection"
	"boardproof/checker/spec"
	"boardproof/checker/units"
	"boardproof/checker/working"
)

// electronicRelease makes the settings of an electronic release ready. A function that
// was not stated is taken as absent: without it the fault lasts longer, not shorter.
func (w *walk) electronicRelease(d *spec.ProtectiveDevice) release {
	r := release{}
	out := protection.Release{CurveIncludesBreakTime: d.CurveIncludesBreakTime.Said() && d.CurveIncludesBreakTime.Value}
	out.BreakTime = need(w, &r, d.BreakTime, "t_b")
	if l := &d.LongTime; l.State == spec.Stated {
		out.LongTime = &protection.LongTime{
			Pickup: need(w, &r, l.Pickup, "I_r"), Delay: need(w, &r, l.Delay, "t_r"), At: need(w, &r, l.AtField, "m"),
			PickupTolerance: w.spread(&r, l.Tolerance, protection.DefaultLongTimePickup),
			TimeTolerance:   w.timeTolerance(&r, l.TimeTolerance, protection.DefaultLongTimeDelay),
		}
		if l.AtOf.Said() && l.AtOf.Value == spec.MultipleOfRatedCurrent && out.LongTime.Pickup > 0 {
			out.LongTime.At *= units.Multiple(need(w, &r, d.RatedCurrent, "I_n") / out.LongTime.Pickup)
		}
	}
	if s := &d.ShortTime; s.State == spec.Stated {
		out.ShortTime = &protection.ShortTime{
			Pickup: need(w, &r, s.Pickup, "I_sd"), Delay: need(w, &r, s.Delay, "t_sd"),
			PickupTolerance: w.spread(&r, s.Tolerance, protection.DefaultShortTimePickup),
			TimeTolerance:   w.delayTolerance(&r, s.DelayTolerance, protection.DefaultShortTimeDelay),
		}
		if !s.I2t.Said() || s.I2t.Value != spec.I2tRampOff {
			l := w.lack(s.I2t.At)
			if s.I2t.Said() {
				l = capability("clearing time on the I²t ramp of the short-time function", s.I2t.Place)
			}
			r.lack = &l
		}
	}
	if i := &d.Instantaneous; i.State == spec.Stated {
		out.Instantaneous = &protection.Instantaneous{Pickup: need(w, &r, i.Pickup, "I_i"), PickupTolerance: w.spread(&r, i.Tolerance, protection.DefaultInstantaneousPickup)}
	}
	if o := &d.Override; o.State == spec.Stated {
		out.Override = &protection.Instantaneous{Pickup: need(w, &r, o.Pickup, "I_ov"), PickupTolerance: w.spread(&r, o.Tolerance, protection.DefaultInstantaneousPickup)}
	}
	if out.LongTime == nil && out.ShortTime == nil && out.Instantaneous == nil && out.Override == nil && r.lack == nil {
		l := lackOf(w.lack(d.ShortTime.At), w.lack(d.LongTime.At), w.lack(d.Instantaneous.At))
		r.lack = &l
	}
	r.device = out
	return r
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

// spread is the stated tolerance of a pickup, or the usual one.
func (w *walk) spread(r *release, g spec.Given[units.Percentage], usual protection.PickupAssumption) protection.Spread {
	if g.State != spec.NotSaid {
		t := units.Ratio(need(w, r, g, "Δ"))
		return protection.Spread{Low: 1 - t, High: 1 + t}
	}
	r.operands = append(r.operands, working.Assumed(units.Percentage(usual.High-1), "Δ", Name(g.At), "not stated: "+usual.Why, usual.Source))
	return usual.Spread
}

func (w *walk) timeTolerance(r *release, g spec.Given[units.Percentage], usual protection.TimeAssumption) protection.TimeTolerance {
	if g.State != spec.NotSaid {
		t := need(w, r, g, "Δt")
		return protection.TimeTolerance{Fast: t, Slow: t}
	}
	r.operands = append(r.operands, working.Assumed(usual.Slow, "Δt", Name(g.At), "not stated: "+usual.Why, usual.Source))
	return usual.TimeTolerance
}

func (w *walk) delayTolerance(r *release, g spec.Given[units.Second], usual protection.TimeAssumption) protection.TimeTolerance {
	if g.State != spec.NotSaid {
		return protection.TimeTolerance{Fast: usual.Fast, Least: need(w, r, g, "Δt_0")}
	}
	r.operands = append(r.operands, working.Assumed(usual.Least, "Δt_0", Name(g.At), "not stated: "+usual.Why, usual.Source))
	return usual.TimeTolerance
}
