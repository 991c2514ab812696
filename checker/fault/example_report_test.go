package fault_test

import (
	"math"
	"testing"

	"boardproof/checker/fault"
	"boardproof/checker/units"
)

type report struct {
	Clause3 struct {
		CMax           float64 `yaml:"c_max"`
		NominalV       float64 `yaml:"nominal_v"`
		Network        networkData
		T1             transformerData `yaml:"T1"`
		T2             transformerData `yaml:"T2"`
		L1             cableData       `yaml:"L1"`
		L2             cableData       `yaml:"L2"`
		L3             cableData       `yaml:"L3"`
		L4             cableData       `yaml:"L4"`
		Published      map[string][2]printed
		RecomputedData struct {
			Ik3, Ik1 [3]float64
			Ip       [3]float64 `yaml:"ip_method_c"`
		} `yaml:"recomputed"`
	} `yaml:"clause_3"`
	Clause4 struct {
		Network     networkData
		Cable       cableData
		Transformer transformerData
		Motor1      motorData `yaml:"motor_1"`
		Motor2      motorData `yaml:"motor_2"`
		Published   map[string][2]printed
	} `yaml:"clause_4"`
}

// recomputedTolerance: the file gives five digits.
const recomputedTolerance = 3e-5

// at20Hz is the frequency of method C over the network's.
const at20Hz = 20.0 / 50

// steppedTolerance is for published values that were computed from rounded intermediate ones.
const steppedTolerance = 1e-3

// nearPrinted compares within the rounding of the print or the steppedTolerance.
func nearPrinted(t *testing.T, what string, got float64, want printed) {
	t.Helper()
	if math.Abs(got-want.value) > want.half {
		t.Logf("%s: deviates by %.2g", what, within(t, what, got, want.value, steppedTolerance))
	}
}

// scaled is an impedance with its reactance at another frequency: method C, which the
// package does not offer, serves here to check the network against the published peaks.
func scaled(z fault.Impedance, by float64) fault.Impedance {
	z.Reactance *= units.Ohm(by)
	return z
}

func TestReportClause3(t *testing.T) {
	t.Parallel()
	data := read[report](t, "tr60909-4.yaml").Clause3
	c, nominal := units.Ratio(data.CMax), units.Volt(data.NominalV)
	if got := must(fault.VoltageFactorMax(nominal, 0.06)); got != c {
		t.Errorf("c_max at 6 %%: computed %v, expected %v", got, c)
	}
	zq := must(fault.FeederImpedanceFromCurrent(units.Ratio(data.Network.C), units.Volt(data.Network.KV*1e3), units.Ampere(data.Network.IkKA*1e3)))
	q := feederUnstated(zq, data.T1.ratio())
	t1, t2 := data.T1.corrected(c), data.T2.corrected(c)
	t1Zero, t2Zero := zeroSequence(t1, data.T1.R0, data.T1.X0), zeroSequence(t2, data.T2.R0, data.T2.X0)
	l1, l2, l3, l4 := data.L1.at(20), data.L2.at(20), data.L3.at(20), data.L4.at(20)

	// F1 terminals of T1, F2 main busbar, F3 far end; the same network in any sequence and
	// at any frequency.
	network := func(q, t1, t2, l1, l2, l3, l4 fault.Impedance) [3]fault.Impedance {
		f1 := parallel(t1, series(t2, l2, l1))
		f2 := parallel(series(t1, l1), series(t2, l2))
		return [3]fault.Impedance{series(q, f1), series(q, f2), series(q, f2, l3, l4)}
	}
	positive := network(q, t1, t2, l1, l2, l3, l4)
	zero := network(fault.Impedance{}, t1Zero, t2Zero, zeroSequence(l1, data.L1.R0, data.L1.X0), zeroSequence(l2, data.L2.R0, data.L2.X0),
		zeroSequence(l3, data.L3.R0, data.L3.X0), zeroSequence(l4, data.L4.R0, data.L4.X0))
	slow := network(scaled(q, at20Hz), scaled(t1, at20Hz), scaled(t2, at20Hz), scaled(l1, at20Hz), scaled(l2, at20Hz), scaled(l3, at20Hz), scaled(l4, at20Hz))

	elements := map[string]fault.Impedance{
		"ZQt": q, "ZT1K": t1, "Z0T1": t1Zero, "ZT2K": t2, "Z0T2": t2Zero, "ZL1": l1, "ZL2": l2, "ZL3": l3, "ZL4": l4, "Zk_F1": positive[0],
	}
	if len(data.Published) != len(elements) {
		t.Errorf("the file has %d impedances, the test %d", len(data.Published), len(elements))
	}
	for name, want := range data.Published {
		nearPrinted(t, "R of "+name, milliohm(elements[name].Resistance), want[0])
		nearPrinted(t, "X of "+name, milliohm(elements[name].Reactance), want[1])
	}
	for i := range positive {
		ik := must(fault.InitialCurrent(c, nominal, positive[i]))
		within(t, "I\"k3", kiloampere(ik), data.RecomputedData.Ik3[i], recomputedTolerance*3)
		kappa := must(fault.PeakFactor(must(fault.ROverX(slow[i])) * at20Hz))
		within(t, "ip", kiloampere(must(fault.PeakCurrent(kappa, ik))), data.RecomputedData.Ip[i], recomputedTolerance*3)
		ik1 := must(fault.EarthFaultCurrent(c, nominal, fault.Sequences{Positive: positive[i], Zero: zero[i]}))
		within(t, "I\"k1", kiloampere(ik1), data.RecomputedData.Ik1[i], recomputedTolerance*5)
	}
}

