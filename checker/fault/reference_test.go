package fault_test

import (
	"testing"

	"boardproof/checker/fault"
	"boardproof/checker/units"
)

// referenceTolerance is the most our currents may differ from those of the network library,
// which prints five or six digits. Where a motor feeds the fault, the library's one κ for
// the bus is that of method C.
const referenceTolerance = 1e-5

type referenceCases struct {
	Cases []struct {
		ID          string
		Tolerance   float64 `yaml:"voltage_tolerance_percent"`
		Network     networkData
		Transformer transformerData
		Cable       cableData
		Motor       *motorData
		Max         struct {
			Ik3, Ip, Ik2, R, X float64
			Ith1s              float64 `yaml:"ith_1s"`
			Ith100ms           float64 `yaml:"ith_100ms"`
		}
		MaxAtTransformer struct{ Ik3 float64 } `yaml:"max_at_transformer"`
		Motors           struct {
			Ik3, Ip     float64
			Ik3Network  float64 `yaml:"ik3_network"`
			IpBranchSum float64 `yaml:"ip_branch_sum"`
		}
		MinLibrary struct {
			WithKT    float64 `yaml:"with_kt"`
			WithoutKT float64 `yaml:"without_kt"`
		} `yaml:"min_library"`
		Min2016 struct{ Ik3 float64 } `yaml:"min_2016"`
	}
}

func TestReferenceCases(t *testing.T) {
	t.Parallel()
	data := read[referenceCases](t, "reference-cases.yaml")
	if len(data.Cases) != 18 {
		t.Fatalf("read %d cases, expected 18", len(data.Cases))
	}
	for _, c := range data.Cases {
		t.Run(c.ID, func(t *testing.T) {
			t.Parallel()
			const nominal = units.Volt(400)
			worst := 0.0
			compare := func(what string, got units.Ampere, want float64) {
				t.Helper()
				worst = max(worst, within(t, what, kiloampere(got), want, referenceTolerance))
			}
			ratio := c.Transformer.ratio()
			cMax := must(fault.VoltageFactorMax(nominal, units.Percentage(c.Tolerance/100)))
			inParallel := func(one fault.Impedance) fault.Impedance {
				all := make([]fault.Impedance, max(1, c.Transformer.Count))
				for i := range all {
					all[i] = one
				}
				return parallel(all...)
			}

			// largest current
			source := series(c.Network.largest(ratio), inParallel(c.Transformer.corrected(cMax)))
			if c.MaxAtTransformer.Ik3 > 0 {
				compare("I\"k3 at the transformer", must(fault.InitialCurrent(cMax, nominal, source)), c.MaxAtTransformer.Ik3)
			}
			z := series(source, c.Cable.at(20))
			initial := must(fault.InitialCurrent(cMax, nominal, z))
			total, bus := initial, z
			kappa := must(fault.PeakFactor(must(fault.ROverX(z))))
			if c.Motor != nil {
				motor := c.Motor.impedance()
				within(t, "R/X of low-voltage motors", float64(fault.LowVoltageMotorROverX), c.Motor.RX, rounding)
				im := must(fault.InitialCurrent(cMax, nominal, motor))
				compare("I\"k3 of the motor", im, c.Motors.Ik3)
				compare("ip of the motor", peak(motor, im), c.Motors.Ip)
				compare("I\"k3 of the network", initial, c.Motors.Ik3Network)
				total = must(fault.TotalCurrent(
					fault.BranchCurrent{Current: initial, ROverX: must(fault.ROverX(z))},
					fault.BranchCurrent{Current: im, ROverX: must(fault.ROverX(motor))}))
				compare("ip, sum of branches", must(fault.SumOfCurrents(peak(z, initial), peak(motor, im))), c.Motors.IpBranchSum)
				bus = parallel(z, motor)
				slow := parallel(scaled(z, at20Hz), scaled(motor, at20Hz))
				kappa = must(fault.PeakFactor(must(fault.ROverX(slow)) * at20Hz))
			}
			compare("ip, one κ for the bus", must(fault.PeakCurrent(kappa, total)), c.Max.Ip)
			compare("I\"k3 max", total, c.Max.Ik3)
			compare("I\"k2 max", must(fault.LineToLineCurrent(total)), c.Max.Ik2)
			within(t, "R", milliohm(bus.Resistance), c.Max.R, referenceTolerance)
			within(t, "X", milliohm(bus.Reactance), c.Max.X, referenceTolerance)

			for duration, want := range map[units.Second]float64{1: c.Max.Ith1s, 0.1: c.Max.Ith100ms} {
				m := must(fault.DirectCurrentHeat(50, duration, kappa))
				ith := must(fault.ThermalEquivalentCurrent(total, fault.HeatFactors{DirectCurrent: m, AlternatingCurrent: 1}))
				compare("Ith", ith, want)
			}

			// smallest current: motors off
			feeding, hot := c.Network.smallest(ratio), c.Cable.at(units.Celsius(max(20, c.Cable.End)))
			plain := series(feeding, inParallel(c.Transformer.plain()), hot)
			withKT := series(feeding, inParallel(c.Transformer.corrected(cMax)), hot)
			c2001 := must(fault.VoltageFactorMin2001(nominal, units.Percentage(c.Tolerance/100)))
			c2016 := must(fault.VoltageFactorMin(nominal, units.Percentage(c.Tolerance/100)))
			compare("I\"k3 min, c 0.95, with K_T", must(fault.InitialCurrent(c2001, nominal, withKT)), c.MinLibrary.WithKT)
			compare("I\"k3 min, c 0.95, without K_T", must(fault.InitialCurrent(c2001, nominal, plain)), c.MinLibrary.WithoutKT)
			compare("I\"k3 min, edition 2016", must(fault.InitialCurrent(c2016, nominal, plain)), c.Min2016.Ik3)
			t.Logf("largest relative difference of the currents %.1g", worst)
		})
	}
}

