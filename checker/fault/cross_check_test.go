package fault_test

import (
	"testing"

	"boardproof/checker/fault"
	"boardproof/checker/units"
)

// TestOwnCrossCheck compares with figures of the invented board that a separate script gave
// beforehand: an own cross-check, not a published value.
func TestOwnCrossCheck(t *testing.T) {
	t.Parallel()
	data := read[struct {
		LossW   float64 `yaml:"load_loss_w"`
		Nominal struct{ Ik3, Ip, RX, Kappa printed }
		Low     struct{ Ik3, Ip, KT printed }
		High    struct {
			Ik3, Ik2 printed
			C095     printed `yaml:"ik3_c095"`
		}
		Generator struct {
			KVA                    float64
			X                      float64 `yaml:"x_percent"`
			KG, Ik3, Ip, Sustained printed
		}
		Motors struct {
			KW, Starting, RX float64
			EtaCosPhi        float64 `yaml:"eta_cos_phi"`
			Ik3, Ip          printed
		}
		Total    struct{ Ik3, Arithmetic, Ip printed }
		Parallel struct{ Ik3, Ip printed }
		Earth    struct {
			R0  float64 `yaml:"r0_r1"`
			X0  float64 `yaml:"x0_x1"`
			Ik1 printed
		}
	}](t, "own-cross-check.yaml")
	const nominal = units.Volt(400)
	network := networkData{KV: 11, MaxMVA: 500, MinMVA: 200, RXMax: 0.1, RXMin: 0.1}
	transformer := transformerData{KVA: 1600, HighKV: 11, LowKV: 0.4, UkPercent: 6, LossW: data.LossW}
	perLength := must(fault.StrandedResistance(fault.Copper, 240e-6))
	link := cableData{LengthM: 14, R20: float64(perLength) * 1e3, X: float64(fault.CableReactance) * 1e3, Parallel: 5}
	ratio := transformer.ratio()
	declared := units.Percentage(0.06)
	toleranced := fault.Toleranced{Declared: declared, Tolerance: must(fault.ImpedanceTolerance(declared))}
	low, high := transformer, transformer
	low.UkPercent = 100 * float64(must(fault.SmallestImpedance(toleranced)))
	high.UkPercent = 100 * float64(must(fault.LargestImpedance(toleranced)))

	z := series(network.largest(ratio), transformer.corrected(1.1), link.at(20))
	initial := must(fault.InitialCurrent(1.1, nominal, z))
	asPrinted(t, "I\"k3", kiloampere(initial), data.Nominal.Ik3)
	asPrinted(t, "ip", kiloampere(peak(z, initial)), data.Nominal.Ip)
	asPrinted(t, "R/X", float64(must(fault.ROverX(z))), data.Nominal.RX)
	asPrinted(t, "κ", float64(must(fault.PeakFactor(must(fault.ROverX(z))))), data.Nominal.Kappa)

	lowZ := series(network.largest(ratio), low.corrected(1.1), link.at(20))
	lowCurrent := must(fault.InitialCurrent(1.1, nominal, lowZ))
	asPrinted(t, "I\"k3 at -10 %", kiloampere(lowCurrent), data.Low.Ik3)
	asPrinted(t, "ip at -10 %", kiloampere(peak(lowZ, lowCurrent)), data.Low.Ip)
	asPrinted(t, "K_T at -10 %", float64(low.correction(1.1)), data.Low.KT)

	highZ := series(network.smallest(ratio), high.plain(), link.at(80))
	highCurrent := must(fault.InitialCurrent(must(fault.VoltageFactorMin(nominal, 0.10)), nominal, highZ))
	asPrinted(t, "I\"k3 min", kiloampere(highCurrent), data.High.Ik3)
	asPrinted(t, "I\"k2 min", kiloampere(must(fault.LineToLineCurrent(highCurrent))), data.High.Ik2)
	asPrinted(t, "I\"k3 min, c 0.95", kiloampere(must(fault.InitialCurrent(must(fault.VoltageFactorMin2001(nominal, 0.10)), nominal, highZ))), data.High.C095)

	rating := units.VoltAmpere(data.Generator.KVA * 1e3)
	x := must(fault.SubtransientReactance(units.Percentage(data.Generator.X/100), nominal, rating))
	kg := must(fault.GeneratorCorrection(fault.GeneratorData{
		Nominal: nominal, Rated: nominal, VoltageFactor: 1.1, Subtransient: units.Percentage(data.Generator.X / 100), SineRated: 0.6}))
	generator := fault.Impedance{
		Resistance: must(fault.CorrectedGeneratorResistance(kg, must(fault.GeneratorResistance(x, nominal)))),
		Reactance:  must(fault.CorrectedGeneratorReactance(kg, x)),
	}
	ig := must(fault.InitialCurrent(1.1, nominal, generator))
	asPrinted(t, "K_G", float64(kg), data.Generator.KG)
	asPrinted(t, "generator I\"k3", kiloampere(ig), data.Generator.Ik3)
	asPrinted(t, "generator ip", kiloampere(peak(generator, ig)), data.Generator.Ip)
	rated := must(fault.RatedCurrent(rating, nominal))
	asPrinted(t, "generator sustained", kiloampere(must(fault.SustainedCurrent(3, rated))), data.Generator.Sustained)

	m := motorData{KW: data.Motors.KW, KV: 0.4, Efficiency: data.Motors.EtaCosPhi, CosPhi: 1, Starting: data.Motors.Starting, RX: data.Motors.RX}
	motors := m.impedance()
	im := must(fault.InitialCurrent(1.1, nominal, motors))
	asPrinted(t, "motors I\"k3", kiloampere(im), data.Motors.Ik3)
	asPrinted(t, "motors ip", kiloampere(peak(motors, im)), data.Motors.Ip)
	total := must(fault.TotalCurrent(
		fault.BranchCurrent{Current: lowCurrent, ROverX: must(fault.ROverX(lowZ))}, fault.BranchCurrent{Current: im, ROverX: must(fault.ROverX(motors))}))
	asPrinted(t, "I\"k3 with motors", kiloampere(total), data.Total.Ik3)
	asPrinted(t, "arithmetic sum", kiloampere(must(fault.SumOfCurrents(lowCurrent, im))), data.Total.Arithmetic)
	asPrinted(t, "ip with motors", kiloampere(must(fault.SumOfCurrents(peak(lowZ, lowCurrent), peak(motors, im)))), data.Total.Ip)

	one := series(low.corrected(1.1), link.at(20))
	both := series(network.largest(ratio), parallel(one, one))
	ib := must(fault.InitialCurrent(1.1, nominal, both))
	asPrinted(t, "I\"k3 of both", kiloampere(ib), data.Parallel.Ik3)
	asPrinted(t, "ip of both", kiloampere(peak(both, ib)), data.Parallel.Ip)

	// the link returns through a fourth core
	zero := series(zeroSequence(low.corrected(1.1), 1, 0.95), zeroSequence(link.at(20), data.Earth.R0, data.Earth.X0))
	ik1 := must(fault.EarthFaultCurrent(1.1, nominal, fault.Sequences{Positive: lowZ, Zero: zero}))
	asPrinted(t, "I\"k1", kiloampere(ik1), data.Earth.Ik1)
}