func TestReportClause4(t *testing.T) {
	t.Parallel()
	data := read[report](t, "tr60909-4.yaml").Clause4
	ratio := data.Transformer.ratio()
	zq := must(fault.FeederImpedanceFromCurrent(units.Ratio(data.Network.C), units.Volt(data.Network.KV*1e3), units.Ampere(data.Network.IkKA*1e3)))
	line := data.Cable.at(20)
	within(t, "R/X of large high-voltage motors", float64(fault.LargeHighVoltageROverX), data.Motor1.RX, rounding)
	elements := map[string]fault.Impedance{
		"ZQt": feederUnstated(zq, ratio),
		"ZL":  {Resistance: must(fault.ReferredResistance(line.Resistance, ratio)), Reactance: must(fault.ReferredReactance(line.Reactance, ratio))},
		"ZTK": data.Transformer.corrected(1.1),
		"ZM1": data.Motor1.impedance(), "ZM2_group": data.Motor2.impedance(),
	}
	if len(data.Published) != len(elements) {
		t.Errorf("the file has %d impedances, the test %d", len(data.Published), len(elements))
	}
	for name, want := range data.Published {
		nearPrinted(t, "R of "+name, float64(elements[name].Resistance), want[0])
		nearPrinted(t, "X of "+name, float64(elements[name].Reactance), want[1])
	}
}

func TestExercise(t *testing.T) {
	t.Parallel()
	data := read[struct {
		Network struct {
			MVA, Volt float64
			CMax      float64 `yaml:"c_max"`
			CMin      float64 `yaml:"c_min"`
		}
		ZMax  printed `yaml:"z_max"`
		XMax  printed `yaml:"x_max"`
		ZMin  printed `yaml:"z_min"`
		XMin  printed `yaml:"x_min"`
		Cable struct {
			End    float64 `yaml:"end_temperature"`
			Factor printed
		}
	}](t, "lv-exercise.yaml")
	for _, row := range []struct {
		name string
		c    float64
		z, x printed
	}{{"largest", data.Network.CMax, data.ZMax, data.XMax}, {"smallest", data.Network.CMin, data.ZMin, data.XMin}} {
		z := must(fault.FeederImpedanceFromPower(units.Ratio(row.c), units.Volt(data.Network.Volt), units.VoltAmpere(data.Network.MVA*1e6)))
		asPrinted(t, row.name+" Z_Q", milliohm(z), row.z)
		asPrinted(t, row.name+" X_Q", milliohm(must(fault.FeederReactance(z, 0.1))), row.x)
	}
	asPrinted(t, "temperature factor", float64(must(fault.ResistanceAtTemperature(1, units.Celsius(data.Cable.End)))), data.Cable.Factor)
}
