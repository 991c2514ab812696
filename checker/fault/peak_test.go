package fault_test

import (
	"math"
	"testing"

	"pgregory.net/rapid"

	"boardproof/checker/fault"
	"boardproof/checker/units"
)

type peakAndHeat struct {
	KappaPublished []struct{ RX, Kappa printed } `yaml:"kappa_published"`
	KappaComputed  struct {
		RX    []units.Ratio
		Kappa []printed
	} `yaml:"kappa_computed"`
	PeakPublished []struct{ Ik, Kappa, Ip printed } `yaml:"peak_published"`
	MPublished    []struct{ Kappa, Tk, M printed }  `yaml:"m_published"`
	MComputed     struct {
		Tk   []units.Second
		Rows []struct {
			Kappa units.Ratio
			M     []printed
		}
	} `yaml:"m_computed"`
	IthPublished   []struct{ Ik, M, N, Ith printed }                    `yaml:"ith_published"`
	DecayPublished []struct{ Ik, Steady, Tk, Kappa, M, N, Ith printed } `yaml:"decay_published"`
}

func kA(p printed) units.Ampere { return units.Ampere(p.value * 1e3) }

func TestPeakFactorAndHeat(t *testing.T) {
	t.Parallel()
	data := read[peakAndHeat](t, "peak-and-heat.yaml")
	for _, row := range data.KappaPublished {
		asPrinted(t, "κ", float64(must(fault.PeakFactor(units.Ratio(row.RX.value)))), row.Kappa)
	}
	for i, rx := range data.KappaComputed.RX {
		asPrinted(t, "κ", float64(must(fault.PeakFactor(rx))), data.KappaComputed.Kappa[i])
	}
	for _, row := range data.PeakPublished {
		ip := must(fault.PeakCurrent(units.Ratio(row.Kappa.value), kA(row.Ik)))
		asPrinted(t, "ip", kiloampere(ip), row.Ip)
	}
	for _, row := range data.MPublished {
		asPrinted(t, "m", float64(must(fault.DirectCurrentHeat(50, units.Second(row.Tk.value), units.Ratio(row.Kappa.value)))), row.M)
	}
	for _, row := range data.MComputed.Rows {
		for i, tk := range data.MComputed.Tk {
			asPrinted(t, "m", float64(must(fault.DirectCurrentHeat(50, tk, row.Kappa))), row.M[i])
		}
	}
	for _, row := range data.IthPublished {
		h := fault.HeatFactors{DirectCurrent: units.Ratio(row.M.value), AlternatingCurrent: units.Ratio(row.N.value)}
		asPrinted(t, "Ith", kiloampere(must(fault.ThermalEquivalentCurrent(kA(row.Ik), h))), row.Ith)
	}
	for _, row := range data.DecayPublished {
		m := must(fault.DirectCurrentHeat(50, units.Second(row.Tk.value), units.Ratio(row.Kappa.value)))
		n := must(fault.AlternatingCurrentHeat(fault.Decay{Initial: kA(row.Ik), Steady: kA(row.Steady)}, units.Second(row.Tk.value)))
		asPrinted(t, "m", float64(m), row.M)
		asPrinted(t, "n", float64(n), row.N)
		// its Ith follows from the rounded m and n
		h := fault.HeatFactors{DirectCurrent: units.Ratio(row.M.value), AlternatingCurrent: units.Ratio(row.N.value)}
		asPrinted(t, "Ith", kiloampere(must(fault.ThermalEquivalentCurrent(kA(row.Ik), h))), row.Ith)
	}
}

