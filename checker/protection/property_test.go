package protection_test

import (
	"math"
	"testing"

	"pgregory.net/rapid"

	"boardproof/checker/protection"
	"boardproof/checker/units"
)

func drawSpread(t *rapid.T, name string) protection.Spread {
	return protection.Spread{
		Low:  units.Ratio(rapid.Float64Range(0.7, 1).Draw(t, name+" low")),
		High: units.Ratio(rapid.Float64Range(1, 1.4).Draw(t, name+" high")),
	}
}

func drawTimes(t *rapid.T, name string) protection.TimeTolerance {
	return protection.TimeTolerance{
		Fast:  units.Percentage(rapid.Float64Range(0, 0.4).Draw(t, name+" fast")),
		Slow:  units.Percentage(rapid.Float64Range(0, 0.4).Draw(t, name+" slow")),
		Least: units.Second(rapid.Float64Range(0, 0.05).Draw(t, name+" least")),
	}
}

func drawRelease(t *rapid.T) protection.Release {
	base := rapid.Float64Range(100, 4000).Draw(t, "long-time pickup")
	r := protection.Release{BreakTime: units.Second(rapid.Float64Range(0.01, 0.1).Draw(t, "break time"))}
	r.LongTime = &protection.LongTime{Pickup: units.Ampere(base), PickupTolerance: drawSpread(t, "LT"), Delay: units.Second(rapid.Float64Range(0.5, 30).Draw(t, "LT delay")), At: 6, TimeTolerance: drawTimes(t, "LT")}
	if rapid.Bool().Draw(t, "has ST") {
		r.ShortTime = &protection.ShortTime{Pickup: units.Ampere(base * rapid.Float64Range(1.5, 10).Draw(t, "ST")), PickupTolerance: drawSpread(t, "ST"), Delay: units.Second(rapid.Float64Range(0.05, 1).Draw(t, "ST delay")), TimeTolerance: drawTimes(t, "ST")}
		if rapid.Bool().Draw(t, "ramp") {
			r.ShortTime.Ramp = r.ShortTime.Pickup * units.Ampere(rapid.Float64Range(0.5, 3).Draw(t, "corner"))
		}
	}
	if rapid.Bool().Draw(t, "has instantaneous") {
		r.Instantaneous = &protection.Instantaneous{Pickup: units.Ampere(base * rapid.Float64Range(3, 15).Draw(t, "INST")), PickupTolerance: drawSpread(t, "INST"), Delay: 0.01, TimeTolerance: drawTimes(t, "INST")}
	}
	r.CurveIncludesBreakTime = rapid.Bool().Draw(t, "included")
	return r
}

func drawRelay(t *rapid.T) protection.Relay {
	curve, err := protection.CurveNamed(rapid.SampledFrom(protection.CurveNames()).Draw(t, "curve"))
	if err != nil {
		t.Fatal(err)
	}
	r := protection.Relay{
		Inverse: &protection.Inverse{Curve: curve, Pickup: units.Ampere(rapid.Float64Range(20, 500).Draw(t, "pickup")), PickupTolerance: drawSpread(t, "inverse"),
			Multiplier: units.Ratio(rapid.Float64Range(0.05, 1.5).Draw(t, "TMS")), OperatesFrom: units.Multiple(rapid.Float64Range(1.05, 1.3).Draw(t, "from")),
			Error: protection.RelayError{Assigned: units.Percentage(rapid.Float64Range(0, 0.1).Draw(t, "assigned")), Least: 0.03}},
		BreakTime: 0.07,
	}
	for range rapid.IntRange(0, 2).Draw(t, "stages") {
		r.Stages = append(r.Stages, protection.Stage{Pickup: r.Inverse.Pickup * units.Ampere(rapid.Float64Range(2, 30).Draw(t, "stage")), PickupTolerance: drawSpread(t, "stage"),
			Delay: units.Second(rapid.Float64Range(0, 0.5).Draw(t, "stage delay")), TimeTolerance: drawTimes(t, "stage")})
	}
	return r
}

func drawDevice(t *rapid.T) protection.Device {
	if rapid.Bool().Draw(t, "relay") {
		return drawRelay(t)
	}
	return drawRelease(t)
}

func TestSlowEdgeIsNotBelowFastEdge(t *testing.T) {
	t.Parallel()
	rapid.Check(t, func(t *rapid.T) {
		d := drawDevice(t)
		from, err := protection.ClearsFrom(d)
		if err != nil {
			t.Fatal(err)
		}
		previous := math.Inf(1)
		for k := range 60 {
			band, err := d.Clearing(from * units.Ampere(math.Pow(1.12, float64(k))))
			if err != nil {
				t.Fatal(err)
			}
			slow, fast := float64(band.Slow), float64(band.Fast)
			if !(fast >= 0 && fast <= slow) || math.IsInf(slow, 0) {
				t.Fatalf("band %+v", band)
			}
			if slow > previous*(1+1e-12) {
				t.Fatalf("the slow edge rises with the current: %v after %v", slow, previous)
			}
			previous = slow
		}
		if _, err := d.Clearing(from * (1 - 1e-9)); err == nil {
			t.Fatal("below the smallest cleared current there is a time")
		}
	})
}

