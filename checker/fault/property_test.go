package fault_test

import (
	"math"
	"testing"

	"pgregory.net/rapid"

	"boardproof/checker/fault"
	"boardproof/checker/units"
)

// rounding is what the order of floating-point operations may change.
const rounding = 1e-9

func drawImpedance(t *rapid.T, name string) fault.Impedance {
	return fault.Impedance{
		Resistance: units.Ohm(rapid.Float64Range(1e-5, 0.1).Draw(t, "R "+name)),
		Reactance:  units.Ohm(rapid.Float64Range(2e-3, 0.1).Draw(t, "X "+name)),
	}
}

func TestCurrentFallsWithImpedance(t *testing.T) {
	t.Parallel()
	rapid.Check(t, func(t *rapid.T) {
		z := drawImpedance(t, "source")
		longer := series(z, drawImpedance(t, "link"))
		near, far := must(fault.InitialCurrent(1.1, 400, z)), must(fault.InitialCurrent(1.1, 400, longer))
		if far >= near {
			t.Fatalf("%v behind more impedance, %v before it", far, near)
		}
		if two := must(fault.LineToLineCurrent(near)); two >= near {
			t.Fatalf("line-to-line %v, three-phase %v", two, near)
		}
	})
}

func TestAnotherBranchNeverLowersTheTotal(t *testing.T) {
	t.Parallel()
	rapid.Check(t, func(t *rapid.T) {
		n := rapid.IntRange(1, 6).Draw(t, "branches")
		var zs []fault.Impedance
		var branches []fault.BranchCurrent
		var currents []units.Ampere
		before := units.Ampere(0)
		for range n {
			z := drawImpedance(t, "branch")
			i := must(fault.InitialCurrent(1.05, 400, z))
			zs, currents = append(zs, z), append(currents, i)
			branches = append(branches, fault.BranchCurrent{Current: i, ROverX: must(fault.ROverX(z))})
			total := must(fault.TotalCurrent(branches...))
			if total < before {
				t.Fatalf("total fell from %v to %v", before, total)
			}
			before = total
		}
		// the sum of currents is that of admittances, and never above the plain sum
		whole := must(fault.InitialCurrent(1.05, 400, parallel(zs...)))
		if math.Abs(float64(before/whole)-1) > rounding {
			t.Fatalf("sum of currents %v, of admittances %v", before, whole)
		}
		if plain := must(fault.SumOfCurrents(currents...)); float64(before) > float64(plain)*(1+rounding) {
			t.Fatalf("complex sum %v above the plain sum %v", before, plain)
		}
		if share := must(fault.BranchShare(fault.Share{Branch: currents[0], Total: before})); share < 0 || share > 1 {
			t.Fatalf("share %v", share)
		}
		if c := must(fault.ThermalEquivalentCurrent(before, fault.HeatFactors{AlternatingCurrent: 1})); math.Abs(float64(c/before)-1) > rounding {
			t.Fatalf("Ith %v without d.c. component, I\"k %v", c, before)
		}
	})
}

func TestEqualBranchesInParallel(t *testing.T) {
	t.Parallel()
	rapid.Check(t, func(t *rapid.T) {
		z := drawImpedance(t, "unit")
		n := rapid.IntRange(1, 8).Draw(t, "n")
		all := make([]fault.Impedance, n)
		for i := range all {
			all[i] = z
		}
		got := parallel(all...)
		for _, pair := range [][2]units.Ohm{{got.Resistance, z.Resistance}, {got.Reactance, z.Reactance}} {
			if math.Abs(float64(pair[0])*float64(n)/float64(pair[1])-1) > rounding {
				t.Fatalf("%d in parallel: %v of %v", n, pair[0], pair[1])
			}
		}
	})
}

