package protection_test

import (
	"errors"
	"math"
	"os"
	"strconv"
	"strings"
	"testing"

	"gopkg.in/yaml.v3"

	"boardproof/checker/protection"
	"boardproof/checker/units"
)

// written is a number with half a unit of its last place as tolerance.
type written struct {
	value, half float64
}

func (w *written) UnmarshalYAML(node *yaml.Node) error {
	v, err := strconv.ParseFloat(node.Value, 64)
	if err != nil {
		return err
	}
	mantissa, exponent, _ := strings.Cut(node.Value, "e")
	power, _ := strconv.Atoi(exponent)
	if _, after, found := strings.Cut(mantissa, "."); found {
		power -= len(after)
	}
	*w = written{v, 0.5000001 * math.Pow10(power)}
	return nil
}

func (w written) check(t *testing.T, what string, got float64) {
	t.Helper()
	if !(math.Abs(got-w.value) <= w.half) {
		t.Errorf("%s: got %.6g, written %v", what, got, w.value)
	}
}

func read[T any](t *testing.T, name string) T {
	t.Helper()
	file, err := os.Open("../../testdata/iec60255/" + name)
	if err != nil {
		t.Fatal(err)
	}
	defer file.Close()
	decoder := yaml.NewDecoder(file)
	decoder.KnownFields(true)
	var data T
	if err := decoder.Decode(&data); err != nil {
		t.Fatal(err)
	}
	return data
}

func TestInverseCurves(t *testing.T) {
	t.Parallel()
	data := read[struct {
		Multiples []units.Multiple
		Curves    map[string]struct {
			K, Alpha, C float64
			Times       []written
		}
	}](t, "curves.yaml")
	if names := protection.CurveNames(); len(names) != len(data.Curves) || len(names) != 8 {
		t.Errorf("the table has %d curves, the file %d", len(names), len(data.Curves))
	}
	for name, want := range data.Curves {
		curve, err := protection.CurveNamed(name)
		if err != nil {
			t.Error(err)
			continue
		}
		if curve.K != want.K || curve.Alpha != want.Alpha || curve.C != want.C || curve.Standard == "" {
			t.Errorf("%s has the constants %v", name, curve)
		}
		for i, multiple := range data.Multiples {
			got, err := curve.Delay(1, multiple)
			if err != nil {
				t.Fatal(err)
			}
			want.Times[i].check(t, name, float64(got))
			half, err := curve.Delay(0.5, multiple)
			if err != nil || math.Abs(float64(half/got)-0.5) > exact {
				t.Errorf("%s at half the multiplier: %v, %v", name, half, err)
			}
		}
		for _, multiple := range []units.Multiple{1, 0.5, -2, units.Multiple(math.NaN()), units.Multiple(math.Inf(1))} {
			if got, err := curve.Delay(1, multiple); err == nil {
				t.Errorf("%s at %v: %v", name, float64(multiple), got)
			}
		}
	}
	if _, err := protection.CurveNamed("inverse"); err == nil || !strings.Contains(err.Error(), "IEC very inverse") {
		t.Errorf("an unknown curve gave %v", err)
	}
	curve, err := protection.CurveNamed("IEEE very inverse")
	if err != nil {
		t.Fatal(err)
	}
	if got, want := curve.Formula().Plain(), "t = TMS·(19.61/(I/I_s^2 − 1) + 0.491)"; got != want {
		t.Errorf("the formula is %q, expected %q", got, want)
	}
}

// hv is the relay before the transformer of the invented board, at nominal values.
func hv(t *testing.T) protection.Relay {
	t.Helper()
	curve, err := protection.CurveNamed("IEC extremely inverse")
	if err != nil {
		t.Fatal(err)
	}
	return protection.Relay{
		Inverse: &protection.Inverse{Curve: curve, Pickup: 120, PickupTolerance: protection.Exactly(), Multiplier: 0.3,
			OperatesFrom: protection.DefaultOperatesFrom},
		BreakTime: 0.07,
	}
}