// TestDecayIsMeanSquare integrates the decaying current that the closed form of n stands for.
func TestDecayIsMeanSquare(t *testing.T) {
	t.Parallel()
	const integrationTolerance = 1e-6
	rapid.Check(t, func(t *rapid.T) {
		q := rapid.Float64Range(1.25, 6).Draw(t, "q")
		tk := rapid.Float64Range(0.02, 5).Draw(t, "T_k")
		q1 := q / (0.88 + 0.17*q)
		td := 3.1 / q1
		const steps = 20000
		sum := 0.0
		for i := range steps {
			at := (float64(i) + 0.5) / steps * tk
			v := 1 + (q1-1)*math.Exp(-at/td) + (q-q1)*math.Exp(-10*at/td)
			sum += v * v
		}
		want := sum / steps / (q * q)
		got := must(fault.AlternatingCurrentHeat(fault.Decay{Initial: units.Ampere(1000 * q), Steady: 1000}, units.Second(tk)))
		if math.Abs(float64(got)/want-1) > integrationTolerance {
			t.Fatalf("n is %v, the mean square is %v", got, want)
		}
	})
}

func TestHeatAtTheEdges(t *testing.T) {
	t.Parallel()
	if m := must(fault.DirectCurrentHeat(50, 1, 2)); m != 2 {
		t.Errorf("m at κ = 2 is %v, expected its limit 2", m)
	}
	near := must(fault.DirectCurrentHeat(50, 0.01, 1.999999))
	if math.Abs(float64(near)-2) > 1e-4 {
		t.Errorf("m just below κ = 2 is %v, expected about 2", near)
	}
	if n := must(fault.AlternatingCurrentHeat(fault.Decay{Initial: 10e3, Steady: 10e3}, 1)); n != 1 {
		t.Errorf("n far from generators is %v, expected 1", n)
	}
	if _, err := fault.AlternatingCurrentHeat(fault.Decay{Initial: 9e3, Steady: 10e3}, 1); err == nil {
		t.Error("a current that rises was accepted")
	}
	if got := must(fault.JouleIntegral(65e3, 1)); math.Abs(float64(got)/4.225e9-1) > 1e-12 {
		t.Errorf("65 kA for 1 s give %v", got)
	}
}

func TestPeakFactorFalls(t *testing.T) {
	t.Parallel()
	if k := must(fault.PeakFactor(0)); k != 2 {
		t.Errorf("κ at R/X = 0 is %v, expected 2", k)
	}
	rapid.Check(t, func(t *rapid.T) {
		a := rapid.Float64Range(0, 8).Draw(t, "R/X")
		b := a + rapid.Float64Range(1e-3, 3).Draw(t, "more")
		ka, kb := must(fault.PeakFactor(units.Ratio(a))), must(fault.PeakFactor(units.Ratio(b)))
		if ka <= kb || kb < 1.02 || ka > 2 {
			t.Fatalf("κ(%v) = %v, κ(%v) = %v", a, ka, b, kb)
		}
	})
	if k := must(fault.PeakFactor(1000)); k != 1.02 {
		t.Errorf("κ at a large R/X is %v, expected 1.02", k)
	}
}

func TestPeakRatio(t *testing.T) {
	t.Parallel()
	data := read[struct {
		Rows []struct {
			KA     printed
			CosPhi float64 `yaml:"cos_phi"`
			N      printed
		}
	}](t, "peak-ratio.yaml")
	if len(data.Rows) != 5 {
		t.Fatalf("read %d rows, expected 5", len(data.Rows))
	}
	for i, row := range data.Rows {
		asPrinted(t, "n", float64(must(fault.PeakRatio(kA(row.KA)))), row.N)
		// the table is the peak at its power factor
		rx := row.CosPhi / math.Sqrt(1-row.CosPhi*row.CosPhi)
		peak := math.Sqrt2 * float64(must(fault.PeakFactor(units.Ratio(rx))))
		asPrinted(t, "√2·κ", peak, row.N)
		if i < 4 { // just above the upper end the next row begins
			asPrinted(t, "n above", float64(must(fault.PeakRatio(kA(row.KA)+0.1))), data.Rows[i+1].N)
		}
	}
	for _, current := range []units.Ampere{0, -1, units.Ampere(math.NaN()), units.Ampere(math.Inf(1))} {
		if n, err := fault.PeakRatio(current); err == nil {
			t.Errorf("%v A gave n = %v", float64(current), n)
		}
	}
}
