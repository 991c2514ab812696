package protection

import (
	"cmp"
	"errors"
	"fmt"
	"math"
	"slices"

	"boardproof/checker/units"
)

// Band is how long a device lets a current flow: not shorter than Fast, not longer than
// Slow.
type Band struct {
	Fast, Slow units.Second
	SlowBy     string // the function that decides the slow edge: "short time"
}

// Device is a release, a relay or another device whose clearing time depends on the
// current alone.
type Device interface {
	// Clearing returns the time in which the device clears a steady current. The error is
	// a [NotClearing] if it is not certain to trip at all.
	Clearing(current units.Ampere) (Band, error)
	// Breaks returns the currents at which the slow edge jumps or bends, rising. Between
	// two of them i²·t is largest at one end.
	Breaks() ([]units.Ampere, error)

	curve() (curve, error)
}

// NotClearing says that a device is not certain to trip at a current.
type NotClearing struct {
	Current units.Ampere
	From    units.Ampere // smallest current at which it is certain to trip
}

// Error names the current and the smallest one that is cleared.
func (e *NotClearing) Error() string {
	return fmt.Sprintf("at %s the device is not certain to trip, it is from %s", units.Format(e.Current), units.Format(e.From))
}

// ClearsFrom returns the smallest current at which the device is certain to trip.
func ClearsFrom(d Device) (units.Ampere, error) {
	c, err := d.curve()
	if err != nil {
		return 0, err
	}
	return units.Ampere(c.from()), nil
}

// function is one tripping function with its edges, without the time the contacts take.
type function struct {
	name              string
	possible, certain float64 // currents from which the fast and the slow edge exist
	fast, slow        func(current float64) float64
	bends             []float64 // where the slow edge jumps or bends above certain
}

// curve is a device made ready: its functions and how the break time goes into the edges.
type curve struct {
	functions []function
	addSlow   float64 // added to the slow edge
	takeFast  float64 // taken off the fast edge
}

func (c curve) from() float64 {
	return slices.MinFunc(c.functions, func(a, b function) int { return cmp.Compare(a.certain, b.certain) }).certain
}

// slowAt is the slow edge, +Inf where nothing is certain to trip.
func (c curve) slowAt(current float64) (time float64, by string) {
	time = math.Inf(1)
	for _, f := range c.functions {
		if current >= f.certain {
			if t := f.slow(current) + c.addSlow; t < time {
				time, by = t, f.name
			}
		}
	}
	return time, by
}

func (c curve) fastAt(current float64) float64 {
	time := math.Inf(1)
	for _, f := range c.functions {
		if current >= f.possible {
			time = math.Min(time, math.Max(0, f.fast(current)-c.takeFast))
		}
	}
	return time
}

func (c curve) clearing(current units.Ampere) (Band, error) {
	i := float64(current)
	if !(i > 0 && i <= 1e7) {
		return Band{}, fmt.Errorf("the current is %s, expected more than 0 A and at most 10 MA", units.Format(current))
	}
	slow, by := c.slowAt(i)
	if math.IsInf(slow, 1) {
		return Band{}, &NotClearing{Current: current, From: units.Ampere(c.from())}
	}
	if math.IsNaN(slow) {
		return Band{}, errors.New("the clearing time is not a finite number for these settings")
	}
	return Band{Fast: units.Second(math.Min(c.fastAt(i), slow)), Slow: units.Second(slow), SlowBy: by}, nil
}

// breaks are the pickups and bends of all functions and the currents at which one function
// takes over from another.
func (c curve) breaks() []units.Ampere {
	var edges []float64
	for _, f := range c.functions {
		edges = append(edges, f.certain)
		for _, b := range f.bends {
			if b > f.certain {
				edges = append(edges, b)
			}
		}
	}
	slices.Sort(edges)
	edges = slices.Compact(edges)
	all := slices.Clone(edges)
	for k, low := range edges {
		high := math.Max(low*1000, 1e6)
		if k+1 < len(edges) {
			high = edges[k+1]
		}
		all = append(all, c.crossings(low, high)...)
	}
	slices.Sort(all)
	out := make([]units.Ampere, 0, len(all))
	for _, v := range slices.Compact(all) {
		out = append(out, units.Ampere(v))
	}
	return out
}

// crossings finds where two functions that are certain in all of [low, high) take the same
// time. Between two edges every function is smooth.
func (c curve) crossings(low, high float64) []float64 {
	const samples = 64
	var out []float64
	for a, first := range c.functions {
		for _, other := range c.functions[a+1:] {
			if first.certain > low || other.certain > low {
				continue
			}
			below := math.Nextafter(high, low)
			difference := func(i float64) float64 { return first.slow(i) - other.slow(i) }
			from := low
			for s := 1; s <= samples; s++ {
				to := math.Min(below, low*math.Pow(high/low, float64(s)/samples))
				if difference(from)*difference(to) < 0 {
					out = append(out, units.Round12(bisect(difference, from, to)))
				}
				from = to
			}
		}
	}
	return out
}

func bisect(f func(float64) float64, low, high float64) float64 {
	rising := f(low) < 0
	for range 80 {
		mid := (low + high) / 2
		if (f(mid) < 0) == rising {
			low = mid
		} else {
			high = mid
		}
	}
	return (low + high) / 2
}