func TestOwnCrossCheck(t *testing.T) {
	t.Parallel()
	type point struct {
		At        units.Ampere
		Time      *written
		Joule     *written    `yaml:"joule_integral"`
		Tolerance units.Ratio `yaml:"short_time_tolerance"`
	}
	data := read[struct{ Relay, Release []point }](t, "own-cross-check.yaml")
	for _, p := range data.Relay {
		band, err := hv(t).Clearing(p.At)
		if err != nil {
			t.Fatal(err)
		}
		p.Time.half *= 2 // the current is rounded too
		p.Time.check(t, units.Format(p.At), float64(band.Slow))
	}
	for _, p := range data.Release {
		spread := protection.Exactly()
		if p.Tolerance > 0 {
			spread.High = p.Tolerance
		}
		r := protection.Release{
			LongTime:  &protection.LongTime{Pickup: 2500, PickupTolerance: protection.Exactly(), Delay: 12, At: 6},
			ShortTime: &protection.ShortTime{Pickup: 12.5e3, PickupTolerance: spread, Delay: 0.3},
			BreakTime: 0.05,
		}
		band, err := r.Clearing(p.At)
		if err != nil {
			t.Fatal(err)
		}
		if p.Time != nil {
			p.Time.check(t, units.Format(p.At), float64(band.Slow))
		}
		if p.Joule != nil {
			p.Joule.check(t, units.Format(p.At), float64(band.Slow)*float64(p.At)*float64(p.At))
		}
		if p.At != 12400 {
			continue
		}
		// over the range of faults the small one governs, a hair below the pickup
		largest, err := r.LargestJouleIntegral(10e3, 41.8e3)
		if err != nil {
			t.Fatal(err)
		}
		p.Joule.check(t, "largest", float64(largest.JouleIntegral))
		if largest.By != "long time" || !largest.JustBelow || largest.At >= 12.5e3 || largest.At < 12.499e3 {
			t.Errorf("the largest lies at %+v", largest)
		}
		// bolted faults alone let through less
		largest, err = r.LargestJouleIntegral(27.1e3, 41.8e3)
		if err != nil || largest.At != 41.8e3 || largest.JustBelow || largest.By != "short time" {
			t.Errorf("bolted faults: %+v, %v", largest, err)
		}
	}
}

func TestRelayTolerance(t *testing.T) {
	t.Parallel()
	r := hv(t)
	r.Inverse.PickupTolerance = protection.DefaultRelayPickup.Times(protection.DefaultCurrentTransformer.Spread)
	r.Inverse.Error = protection.DefaultRelayError
	near(t, "combined upper spread", float64(r.Inverse.PickupTolerance.High), 1.155)
	near(t, "combined lower spread", float64(r.Inverse.PickupTolerance.Low), 0.855)
	curve := func(m float64) float64 { return 0.3 * 80 / (m*m - 1) }
	late, early := 120*1.155, 120*0.855
	for _, row := range []struct {
		name       string
		current    float64
		fast, slow float64
	}{
		{"below 5 times", late * 4.999, curve(late*4.999/early) * 0.875, curve(4.999) * 1.125},
		{"at 5 times", 693, curve(693/early) * 0.925, curve(5) * 1.075},
		{"below 10 times", late * 6, curve(late*6/early) - 0.030, curve(6) * 1.075},
		{"least time", late * 9, curve(late*9/early) - 0.030, curve(9) + 0.030},
		{"above 20 times", late * 40, 0, curve(20) + 0.030},
	} {
		band, err := r.Clearing(units.Ampere(row.current))
		if err != nil {
			t.Fatal(err)
		}
		near(t, row.name+", slow edge", float64(band.Slow), row.slow+0.07)
		near(t, row.name+", fast edge", float64(band.Fast), math.Max(0, row.fast))
	}
	breaks, err := r.Breaks()
	if err != nil || len(breaks) != 4 {
		t.Fatalf("breaks are %v, %v", breaks, err)
	}
	for i, multiple := range []float64{1.1, 5, 10, 20} {
		near(t, "break", float64(breaks[i]), late*multiple)
	}
	// just below the step of accuracy the wider tolerance holds
	largest, err := r.LargestJouleIntegral(units.Ampere(late*4.9), units.Ampere(late*5.05))
	if err != nil || !largest.JustBelow {
		t.Fatalf("%+v, %v", largest, err)
	}
	near(t, "limit from below", float64(largest.Time), curve(5)*1.125+0.07)
	var not *protection.NotClearing
	if _, err := r.Clearing(units.Ampere(late * 1.09)); !errors.As(err, &not) {
		t.Errorf("below the threshold: %v", err)
	}
}

func TestRelayStages(t *testing.T) {
	t.Parallel()
	r := hv(t)
	r.Stages = []protection.Stage{
		{Pickup: 600, PickupTolerance: protection.Exactly(), Delay: 0.25},
		{Pickup: 2000, PickupTolerance: protection.Exactly()},
	}
	for current, want := range map[units.Ampere]string{300: "inverse stage", 700: "stage 1", 2000: "stage 2"} {
		band, err := r.Clearing(current)
		if err != nil || band.SlowBy != want {
			t.Errorf("%v: %+v, %v", current, band, err)
		}
	}
	bad := protection.Relay{Inverse: &protection.Inverse{PickupTolerance: protection.Exactly()}, Stages: []protection.Stage{{Delay: -1}}}
	_, err := bad.Clearing(100)
	if err == nil {
		t.Fatal("a relay without settings was accepted")
	}
	for _, want := range []string{"pickup of the inverse stage", "time multiplier", "no curve", "operates from", "pickup of the stage 1", "pickup tolerance of the stage 1", "delay of the stage 1", "break time is missing"} {
		if !strings.Contains(err.Error(), want) {
			t.Errorf("%q is not in %q", want, err)
		}
	}
	if _, err := bad.Breaks(); err == nil {
		t.Error("breaks of a relay without settings")
	}
}
