package units

import (
	"math"
	"testing"
)

func TestFormat(t *testing.T) {
	t.Parallel()
	for _, row := range []struct {
		got, want string
	}{
		{Format(Ampere(65e3)), "65 kA"},
		{Format(Ampere(143e3)), "143 kA"},
		{Format(Ampere(12.5e3)), "12.5 kA"},
		{Format(Ampere(2500)), "2500 A"},
		{Format(Ampere(9999.6)), "10 kA"},
		{Format(Ampere(0.03)), "30 mA"},
		{Format(Ampere(12345)), "12.35 kA"},
		{Format(Ampere(-12345)), "-12.35 kA"},
		{Format(Ampere(0)), "0 A"},
		{Format(Ampere(math.Copysign(0, -1))), "0 A"},
		{Format(Ampere(2e6)), "2000 kA"},
		{Format(Volt(400)), "400 V"},
		{Format(Volt(1000)), "1000 V"},
		{Format(Volt(2200)), "2.2 kV"},
		{Format(Volt(11e3)), "11 kV"},
		{Format(Second(0.25)), "250 ms"},
		{Format(Second(0.1 + 0.2)), "300 ms"},
		{Format(Second(1)), "1 s"},
		{Format(Second(50e-6)), "50 µs"},
		{Format(Second(90)), "90 s"},
		{Format(Second(5400)), "90 min"},
		{Format(Second(7200)), "2 h"},
		{Format(Second(1000)), "1000 s"},
		{Format(Second(605.123)), "605.1 s"},
		{Format(Metre(0.012)), "12 mm"},
		{Format(Metre(2000)), "2000 m"},
		{Format(SquareMetre(240e-6)), "240 mm²"},
		{Format(SquareMetre(0.36)), "0.36 m²"},
		{Format(Ohm(0.1854)), "185.4 mΩ"},
		{Format(OhmPerMetre(1.5e-4)), "150 µΩ/m"},
		{Format(Hertz(50)), "50 Hz"},
		{Format(VoltAmpere(1.6e6)), "1600 kVA"},
		{Format(VoltAmpere(500e6)), "500 MVA"},
		{Format(Watt(250e3)), "250 kW"},
		{Format(Celsius(-5)), "-5 °C"},
		{Format(Newton(15e3)), "15 kN"},
		{Format(Pascal(250e6)), "250 MPa"},
		{Format(Pascal(120e9)), "120 GPa"},
		{Format(Joule(1323e3)), "1323 kJ"},
		{Format(JoulePerSquareMetre(334720)), "8 cal/cm2"},
		{Format(JoulePerSquareMetre(0)), "0 cal/cm2"},
		{Format(AmpereSquaredSecond(4.225e9)), "4.225 GA²s"},
		{Format(AmpereSquaredSecond(210e3)), "210000 A²s"},
		{Format(Percentage(0.06)), "6 %"},
		{Format(Multiple(5)), "5 x"},
		{Format(Ratio(0.95)), "0.95"},
		{Format(Ratio(0)), "0"},
		{Format(Ratio(1e-7)), "0.0000001"},
		{Format(Ampere(math.NaN())), "not finite"},
		{Format(Ampere(math.Inf(-1))), "not finite"},
	} {
		t.Run(row.want, func(t *testing.T) {
			t.Parallel()
			if row.got != row.want {
				t.Errorf("got %q, want %q", row.got, row.want)
			}
		})
	}
}

func TestFormatDirected(t *testing.T) {
	t.Parallel()
	for _, row := range []struct {
		name            string
		dimension       *Dimension
		value           float64
		digits          int
		wantDown, wants string
	}{
		{"cut", current, 41876, 3, "41.8 kA", "41.9 kA"},
		{"exact stays", current, 65e3, 3, "65 kA", "65 kA"},
		{"noise of a sum stays out", duration, 0.1 + 0.2, 3, "300 ms", "300 ms"},
		{"noise of a product stays out", current, 65e3 * 1.0000000000000002, 2, "65 kA", "65 kA"},
		{"carry into a larger unit", current, 9999.6, 4, "9999 A", "10 kA"},
		{"negative", temperature, -5.55, 2, "-5.6 °C", "-5.5 °C"},
		{"not decimal", incidentEnergy, 50208.1, 3, "1.2 cal/cm2", "1.21 cal/cm2"},
		{"at least one digit", current, 41876, 0, "40 kA", "50 kA"},
		{"at most twelve", number, 1.0 / 3, 20, "0.333333333333", "0.333333333333"},
		{"nought", length, 0, 3, "0 mm", "0 mm"},
		{"not finite", length, math.Inf(1), 3, "not finite", "not finite"},
	} {
		t.Run(row.name, func(t *testing.T) {
			t.Parallel()
			if got := row.dimension.FormatDown(row.value, row.digits); got != row.wantDown {
				t.Errorf("down: got %q, want %q", got, row.wantDown)
			}
			if got := row.dimension.FormatUp(row.value, row.digits); got != row.wants {
				t.Errorf("up: got %q, want %q", got, row.wants)
			}
		})
	}
}

func TestRound12(t *testing.T) {
	t.Parallel()
	for _, row := range []struct {
		name      string
		got, want float64
	}{
		{"sum", Round12(0.1 + 0.2), 0.3},
		{"kept", Round12(123456789012), 123456789012},
		{"thirteenth digit", Round12(1234567890123), 1234567890120},
		{"largest", Round12(math.MaxFloat64), 1.79769313486e308},
		{"infinity", Round12(math.Inf(1)), math.Inf(1)},
		{"nought", Round12(0), 0},
	} {
		if row.got != row.want {
			t.Errorf("%s: got %v, want %v", row.name, row.got, row.want)
		}
	}
	if math.Signbit(Round12(math.Copysign(0, -1))) {
		t.Error("negative zero stays negative")
	}
	if !math.IsNaN(Round12(math.NaN())) {
		t.Error("NaN became a number")
	}
}
