package fault_test

import (
	"testing"

	"boardproof/checker/fault"
	"boardproof/checker/units"
)

// TestFaultLevels recomputes a published table of 42 fault levels.
func TestFaultLevels(t *testing.T) {
	t.Parallel()
	data := read[struct {
		Volt float64 `yaml:"voltage_v"`
		KVA  []float64
		Rows []struct {
			Kind string
			MVA  float64
			KA   []printed
		}
	}](t, "fault-levels.yaml")
	cells := 0
	for _, row := range data.Rows {
		for i, kva := range data.KVA {
			uk := units.Percentage(0.06)
			if row.Kind == "oil" && kva <= 630 {
				uk = 0.04
			}
			volt := units.Volt(data.Volt)
			zq := must(fault.FeederImpedanceFromPower(1, volt, units.VoltAmpere(row.MVA*1e6)))
			zt := must(fault.TransformerImpedance(uk, volt, units.VoltAmpere(kva*1e3)))
			sum := fault.Impedance{Reactance: must(fault.SeriesOhms(zq, zt))}
			asPrinted(t, row.Kind, kiloampere(must(fault.InitialCurrent(1, volt, sum))), row.KA[i])
			cells++
		}
	}
	if cells != 42 {
		t.Errorf("compared %d cells, expected 42", cells)
	}
}
