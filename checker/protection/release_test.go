package protection_test

import (
	"errors"
	"math"
	"strings"
	"testing"

	"boardproof/checker/protection"
	"boardproof/checker/units"
)

// q1 is the incomer of the invented board with its tolerances.
func q1() protection.Release {
	return protection.Release{
		LongTime: &protection.LongTime{Pickup: 2500, PickupTolerance: protection.DefaultLongTimePickup.Spread, Delay: 12, At: 6,
			TimeTolerance: protection.DefaultLongTimeDelay.TimeTolerance},
		ShortTime: &protection.ShortTime{Pickup: 10e3, PickupTolerance: protection.DefaultShortTimePickup.Spread, Delay: 0.2,
			TimeTolerance: protection.DefaultShortTimeDelay.TimeTolerance},
		Override:  &protection.Instantaneous{Pickup: 60e3, PickupTolerance: protection.DefaultInstantaneousPickup.Spread},
		BreakTime: 0.05,
	}
}

const exact = 1e-9

func near(t *testing.T, what string, got, want float64) {
	t.Helper()
	if !(math.Abs(got-want) <= exact*math.Max(1, math.Abs(want))) {
		t.Errorf("%s: got %.12g, expected %.12g", what, got, want)
	}
}

func TestReleaseCorners(t *testing.T) {
	t.Parallel()
	long := func(i float64) float64 { return 12 * (15000 / i) * (15000 / i) }
	for _, row := range []struct {
		name       string
		current    units.Ampere
		fast, slow float64
		by         string
	}{
		{"just above the certain long time", 3250, 0.8 * long(3250), 1.2*long(3250) + 0.05, "long time"},
		{"just below the possible short time", 8999.999, 0.8 * long(8999.999), 1.2*long(8999.999) + 0.05, "long time"},
		{"at the possible short time", 9000, 0.14, 1.2*long(9000) + 0.05, "long time"},
		{"just below the certain short time", 10999.999, 0.14, 1.2*long(10999.999) + 0.05, "long time"},
		{"at the certain short time", 11000, 0.14, 0.25, "short time"},
		{"at the possible override", 48e3, 0, 0.25, "short time"},
		{"just below the certain override", 71999.9, 0, 0.25, "short time"},
		{"at the certain override", 72e3, 0, 0.05, "instantaneous override"},
		{"far above", 150e3, 0, 0.05, "instantaneous override"},
	} {
		t.Run(row.name, func(t *testing.T) {
			t.Parallel()
			band, err := q1().Clearing(row.current)
			if err != nil {
				t.Fatal(err)
			}
			near(t, "fast edge", float64(band.Fast), row.fast)
			near(t, "slow edge", float64(band.Slow), row.slow)
			if band.SlowBy != row.by {
				t.Errorf("cleared by %q, expected %q", band.SlowBy, row.by)
			}
		})
	}
}

func TestReleaseBelowPickup(t *testing.T) {
	t.Parallel()
	_, err := q1().Clearing(3249.9)
	var not *protection.NotClearing
	if !errors.As(err, &not) || not.From != 3250 || not.Current != 3249.9 {
		t.Fatalf("3249.9 A gave %v", err)
	}
	if want := "at 3250 A the device is not certain to trip, it is from 3250 A"; err.Error() != want {
		t.Errorf("the error says %q", err)
	}
	if from, err := protection.ClearsFrom(q1()); err != nil || from != 3250 {
		t.Errorf("clears from %v, %v", from, err)
	}
	if _, err := q1().LargestJouleIntegral(3000, 20e3); !errors.As(err, &not) {
		t.Errorf("a range that begins below the pickup gave %v", err)
	}
}

func TestReleaseRamp(t *testing.T) {
	t.Parallel()
	r := q1()
	r.ShortTime.Ramp = 20e3
	for current, want := range map[units.Ampere]float64{11e3: 0.2*(20.0/11)*(20.0/11) + 0.05, 19999: 0.2*(20/19.999)*(20/19.999) + 0.05, 20e3: 0.25, 30e3: 0.25} {
		band, err := r.Clearing(current)
		if err != nil {
			t.Fatal(err)
		}
		near(t, units.Format(current), float64(band.Slow), want)
	}
	breaks, err := r.Breaks()
	if err != nil {
		t.Fatal(err)
	}
	want := []units.Ampere{3250, 11e3, 20e3, 72e3}
	// beyond 100 kA the long time would be quicker than 0.2 s: 15 kA·√(1.2·12/0.2) = 127.3 kA
	if len(breaks) < 4 || breaks[0] != want[0] || breaks[1] != want[1] || breaks[2] != want[2] || breaks[3] != want[3] {
		t.Errorf("breaks are %v", breaks)
	}
}