type earthFaults struct {
	Cases []struct {
		ID          string
		Network     networkData
		Transformer transformerData
		Cable       cableData
		Max, Min    struct{ Ik1 float64 }
	}
}

func TestEarthFaults(t *testing.T) {
	t.Parallel()
	data := read[earthFaults](t, "earth-faults.yaml")
	if len(data.Cases) != 4 {
		t.Fatalf("read %d cases, expected 4", len(data.Cases))
	}
	for _, c := range data.Cases {
		t.Run(c.ID, func(t *testing.T) {
			t.Parallel()
			zero := c.Transformer
			zero.UkPercent, zero.UrPercent = c.Transformer.Uk0, c.Transformer.Ur0
			// the library corrects the zero-sequence impedance with the factor of the positive one
			k := c.Transformer.correction(1.1)
			z0 := fault.Impedance{
				Resistance: must(fault.CorrectedResistance(k, zero.plain().Resistance)),
				Reactance:  must(fault.CorrectedReactance(k, zero.plain().Reactance)),
			}
			within(t, "X0/X1", float64(zero.plain().Reactance/c.Transformer.plain().Reactance), float64(fault.DynReactanceRatio), referenceTolerance)
			current := func(factor units.Ratio, feeding fault.Impedance, temperature units.Celsius) units.Ampere {
				cable := c.Cable.at(temperature)
				return must(fault.EarthFaultCurrent(factor, 400, fault.Sequences{
					Positive: series(feeding, c.Transformer.corrected(1.1), cable),
					Zero:     series(z0, zeroSequence(cable, c.Cable.R0, c.Cable.X0)),
				}))
			}
			ratio := c.Transformer.ratio()
			within(t, "Ik1 max", kiloampere(current(1.1, c.Network.largest(ratio), 20)), c.Max.Ik1, referenceTolerance)
			within(t, "Ik1 min", kiloampere(current(0.95, c.Network.smallest(ratio), units.Celsius(max(20, c.Cable.End)))), c.Min.Ik1, referenceTolerance)
		})
	}
}
