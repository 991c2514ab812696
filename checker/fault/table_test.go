package fault_test

import (
	"crypto/sha256"
	"fmt"
	"math"
	"os"
	"path/filepath"
	"strings"
	"testing"

	"boardproof/checker/fault"
	"boardproof/checker/units"
)

// TestTablesAreAsRead pins number of rows and content, so that a change of a table is seen.
func TestTablesAreAsRead(t *testing.T) {
	t.Parallel()
	for name, want := range map[string]struct {
		rows int
		sum  string
	}{
		"voltage_factor.csv":       {6, "ce711d92660d"},
		"peak_ratio.csv":           {5, "4668590712c1"},
		"conductor_resistance.csv": {34, "4ec54091b926"},
		"load_loss.csv":            {15, "ac5b66351d89"},
	} {
		data, err := os.ReadFile(filepath.Join("tables", name))
		if err != nil {
			t.Fatal(err)
		}
		rows := -1 // the header
		for line := range strings.Lines(string(data)) {
			if !strings.HasPrefix(line, "#") {
				rows++
			}
		}
		if sum := fmt.Sprintf("%x", sha256.Sum256(data))[:12]; rows != want.rows || sum != want.sum {
			t.Errorf("%s has %d rows and checksum %s, expected %d and %s", name, rows, sum, want.rows, want.sum)
		}
	}
}

func TestVoltageFactors(t *testing.T) {
	t.Parallel()
	for _, row := range []struct {
		volt             units.Volt
		tolerance        units.Percentage
		max, min, min01  units.Ratio
		refused          bool
		refusedInMessage string
	}{
		{volt: 400, tolerance: 0.06, max: 1.05, min: 0.95, min01: 0.95},
		{volt: 400, tolerance: 0.10, max: 1.10, min: 0.90, min01: 0.95},
		{volt: 400, tolerance: 0.061, max: 1.10, min: 0.90, min01: 0.95},
		{volt: 100, tolerance: 0.05, max: 1.05, min: 0.95, min01: 0.95},
		{volt: 1000, tolerance: 0.10, max: 1.10, min: 0.90, min01: 0.95},
		{volt: 690, tolerance: 0, max: 1.05, min: 0.95, min01: 0.95},
		{volt: 400, tolerance: 0.11, refused: true, refusedInMessage: "ΔU is 11 %"},
		{volt: 400, tolerance: -0.01, refused: true, refusedInMessage: "ΔU is -1 %"},
		{volt: 99, tolerance: 0.06, refused: true, refusedInMessage: "U_n is 99 V"},
		{volt: 1001, tolerance: 0.06, refused: true, refusedInMessage: "U_n is 1001 V"},
	} {
		t.Run(units.Format(row.volt)+" "+units.Format(row.tolerance), func(t *testing.T) {
			t.Parallel()
			largest, err := fault.VoltageFactorMax(row.volt, row.tolerance)
			if row.refused {
				if err == nil || !strings.Contains(err.Error(), row.refusedInMessage) {
					t.Fatalf("got %v and error %v, expected an error with %q", largest, err, row.refusedInMessage)
				}
				return
			}
			smallest, err2 := fault.VoltageFactorMin(row.volt, row.tolerance)
			smallest01, err3 := fault.VoltageFactorMin2001(row.volt, row.tolerance)
			if err != nil || err2 != nil || err3 != nil || largest != row.max || smallest != row.min || smallest01 != row.min01 {
				t.Errorf("got %v %v %v, %v %v %v", largest, smallest, smallest01, err, err2, err3)
			}
		})
	}
	for volt, fine := range map[units.Volt]bool{11e3: true, 1100: true, 35e3: true, 400: false, 1000: false, 36e3: false} {
		c, err := fault.FeederVoltageFactorMax(volt)
		d, err2 := fault.FeederVoltageFactorMin(volt)
		if fine != (err == nil && err2 == nil && c == 1.1 && d == 1) || !fine && (err == nil || err2 == nil) {
			t.Errorf("feeder at %v: %v %v %v %v", volt, c, d, err, err2)
		}
	}
	if _, _, err := fault.MinimumVoltageFactor("1988"); err == nil || !strings.Contains(err.Error(), "1988") {
		t.Errorf("edition 1988: %v", err)
	}
	for edition, want := range map[fault.Edition]units.Ratio{fault.Edition2001: 0.95, fault.Edition2016: 0.90} {
		f, function, err := fault.MinimumVoltageFactor(edition)
		if err != nil || f.Source.Edition != string(edition) {
			t.Fatalf("edition %s: %v, %v", edition, f, err)
		}
		if c := must(function(400, 0.10)); c != want {
			t.Errorf("edition %s: c_min %v, expected %v", edition, c, want)
		}
	}
}