// TestCrossing: where a long delay meets the falling curve, the slow edge bends.
func TestCrossing(t *testing.T) {
	t.Parallel()
	r := protection.Release{
		LongTime:  &protection.LongTime{Pickup: 100, PickupTolerance: protection.Exactly(), Delay: 10, At: 5},
		ShortTime: &protection.ShortTime{Pickup: 400, PickupTolerance: protection.Exactly(), Delay: 0.4},
		BreakTime: 0.02,
	}
	breaks, err := r.Breaks()
	if err != nil {
		t.Fatal(err)
	}
	if len(breaks) != 3 { // 500·√(10/0.4) = 2500 A
		t.Fatalf("breaks are %v", breaks)
	}
	near(t, "crossing", float64(breaks[2]), 2500)
	band, err := r.Clearing(5000)
	if err != nil || band.SlowBy != "long time" {
		t.Errorf("beyond the crossing %v, %v", band, err)
	}
}

func TestBreakTimeIncluded(t *testing.T) {
	t.Parallel()
	r := q1()
	r.Override, r.CurveIncludesBreakTime = nil, true
	band, err := r.Clearing(20e3)
	if err != nil {
		t.Fatal(err)
	}
	near(t, "slow edge", float64(band.Slow), 0.2)
	near(t, "fast edge", float64(band.Fast), 0.14-0.05)
}

func TestReleaseProblemsAreAllNamed(t *testing.T) {
	t.Parallel()
	nan := units.Ampere(math.NaN())
	for _, row := range []struct {
		name    string
		release protection.Release
		want    []string
	}{
		{"nothing", protection.Release{BreakTime: 0.05}, []string{"no tripping function"}},
		{"no break time", protection.Release{ShortTime: q1().ShortTime}, []string{"break time is missing"}},
		{"negative break time", protection.Release{ShortTime: q1().ShortTime, BreakTime: -1}, []string{"break time is -1 s"}},
		{"no tolerance", protection.Release{ShortTime: &protection.ShortTime{Pickup: 1, Delay: 1}, BreakTime: 0.05}, []string{"pickup tolerance of the short time"}},
		{"everything", protection.Release{
			LongTime:      &protection.LongTime{Pickup: nan, PickupTolerance: protection.Spread{Low: 2, High: 1}, TimeTolerance: protection.TimeTolerance{Fast: -1}},
			ShortTime:     &protection.ShortTime{PickupTolerance: protection.Exactly(), Ramp: -1},
			Instantaneous: &protection.Instantaneous{Pickup: -5, PickupTolerance: protection.Exactly(), Delay: -1}, BreakTime: 99,
		}, []string{"pickup of the long time is not finite", "delay of the long time is 0", "multiple of the long time is 0", "pickup tolerance of the long time is 2 to 1", "time tolerance of the long time",
			"pickup of the short time is 0", "delay of the short time is 0", "ramp of the short time", "pickup of the instantaneous is -5 A", "delay of the instantaneous is -1 s", "break time is 99 s"}},
		{"instantaneous without time", protection.Release{Instantaneous: &protection.Instantaneous{Pickup: 5, PickupTolerance: protection.Exactly()}, CurveIncludesBreakTime: true},
			[]string{"clearing time of the instantaneous is missing"}},
	} {
		t.Run(row.name, func(t *testing.T) {
			t.Parallel()
			band, err := row.release.Clearing(1000)
			if err == nil {
				t.Fatalf("got %v", band)
			}
			for _, want := range row.want {
				if !strings.Contains(err.Error(), want) {
					t.Errorf("%q is not in %q", want, err)
				}
			}
			if _, err := row.release.Breaks(); err == nil {
				t.Error("breaks gave no error")
			}
			if _, err := protection.ClearsFrom(row.release); err == nil {
				t.Error("the smallest current gave no error")
			}
			if _, err := row.release.LargestJouleIntegral(1, 2); err == nil {
				t.Error("the largest Joule integral gave no error")
			}
		})
	}
	for _, current := range []units.Ampere{0, -1, nan, units.Ampere(math.Inf(1))} {
		if band, err := q1().Clearing(current); err == nil {
			t.Errorf("%v A gave %v", float64(current), band)
		}
		if _, err := q1().LargestJouleIntegral(current, 20e3); err == nil {
			t.Errorf("a range from %v A gave no error", float64(current))
		}
	}
	for _, others := range []units.Ampere{-1, nan, 2e7} {
		if _, err := protection.LargestJouleIntegralWith(q1(), 10e3, 20e3, others); err == nil {
			t.Errorf("%v A from other sources gave no error", float64(others))
		}
	}
	if _, err := q1().LargestJouleIntegral(20e3, 10e3); err == nil {
		t.Error("a range that falls gave no error")
	}
}
