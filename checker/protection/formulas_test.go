package protection_test

import (
	"math"
	"os"
	"strings"
	"testing"

	"boardproof/checker/protection"
	"boardproof/checker/units"
	"boardproof/checker/working"
)

func TestFormulasAgreeWithDevices(t *testing.T) {
	t.Parallel()
	r := q1()
	nominal, err := protection.LongTimeDelay(12, 6, protection.LongTimeCurrents{Pickup: 2500, Current: 9500})
	if err != nil {
		t.Fatal(err)
	}
	slow, err := protection.SlowEdge(protection.SlowEdgeTimes{Nominal: nominal, Relative: r.LongTime.TimeTolerance.Slow, Least: r.LongTime.TimeTolerance.Least, BreakTime: r.BreakTime})
	if err != nil {
		t.Fatal(err)
	}
	band, err := r.Clearing(9500)
	if err != nil {
		t.Fatal(err)
	}
	near(t, "long time", float64(slow), float64(band.Slow))

	r.ShortTime.Ramp = 20e3
	nominal, err = protection.RampDelay(0.2, protection.RampCurrents{Corner: 20e3, Current: 12e3})
	if err != nil {
		t.Fatal(err)
	}
	slow, err = protection.SlowEdge(protection.SlowEdgeTimes{Nominal: nominal, BreakTime: r.BreakTime})
	if err != nil {
		t.Fatal(err)
	}
	band, err = r.Clearing(12e3)
	if err != nil {
		t.Fatal(err)
	}
	near(t, "ramp", float64(slow), float64(band.Slow))

	relay := hv(t)
	nominal, err = relay.Inverse.Curve.Delay(relay.Inverse.Multiplier, 1032.0/120)
	if err != nil {
		t.Fatal(err)
	}
	slow, err = protection.SlowEdge(protection.SlowEdgeTimes{Nominal: nominal, BreakTime: relay.BreakTime})
	if err != nil {
		t.Fatal(err)
	}
	band, err = relay.Clearing(1032)
	if err != nil {
		t.Fatal(err)
	}
	near(t, "relay", float64(slow), float64(band.Slow))

	for _, f := range []*working.Formula{&protection.LongTimeDelayFormula, &protection.RampDelayFormula, &protection.SlowEdgeFormula, relay.Inverse.Curve.Formula()} {
		if f.Source.String() == "" || f.Name == "" || f.ID == "" {
			t.Errorf("%v lacks name or source", f)
		}
		for _, interval := range f.Range {
			if !strings.Contains(f.Equation, "{"+interval.Symbol+"}") {
				t.Errorf("%s has no operand %s", f.ID, interval.Symbol)
			}
		}
	}
	nan := math.NaN()
	for _, err := range []error{
		second(protection.LongTimeDelay(units.Second(nan), 6, protection.LongTimeCurrents{Pickup: 2500, Current: 9500})),
		second(protection.LongTimeDelay(12, 6, protection.LongTimeCurrents{Pickup: 2500})),
		second(protection.RampDelay(0.2, protection.RampCurrents{Corner: 10e3, Current: 12e3})),
		second(protection.RampDelay(0.2, protection.RampCurrents{Corner: units.Ampere(nan), Current: 12e3})),
		second(protection.SlowEdge(protection.SlowEdgeTimes{Nominal: units.Second(math.Inf(1))})),
	} {
		if err == nil {
			t.Error("an impossible argument was accepted")
		}
	}
}

func second[U any](_ U, err error) error { return err }

func TestAssumptionsNameTheirSource(t *testing.T) {
	t.Parallel()
	for _, p := range []protection.PickupAssumption{protection.DefaultLongTimePickup, protection.DefaultShortTimePickup, protection.DefaultInstantaneousPickup, protection.DefaultRelayPickup, protection.DefaultCurrentTransformer} {
		if p.Why == "" || p.Source.String() == "" || p.Low <= 0 || p.High < p.Low {
			t.Errorf("%+v", p)
		}
	}
	for _, p := range []protection.TimeAssumption{protection.DefaultLongTimeDelay, protection.DefaultShortTimeDelay} {
		if p.Why == "" || p.Source.String() == "" {
			t.Errorf("%+v", p)
		}
	}
	if protection.DefaultRelayErrorSource.String() == "" {
		t.Error("the error of relays has no source")
	}
	table, err := os.ReadFile("tables/inverse_curves.csv")
	if err != nil {
		t.Fatal(err)
	}
	if n := strings.Count(string(table), "\n"); n != 13 {
		t.Errorf("the table has %d lines, expected 13", n)
	}
}