func TestConductorResistance(t *testing.T) {
	t.Parallel()
	for _, row := range []struct { // picked by hand from the print
		material fault.Material
		mm2      float64
		ohmPerKM float64
	}{{fault.Copper, 1.5, 12.1}, {fault.Copper, 240, 0.0754}, {fault.Copper, 630, 0.0283}, {fault.Aluminium, 35, 0.868}, {fault.Aluminium, 240, 0.125}} {
		got, err := fault.StrandedResistance(row.material, units.SquareMetre(row.mm2*1e-6))
		if err != nil || math.Abs(float64(got)*1e3/row.ohmPerKM-1) > rounding {
			t.Errorf("%s %v mm²: %v, %v", row.material, row.mm2, got, err)
		}
		// the printed limit lies between the two ends of bar resistance, or above: strands are longer than the cable
		low := must(fault.SmallestBarResistance(row.material, units.SquareMetre(row.mm2*1e-6)))
		high := must(fault.LargestBarResistance(row.material, units.SquareMetre(row.mm2*1e-6)))
		if got < low || low >= high || float64(got) > 1.05*float64(high) {
			t.Errorf("%s %v mm²: table %v, bar %v to %v", row.material, row.mm2, got, low, high)
		}
	}
	for _, row := range []struct {
		material fault.Material
		mm2      float64
		want     string
	}{{fault.Copper, 239, "one of 1.5, 2.5, 4"}, {fault.Aluminium, 6, "one of 10, 16"}, {"steel", 50, "expected copper or aluminium"}} {
		if got, err := fault.StrandedResistance(row.material, units.SquareMetre(row.mm2*1e-6)); err == nil || !strings.Contains(err.Error(), row.want) {
			t.Errorf("%s %v mm²: %v, %v", row.material, row.mm2, got, err)
		}
	}
	if got, err := fault.SmallestBarResistance("steel", 1e-4); err == nil {
		t.Errorf("a steel bar has %v", got)
	}
	if got, err := fault.LineResistance(1e-4, 10, 1.5); err == nil {
		t.Errorf("one and a half cables in parallel have %v", got)
	}
}

func TestTypicalLoadLoss(t *testing.T) {
	t.Parallel()
	exact := must(fault.TypicalLoadLoss(1600e3))
	if exact != (fault.LoadLosses{Smallest: 12000, Middle: 14000, Largest: 20000}) {
		t.Errorf("1600 kVA: %v", exact)
	}
	between := must(fault.TypicalLoadLoss(1500e3)) // 12000·1500/1600, 16000·1500/1250
	if math.Abs(float64(between.Smallest)-11250) > 1e-6 || math.Abs(float64(between.Largest)-19200) > 1e-6 || between.Middle <= 11000 || between.Middle >= 14000 {
		t.Errorf("1500 kVA: %v", between)
	}
	for _, rating := range []units.VoltAmpere{49e3, 3151e3, units.VoltAmpere(math.NaN())} {
		if got, err := fault.TypicalLoadLoss(rating); err == nil {
			t.Errorf("%v: %v", rating, got)
		}
	}
}

func TestImpedanceTolerance(t *testing.T) {
	t.Parallel()
	for uk, want := range map[units.Percentage]units.Percentage{0.04: 0.10, 0.0999: 0.10, 0.10: 0.075, 0.125: 0.075} {
		if got := must(fault.ImpedanceTolerance(uk)); got != want {
			t.Errorf("uk %v: ±%v, expected ±%v", uk, got, want)
		}
	}
	if _, err := fault.TransformerReactance(fault.TransformerParts{Impedance: 0.006, Resistance: 0.006}); err == nil {
		t.Error("a transformer without reactance was accepted")
	}
}