// TestLargestIsNotBelowSmallest takes both chains over the same supply.
func TestLargestIsNotBelowSmallest(t *testing.T) {
	t.Parallel()
	rapid.Check(t, func(t *rapid.T) {
		network := networkData{KV: 11, RXMax: 0.1, RXMin: 0.1}
		network.MinMVA = rapid.Float64Range(20, 300).Draw(t, "min MVA")
		network.MaxMVA = network.MinMVA * rapid.Float64Range(1, 4).Draw(t, "max over min")
		rating := rapid.Float64Range(100, 3150).Draw(t, "kVA")
		losses := must(fault.TypicalLoadLoss(units.VoltAmpere(rating * 1e3)))
		uk := units.Percentage(rapid.Float64Range(0.035, 0.12).Draw(t, "uk"))
		band := fault.Toleranced{Declared: uk, Tolerance: must(fault.ImpedanceTolerance(uk))}
		low := transformerData{KVA: rating, HighKV: 11, LowKV: 0.4, LossW: float64(losses.Smallest), UkPercent: 100 * float64(must(fault.SmallestImpedance(band)))}
		high := low
		high.LossW, high.UkPercent = float64(losses.Largest), 100*float64(must(fault.LargestImpedance(band)))
		cable := cableData{LengthM: rapid.Float64Range(1, 200).Draw(t, "m"), R20: 0.0754, X: 0.08, Parallel: float64(rapid.IntRange(1, 6).Draw(t, "n"))}
		tolerance := units.Percentage(rapid.SampledFrom([]float64{0.06, 0.10}).Draw(t, "ΔU"))
		cMax, cMin := must(fault.VoltageFactorMax(400, tolerance)), must(fault.VoltageFactorMin(400, tolerance))
		largest := must(fault.InitialCurrent(cMax, 400, series(network.largest(low.ratio()), low.corrected(cMax), cable.at(20))))
		smallest := must(fault.InitialCurrent(cMin, 400, series(network.smallest(low.ratio()), high.plain(), cable.at(250))))
		if smallest > largest {
			t.Fatalf("smallest %v, largest %v", smallest, largest)
		}
	})
}

func TestEarthFaultLimits(t *testing.T) {
	t.Parallel()
	rapid.Check(t, func(t *rapid.T) {
		z := drawImpedance(t, "Z1")
		three := must(fault.InitialCurrent(1.1, 400, z))
		same := must(fault.EarthFaultCurrent(1.1, 400, fault.Sequences{Positive: z, Zero: z}))
		if math.Abs(float64(same/three)-1) > rounding {
			t.Fatalf("with Z0 = Z1 the earth fault is %v, the three-phase fault %v", same, three)
		}
		less := must(fault.EarthFaultCurrent(1.1, 400, fault.Sequences{Positive: z, Zero: series(z, drawImpedance(t, "more"))}))
		if less >= three {
			t.Fatalf("with Z0 > Z1 the earth fault is %v, the three-phase fault %v", less, three)
		}
		if rx := must(fault.EarthFaultROverX(fault.Sequences{Positive: z, Zero: z})); math.Abs(float64(rx/must(fault.ROverX(z)))-1) > rounding {
			t.Fatalf("R/X of the loop is %v", rx)
		}
	})
}

func TestSimpleQuantities(t *testing.T) {
	t.Parallel()
	for _, row := range []struct {
		name      string
		got, want float64
	}{
		{"3-4-5", float64(must(fault.Magnitude(fault.Impedance{Resistance: 3, Reactance: 4}))), 5},
		{"1600 kVA at 400 V", float64(must(fault.RatedCurrent(1600e3, 400))), 2309.4010767585},
		{"41.8 kA seen at 11 kV", float64(must(fault.ReferredCurrent(41.8e3, must(fault.TransformationRatio(fault.RatedVoltages{High: 11e3, Low: 400}))))), 1520},
		{"1 % of 40 kA", float64(must(fault.NegligibleMotorCurrent(40e3))), 400},
		{"converter 1.5 times 100 A", float64(must(fault.ConverterCurrent(1.5, 100))), 150},
		{"generator resistance", float64(must(fault.GeneratorResistance(0.026, 400))), 0.0039},
	} {
		within(t, row.name, row.got, row.want, rounding)
	}
	// X = 0.989 Z and κ = 1.645 belong to the standard's R/X = 0.15, κ = 1.746 to 0.10
	within(t, "κ of small high-voltage motors", float64(must(fault.PeakFactor(fault.SmallHighVoltageROverX))), 1.645, 1e-3)
	within(t, "κ of a drive that feeds back", float64(must(fault.PeakFactor(fault.RegenerativeDriveROverX))), 1.746, 1e-3)
	for feeding, want := range map[fault.Feeding]bool{
		fault.Direct: true, fault.BypassedSoftStarter: true, fault.RegenerativeDrive: true, fault.Converter: false, "unheard of": false,
	} {
		if got := feeding.FeedsFault(); got != want {
			t.Errorf("%s: feeds the fault is %v", feeding, got)
		}
	}
}
