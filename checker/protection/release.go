package protection

import (
	"errors"
	"fmt"

	"boardproof/checker/units"
)

// LongTime is the overload function: a delay that falls with the square of the current.
type LongTime struct {
	Pickup          units.Ampere
	PickupTolerance Spread
	Delay           units.Second   // at the multiple At
	At              units.Multiple // of the pickup: "12 s at 6 x"
	TimeTolerance   TimeTolerance
}

// ShortTime is the delayed short-circuit function. Without Ramp its delay is the same at
// every current; with it, the delay holds from the Ramp current up and rises with the
// inverse square below it.
type ShortTime struct {
	Pickup          units.Ampere
	PickupTolerance Spread
	Delay           units.Second
	Ramp            units.Ampere // nought: no ramp
	TimeTolerance   TimeTolerance
}

// Instantaneous is a function without intended delay. Delay is nought, or the operating
// time that a maker states.
type Instantaneous struct {
	Pickup          units.Ampere
	PickupTolerance Spread
	Delay           units.Second
	TimeTolerance   TimeTolerance
}

// Release is the release of a circuit-breaker. Functions that it does not have are nil.
type Release struct {
	LongTime      *LongTime
	ShortTime     *ShortTime
	Instantaneous *Instantaneous
	// Override is the instantaneous function that protects the breaker itself and that no
	// setting switches off.
	Override *Instantaneous

	// BreakTime is the longest time from the order to trip to the end of the arc. It is
	// added to the slow edge, unless the times above are total clearing times.
	BreakTime              units.Second
	CurveIncludesBreakTime bool
}

// Clearing returns the time in which the breaker clears a steady current: the earliest
// possible order to trip, and the latest end of the arc. Clearing is [NotClearing] below
// the smallest current at which a function is certain to pick up.
func (r Release) Clearing(current units.Ampere) (Band, error) {
	c, err := r.curve()
	if err != nil {
		return Band{}, err
	}
	return c.clearing(current)
}

// Breaks returns the currents at which the slow edge jumps or bends: certain pickups, the
// corner of a ramp, crossings of two functions.
func (r Release) Breaks() ([]units.Ampere, error) {
	c, err := r.curve()
	if err != nil {
		return nil, err
	}
	return c.breaks(), nil
}

// LargestJouleIntegral is [LargestJouleIntegral] of the release.
func (r Release) LargestJouleIntegral(low, high units.Ampere) (HeatPoint, error) {
	return LargestJouleIntegral(r, low, high)
}

func (r Release) curve() (curve, error) {
	var faults []error
	var c curve
	add := func(name string, pickup units.Ampere, spread Spread, t TimeTolerance, time func(float64) float64, bends ...float64) {
		faults = append(faults, positive(name, "pickup", float64(pickup), units.Format(pickup)), spread.problem(name), t.problem(name))
		c.functions = append(c.functions, definite(name, pickup, spread, t, time, bends...))
	}
	if l := r.LongTime; l != nil {
		faults = append(faults, positive("long time", "delay", float64(l.Delay), units.Format(l.Delay)), positive("long time", "multiple", float64(l.At), units.Format(l.At)))
		add("long time", l.Pickup, l.PickupTolerance, l.TimeTolerance, func(i float64) float64 {
			return inverseSquare(float64(l.Delay), float64(l.At)*float64(l.Pickup), i)
		})
	}
	if s := r.ShortTime; s != nil {
		faults = append(faults, positive("short time", "delay", float64(s.Delay), units.Format(s.Delay)))
		if !(s.Ramp >= 0 && s.Ramp <= 1e7) {
			faults = append(faults, fmt.Errorf("the ramp of the short time ends at %s, expected a current", units.Format(s.Ramp)))
		}
		add("short time", s.Pickup, s.PickupTolerance, s.TimeTolerance, func(i float64) float64 {
			if i < float64(s.Ramp) {
				return inverseSquare(float64(s.Delay), float64(s.Ramp), i)
			}
			return float64(s.Delay)
		}, float64(s.Ramp))
	}
	for _, one := range []struct {
		name string
		*Instantaneous
	}{{"instantaneous", r.Instantaneous}, {"instantaneous override", r.Override}} {
		if one.Instantaneous == nil {
			continue
		}
		if !(one.Delay >= 0 && one.Delay <= 10) {
			faults = append(faults, fmt.Errorf("the delay of the %s is %s, expected 0 s to 10 s", one.name, units.Format(one.Delay)))
		}
		if one.Delay == 0 && r.CurveIncludesBreakTime {
			faults = append(faults, fmt.Errorf("the clearing time of the %s is missing: the times are said to include the break time", one.name))
		}
		add(one.name, one.Pickup, one.PickupTolerance, one.TimeTolerance, func(float64) float64 { return float64(one.Delay) })
	}
	c, fault := c.with(r.BreakTime, r.CurveIncludesBreakTime)
	return c, errors.Join(append(faults, fault)...)
}

// inverseSquare is a time that falls with the square of the current.
func inverseSquare(time, reference, current float64) float64 {
	return time * (reference / current) * (reference / current)
}

// definite makes a function of a pickup with its spread and a time that depends on the
// current by itself, not on where the pickup truly lies.
func definite(name string, pickup units.Ampere, spread Spread, t TimeTolerance, time func(float64) float64, bends ...float64) function {
	return function{
		name:     name,
		possible: units.Round12(float64(pickup) * float64(spread.Low)),
		certain:  units.Round12(float64(pickup) * float64(spread.High)),
		fast:     func(i float64) float64 { return t.fast(time(i)) },
		slow:     func(i float64) float64 { return t.slow(time(i)) },
		bends:    bends,
	}
}

// with puts the break time into the edges.
func (c curve) with(breakTime units.Second, included bool) (curve, error) {
	if len(c.functions) == 0 {
		return c, errors.New("the device has no tripping function")
	}
	switch {
	case !(breakTime >= 0 && breakTime <= 10):
		return c, fmt.Errorf("the break time is %s, expected 0 s to 10 s", units.Format(breakTime))
	case included:
		c.takeFast = float64(breakTime)
	case breakTime == 0:
		return c, errors.New("the break time is missing, and the curve does not include it")
	default:
		c.addSlow = float64(breakTime)
	}
	return c, nil
}

func positive(name, what string, value float64, text string) error {
	if !(value > 0 && value <= 1e7) {
		return fmt.Errorf("the %s of the %s is %s, expected more than nought", what, name, text)
	}
	return nil
}