func TestLargestJouleIntegralIsLargest(t *testing.T) {
	t.Parallel()
	rapid.Check(t, func(t *rapid.T) {
		d := drawDevice(t)
		from, err := protection.ClearsFrom(d)
		if err != nil {
			t.Fatal(err)
		}
		low := from * units.Ampere(rapid.Float64Range(1, 5).Draw(t, "low"))
		high := low * units.Ampere(rapid.Float64Range(1, 30).Draw(t, "high"))
		// other sources may feed the fault beside the branch the device sees
		others := units.Ampere(0)
		if rapid.Bool().Draw(t, "other sources") {
			others = high * units.Ampere(rapid.Float64Range(0, 3).Draw(t, "others"))
		}
		largest, err := protection.LargestJouleIntegralWith(d, low, high, others)
		if err != nil {
			t.Fatal(err)
		}
		if alone, err := protection.LargestJouleIntegral(d, low, high); err != nil || alone.JouleIntegral > largest.JouleIntegral {
			t.Fatalf("without other sources %+v, %v", alone, err)
		}
		heatAt := func(i, slow float64) float64 { return (i + float64(others)) * (i + float64(others)) * slow }
		if largest.At < low || largest.At > high {
			t.Fatalf("%+v lies outside %v to %v", largest, low, high)
		}
		samples := []float64{float64(low), float64(high)}
		for k := range 300 {
			samples = append(samples, float64(low)*math.Pow(float64(high/low), float64(k)/300))
		}
		breaks, err := d.Breaks()
		if err != nil {
			t.Fatal(err)
		}
		for _, b := range breaks {
			samples = append(samples, float64(b), float64(b)*(1-1e-12), float64(b)*(1-1e-7), float64(b)*(1+1e-7))
		}
		for _, i := range samples {
			if i < float64(low) || i > float64(high) {
				continue
			}
			band, err := d.Clearing(units.Ampere(i))
			if err != nil {
				t.Fatal(err)
			}
			if heat := heatAt(i, float64(band.Slow)); heat > float64(largest.JouleIntegral)*(1+1e-9) {
				t.Fatalf("at %v A the integral is %v, the largest was said to be %+v", i, heat, largest)
			}
		}
		// the time at the reported current belongs to the reported integral, up to the hair
		band, err := d.Clearing(largest.At)
		if err != nil {
			t.Fatal(err)
		}
		if again := heatAt(float64(largest.At), float64(band.Slow)); math.Abs(again/float64(largest.JouleIntegral)-1) > 1e-3 {
			t.Fatalf("at the reported current the integral is %v: %+v", again, largest)
		}
	})
}

func TestMoreToleranceIsNeverQuicker(t *testing.T) {
	t.Parallel()
	wider := func(s protection.Spread) protection.Spread {
		return protection.Spread{Low: s.Low * 0.95, High: s.High * 1.05}
	}
	slower := func(tt protection.TimeTolerance) protection.TimeTolerance {
		return protection.TimeTolerance{Fast: tt.Fast + 0.05, Slow: tt.Slow + 0.05, Least: tt.Least + 0.005}
	}
	rapid.Check(t, func(t *rapid.T) {
		a := drawRelease(t)
		b := a
		l := *a.LongTime
		l.PickupTolerance, l.TimeTolerance = wider(l.PickupTolerance), slower(l.TimeTolerance)
		b.LongTime = &l
		if a.ShortTime != nil {
			s := *a.ShortTime
			s.PickupTolerance, s.TimeTolerance = wider(s.PickupTolerance), slower(s.TimeTolerance)
			b.ShortTime = &s
		}
		c := drawRelay(t)
		d := c
		v := *c.Inverse
		v.PickupTolerance, v.Error.Assigned = wider(v.PickupTolerance), v.Error.Assigned+0.02
		d.Inverse = &v
		for _, pair := range [][2]protection.Device{{a, b}, {c, d}} {
			from, err := protection.ClearsFrom(pair[1])
			if err != nil {
				t.Fatal(err)
			}
			for k := range 40 {
				i := from * units.Ampere(math.Pow(1.2, float64(k)))
				narrow, err := pair[0].Clearing(i)
				if err != nil {
					t.Fatal(err)
				}
				wide, err := pair[1].Clearing(i)
				if err != nil {
					t.Fatal(err)
				}
				if wide.Slow < narrow.Slow || wide.Fast > narrow.Fast {
					t.Fatalf("at %v: %+v within narrow tolerances, %+v within wide ones", i, narrow, wide)
				}
			}
		}
	})
}
