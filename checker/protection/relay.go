package protection

import (
	"errors"
	"fmt"
	"math"

	"boardproof/checker/units"
)

// flatFrom is the multiple of the setting above which the slow edge of an inverse stage no
// longer falls. Source: IEC 60255-151, from memory, unconfirmed.
const flatFrom = 20

// Inverse is the inverse-time stage of a relay.
type Inverse struct {
	Curve           InverseCurve
	Pickup          units.Ampere
	PickupTolerance Spread // relay and current transformers together; shifts the whole curve
	Multiplier      units.Ratio
	// OperatesFrom is the multiple of the true pickup from which the stage is certain to
	// operate; see [DefaultOperatesFrom].
	OperatesFrom units.Multiple
	Error        RelayError
}

// DefaultOperatesFrom is the multiple of the setting from which an inverse stage is taken
// as certain to operate. Makers state 1.05 to 1.2 (common practice; 1.05 seen in two
// manuals).
const DefaultOperatesFrom units.Multiple = 1.1

// Stage is a definite-time stage of a relay; with a Delay of nought it is instantaneous.
type Stage struct {
	Pickup          units.Ampere
	PickupTolerance Spread
	Delay           units.Second
	TimeTolerance   TimeTolerance
}

// Relay is a measuring relay with the breaker it trips.
type Relay struct {
	Inverse *Inverse
	Stages  []Stage
	// BreakTime is the longest time from the relay's order to the end of the arc: output
	// relay, opening and arcing.
	BreakTime units.Second
}

// Clearing returns the time in which relay and breaker clear a steady current; see
// [Release.Clearing].
func (r Relay) Clearing(current units.Ampere) (Band, error) {
	c, err := r.curve()
	if err != nil {
		return Band{}, err
	}
	return c.clearing(current)
}

// Breaks returns the currents at which the slow edge jumps or bends: certain pickups, the
// steps of the relay's accuracy, crossings of two stages.
func (r Relay) Breaks() ([]units.Ampere, error) {
	c, err := r.curve()
	if err != nil {
		return nil, err
	}
	return c.breaks(), nil
}

// LargestJouleIntegral is [LargestJouleIntegral] of the relay.
func (r Relay) LargestJouleIntegral(low, high units.Ampere) (HeatPoint, error) {
	return LargestJouleIntegral(r, low, high)
}

func (r Relay) curve() (curve, error) {
	var faults []error
	var c curve
	if v := r.Inverse; v != nil {
		faults = append(faults,
			positive("inverse stage", "pickup", float64(v.Pickup), units.Format(v.Pickup)),
			positive("inverse stage", "time multiplier", float64(v.Multiplier), units.Format(v.Multiplier)),
			v.PickupTolerance.problem("inverse stage"), v.Error.at(1).problem("inverse stage"))
		if v.Curve.K <= 0 || v.Curve.Alpha <= 0 {
			faults = append(faults, errors.New("the inverse stage has no curve"))
		}
		if !(v.OperatesFrom > 1 && v.OperatesFrom <= 2) {
			faults = append(faults, fmt.Errorf("the inverse stage operates from %s the setting, expected more than 1 x and at most 2 x", units.Format(v.OperatesFrom)))
		}
		c.functions = append(c.functions, v.function())
	}
	for k, s := range r.Stages {
		name := fmt.Sprintf("stage %d", k+1)
		faults = append(faults, positive(name, "pickup", float64(s.Pickup), units.Format(s.Pickup)), s.PickupTolerance.problem(name), s.TimeTolerance.problem(name))
		if !(s.Delay >= 0 && s.Delay <= 3600) {
			faults = append(faults, fmt.Errorf("the delay of the %s is %s, expected 0 s to 1 h", name, units.Format(s.Delay)))
		}
		c.functions = append(c.functions, definite(name, s.Pickup, s.PickupTolerance, s.TimeTolerance, func(float64) float64 { return float64(s.Delay) }))
	}
	c, fault := c.with(r.BreakTime, false)
	return c, errors.Join(append(faults, fault)...)
}

func (v Inverse) function() function {
	late := float64(v.Pickup) * float64(v.PickupTolerance.High) // the true pickup at its highest
	early := float64(v.Pickup) * float64(v.PickupTolerance.Low) // and at its lowest
	bends := make([]float64, 0, 3)
	for _, multiple := range []float64{5, 10, flatFrom} {
		bends = append(bends, units.Round12(late*multiple))
	}
	// The accuracy steps at the same currents for both edges: the lower multiple, which
	// gives the wider band, decides. Compared are currents, so that a current just below a
	// step is not rounded across it.
	tolerance := func(i float64) TimeTolerance {
		switch {
		case i < bends[0]:
			return v.Error.at(1)
		case i < bends[1]:
			return v.Error.at(5)
		}
		return v.Error.at(10)
	}
	return function{
		name:     "inverse stage",
		possible: math.Nextafter(early, math.Inf(1)),
		certain:  units.Round12(late * float64(v.OperatesFrom)),
		bends:    bends,
		slow: func(i float64) float64 {
			return tolerance(i).slow(v.Curve.at(float64(v.Multiplier), math.Min(i/late, flatFrom)))
		},
		fast: func(i float64) float64 {
			return tolerance(i).fast(v.Curve.at(float64(v.Multiplier), i/early))
		},
	}
}
