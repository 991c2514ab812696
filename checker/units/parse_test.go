package units

import (
	"math"
	"slices"
	"strings"
	"testing"
)

func named(t *testing.T, name string) *Dimension {
	t.Helper()
	d, ok := DimensionNamed(name)
	if !ok {
		t.Fatalf("no dimension %q", name)
	}
	return d
}

func TestParseAccepts(t *testing.T) {
	t.Parallel()
	for _, row := range []struct {
		dimension string
		texts     []string
		want      float64
	}{
		{"current", []string{"65 kA", "65kA", "65\u00a0kA", "65\u202fkA", "65\u2009kA", "65\tkA", "  65  kA ", "65.0 kA", "065 kA", "65000 A"}, 65000},
		{"current", []string{"30 mA", "0.03 A", "30000 µA", "30000 μA", "30000 uA"}, 0.03},
		{"current", []string{"0 A", "-0 A", "0.000 kA"}, 0},
		{"voltage", []string{"11 kV", "11000 V", "11000000 mV"}, 11000},
		{"time", []string{"200 ms", "0.2 s", "200000 us", "200000 µs"}, 0.2},
		{"time", []string{"2 h", "120 min", "7200 s"}, 7200},
		{"length", []string{"12mm", "12 mm", "1.2 cm", "0.012 m", "12000 um", "0.000012 km"}, 0.012},
		{"area", []string{"240 mm2", "240 mm²", "2.4 cm2", "0.00024 m²"}, 0.00024},
		{"resistance", []string{"12 mΩ", "12 m\u2126", "12 mohm", "12 mOhm", "0.012 Ω", "0.012 ohm", "12000 µΩ", "12000 uohm"}, 0.012},
		{"resistance", []string{"1 MΩ", "1 Mohm", "1000 kΩ", "1000000 Ohm"}, 1e6},
		{"resistance_per_length", []string{"0.08 mΩ/m", "0.08 Ω/km", "80 µΩ/m", "80 mohm/km", "0.00008 ohm/m"}, 8e-5},
		{"frequency", []string{"50 Hz", "0.05 kHz"}, 50},
		{"apparent_power", []string{"500 MVA", "0.5 GVA", "500000 kVA", "500000000 VA"}, 5e8},
		{"power", []string{"250 kW", "0.25 MW", "250000 W"}, 250000},
		{"temperature", []string{"40 °C", "40°C", "40 C", "40 deg C", "40 deg\u00a0C", "40 degC", "40 ° C", "40 \u2103"}, 40},
		{"temperature", []string{"-5 °C", "\u22125 °C", "-5.0C"}, -5},
		{"force", []string{"15 kN", "15000 N"}, 15000},
		{"pressure", []string{"250 MPa", "250 N/mm2", "250 N/mm²", "0.25 GPa", "0.25 kN/mm²", "2500 bar", "250000 kPa", "2500000 mbar"}, 2.5e8},
		{"energy", []string{"376 kJ", "0.376 MJ", "376000 J"}, 376000},
		{"incident_energy", []string{"8 cal/cm2", "8 cal/cm²", "33.472 J/cm2", "33.472 J/cm²", "334.72 kJ/m2", "334720 J/m²"}, 334720},
		{"joule_integral", []string{"2.1 MA2s", "2.1 MA²s", "2.1 MA²·s", "2.1 MA2 s", "2100000 A2s", "2100000 A²s", "0.0021 GA2s"}, 2.1e6},
		{"percentage", []string{"6 %", "6%", "6.00 %"}, 0.06},
		{"multiple", []string{"5 x", "5x", "5 ×", "5×"}, 5},
		{"number", []string{"0.95", " 0.95 ", "00.950"}, 0.95},
		{"number", []string{"123456789012345"}, 123456789012345},
	} {
		d := named(t, row.dimension)
		for _, text := range row.texts {
			t.Run(row.dimension+" "+text, func(t *testing.T) {
				t.Parallel()
				got, err := d.Parse(text)
				if err != nil {
					t.Fatal(err)
				}
				// The same quantity in another unit may differ by the last bit of a float64.
				if tolerance := math.Abs(row.want) * 3e-16; math.Abs(got-row.want) > tolerance {
					t.Errorf("got %v, want %v", got, row.want)
				}
				if got == 0 && math.Signbit(got) {
					t.Error("negative zero left the package")
				}
			})
		}
	}
}

func TestParseRefuses(t *testing.T) {
	t.Parallel()
	for _, row := range []struct {
		dimension, text string
		kind            FaultKind
		want            string
	}{
		{"current", "", Empty, `found nothing, expected a current with its unit; write for example "65 kA"`},
		{"current", " \u00a0 ", Empty, `found nothing, expected a current with its unit; write for example "65 kA"`},
		{"number", "", Empty, `found nothing, expected a bare number; write for example "0.95"`},

		{"current", "off", NotANumber, `found "off", expected a current in plain digits; write for example "65 kA"`},
		{"current", "1e3 A", NotANumber, `found "1e3 A", expected a number without exponent; write "1000 A"`},
		{"current", "-1.5E-3 kA", NotANumber, `found "-1.5E-3 kA", expected a number without exponent; write "-0.0015 kA"`},
		{"current", "0x10 A", NotANumber, `found "0x10 A", expected a current in plain digits; write for example "65 kA"`},
		{"multiple", "0x5 x", NotANumber, `found "0x5 x", expected a multiple in plain digits; write for example "5 x"`},
		{"current", "+5 kA", NotANumber, `found "+5 kA", expected a current in plain digits; write "5 kA"`},
		{"current", ".5 kA", NotANumber, `found ".5 kA", expected a current in plain digits; write "0.5 kA"`},
		{"current", "5. kA", NotANumber, `found "5. kA", expected a current in plain digits; write "5 kA"`},
		{"current", "- 5 kA", NotANumber, `found "- 5 kA", expected a current in plain digits; write "-5 kA"`},
		{"current", "--5 kA", NotANumber, `found "--5 kA", expected a current in plain digits; write for example "65 kA"`},
		{"current", "> 65 kA", NotANumber, `found "> 65 kA", expected a current in plain digits; write for example "65 kA"`},
		{"current", "5.5.5 kA", NotANumber, `found "5.5.5 kA", expected a current in plain digits; write for example "65 kA"`},
		{"current", "\u0663 kA", NotANumber, `found "` + "\u0663" + ` kA", expected a current in plain digits; write for example "65 kA"`},
		{"multiple", "x5", NotANumber, `found "x5", expected a multiple in plain digits; write for example "5 x"`},

		{"current", "NaN", NotFinite, `found "NaN", expected a current that is finite; write for example "65 kA"`},
		{"current", "-.inf", NotFinite, `found "-.inf", expected a current that is finite; write for example "65 kA"`},
		{"time", "infinity s", NotFinite, `found "infinity s", expected a time that is finite; write for example "200 ms"`},
		{"current", "∞ kA", NotFinite, `found "∞ kA", expected a current that is finite; write for example "65 kA"`},

		{"current", "6,5 kA", DecimalComma, `found "6,5 kA", expected a decimal point; write "6.5 kA"`},
		{"time", "0,350 s", DecimalComma, `found "0,350 s", expected a decimal point; write "0.350 s"`},
		{"temperature", "−5,5 °C", DecimalComma, `found "−5,5 °C", expected a decimal point; write "-5.5 °C"`},
		{"current", "6,5", DecimalComma, `found "6,5", expected a decimal point; write "6.5 kA" or "6.5 A"`},
		{"current", "6,5 mm", DecimalComma, `found "6,5 mm", expected a decimal point; write the number as "6.5"`},
		{"number", "0,95", DecimalComma, `found "0,95", expected a decimal point; write "0.95"`},
		{"apparent_power", "1,600 kVA", AmbiguousComma,
			`found "1,600 kVA", expected a number without a comma, which can be read in two ways; write "1600 kVA" or "1.6 kVA"`},

		{"apparent_power", "1 600 kVA", ThousandsSeparator, `found "1 600 kVA", expected digits without separators; write "1600 kVA"`},
		{"apparent_power", "1\u202f600 kVA", ThousandsSeparator, `found "1\u202f600 kVA", expected digits without separators; write "1600 kVA"`},
		{"apparent_power", "1'600 kVA", ThousandsSeparator, `found "1'600 kVA", expected digits without separators; write "1600 kVA"`},
		{"apparent_power", "1’600 kVA", ThousandsSeparator, `found "1’600 kVA", expected digits without separators; write "1600 kVA"`},
		{"apparent_power", "1_600 kVA", ThousandsSeparator, `found "1_600 kVA", expected digits without separators; write "1600 kVA"`},
		{"apparent_power", "1,600,000 VA", ThousandsSeparator, `found "1,600,000 VA", expected digits without separators; write "1600000 VA"`},
		{"apparent_power", "1.600.000 VA", ThousandsSeparator, `found "1.600.000 VA", expected digits without separators; write "1600000 VA"`},
		{"apparent_power", "1.600,5 kVA", ThousandsSeparator, `found "1.600,5 kVA", expected digits without separators; write "1600.5 kVA"`},
		{"apparent_power", "1,600.5 kVA", ThousandsSeparator, `found "1,600.5 kVA", expected digits without separators; write "1600.5 kVA"`},
		{"apparent_power", "1 600,5 kVA", ThousandsSeparator, `found "1 600,5 kVA", expected digits without separators; write "1600.5 kVA"`},

		{"current", "1234567890123456 A", TooManyDigits,
			`found "1234567890123456 A", expected at most 15 digits on each side of the decimal point; write for example "65 kA"`},
		{"number", "0.1234567890123456", TooManyDigits,
			`found "0.1234567890123456", expected at most 15 digits on each side of the decimal point; write for example "0.95"`},

		{"current", "65", NoUnit, `found "65", expected a current with its unit; write "65 kA" or "65 A"`},
		{"percentage", "6", NoUnit, `found "6", expected a percentage with its unit; write "6 %"`},

		{"current", "65 ka", UnknownUnit, `found "65 ka", expected a current with the capitals of its unit as in kA; write "65 kA"`},
		{"current", "65 KA", UnknownUnit, `found "65 KA", expected a current with the capitals of its unit as in kA; write "65 kA"`},
		{"current", "5 MA", UnknownUnit, `found "5 MA", expected a current with the capitals of its unit as in mA; write "5 mA"`},
		{"length", "5 Mm", UnknownUnit, `found "5 Mm", expected a length with the capitals of its unit as in mm; write "5 mm"`},
		{"apparent_power", "5 mVA", UnknownUnit, `found "5 mVA", expected an apparent power with the capitals of its unit as in MVA; write "5 MVA"`},
		{"temperature", "104 F", UnknownUnit, `found "104 F", expected a temperature in °C; write for example "40 °C"`},
		{"length", "20 in", UnknownUnit, `found "20 in", expected a length in mm or m; write for example "20 mm"`},
		{"incident_energy", "8 cal/cm^2", UnknownUnit, `found "8 cal/cm^2", expected an incident energy in J/cm2 or cal/cm2; write "8 cal/cm2"`},
		{"incident_energy", "8 kcal/cm2", UnknownUnit, `found "8 kcal/cm2", expected an incident energy in J/cm2 or cal/cm2; write for example "8 cal/cm2"`},
		{"resistance", "5 mohms", UnknownUnit, `found "5 mohms", expected a resistance in mΩ or Ω; write "5 mohm"`},
		{"number", "5 q", UnknownUnit, `found "5 q", expected a bare number without unit; write for example "0.95"`},
		{"current", "65 \x1b[31m", UnknownUnit, `found "65 \x1b[31m", expected a current in A or kA; write for example "65 kA"`},
		{"current", "65 \xff", UnknownUnit, `found "65 \xff", expected a current in A or kA; write for example "65 kA"`},
		{"current", "65 " + strings.Repeat("y", 80), UnknownUnit,
			`found "65 ` + strings.Repeat("y", 57) + `…", expected a current in A or kA; write for example "65 kA"`},

		{"joule_integral", "5 kA2s", AmbiguousUnit,
			`found "5 kA2s", where k can stand for 10^3 or 10^6, expected a joule integral in A2s or MA2s; write "5000 A2s" or "5 MA2s"`},
		{"joule_integral", "0.5 kA²s", AmbiguousUnit,
			`found "0.5 kA²s", where k can stand for 10^3 or 10^6, expected a joule integral in A2s or MA2s; write "500 A2s" or "0.5 MA2s"`},

		{"current", "12 mm", OtherDimension, `found "12 mm", which is a length, expected a current in A or kA; write for example "65 kA"`},
		{"current", "5 kA2s", OtherDimension, `found "5 kA2s", which is a joule integral, expected a current in A or kA; write for example "65 kA"`},
		{"number", "6 %", OtherDimension, `found "6 %", which is a percentage, expected a bare number without unit; write for example "0.95"`},
		{"power", "250 kVA", OtherDimension, `found "250 kVA", which is an apparent power, expected a power in W or kW; write for example "250 kW"`},

		{"current", "65 kA for 1 s", SeveralValues, `found "65 kA for 1 s", expected a current and nothing else; write "65 kA"`},
		{"current", "65-70 kA", SeveralValues, `found "65-70 kA", expected a current and nothing else; write for example "65 kA"`},
		{"current", "1 60 kA", SeveralValues, `found "1 60 kA", expected a current and nothing else; write for example "65 kA"`},
	} {
		t.Run(row.dimension+" "+row.text, func(t *testing.T) {
			t.Parallel()
			v, err := named(t, row.dimension).Parse(row.text)
			if err == nil {
				t.Fatalf("accepted as %v", v)
			}
			f, ok := err.(*Fault)
			if !ok {
				t.Fatalf("error is a %T", err)
			}
			if f.Kind != row.kind {
				t.Errorf("kind %q, want %q", f.Kind, row.kind)
			}
			if f.Error() != row.want {
				t.Errorf("\n got %s\nwant %s", f.Error(), row.want)
			}
			if v != 0 {
				t.Errorf("value %v beside an error", v)
			}
		})
	}
}

func TestParseTyped(t *testing.T) {
	t.Parallel()
	got, err := Parse[Ampere]("12.5 kA")
	if err != nil || got != 12500 {
		t.Errorf("got %v, %v", float64(got), err)
	}
	if _, err := Parse[Metre]("12.5 kA"); err == nil {
		t.Error("a current was taken for a length")
	}
}

// TestDecimalsAreNearest holds Parse to the float64 that Go itself takes for the written decimal.
func TestDecimalsAreNearest(t *testing.T) {
	t.Parallel()
	for text, want := range map[string]float64{"0.7 mm": 0.0007, "2.3 mm": 0.0023, "350 ms": 0.35, "0.3 ms": 0.0003, "6.12 %": 0.0612, "70 ms": 0.07} {
		for _, name := range []string{"length", "time", "percentage"} {
			if got, err := named(t, name).Parse(text); err == nil && got != want {
				t.Errorf("%s: got %v, want %v", text, got, want)
			}
		}
	}
}

func TestEveryKindHasARow(t *testing.T) {
	t.Parallel()
	seen := map[FaultKind]bool{}
	for _, d := range Dimensions() {
		for _, text := range []string{"", "off", "NaN", "6,5", "1,600", "1 600", "0.1234567890123456 " + d.usualOrNone(),
			"6", "6 qq", "6 kA2s", "6 mm", d.Example() + " x"} {
			if _, err := d.Parse(text); err != nil {
				seen[err.(*Fault).Kind] = true
			}
		}
	}
	for _, k := range FaultKinds() {
		if !seen[k] {
			t.Errorf("no text gives %q", k)
		}
	}
	if len(seen) != len(FaultKinds()) {
		t.Errorf("FaultKinds lists %d kinds, Parse gives %d", len(FaultKinds()), len(seen))
	}
}

func (d *Dimension) usualOrNone() string {
	if len(d.usual) == 0 {
		return ""
	}
	return d.usual[0]
}

func TestTable(t *testing.T) {
	t.Parallel()
	names := []string{"current", "voltage", "time", "length", "area", "resistance", "resistance_per_length", "frequency",
		"apparent_power", "power", "temperature", "force", "pressure", "energy", "incident_energy", "joule_integral",
		"percentage", "multiple", "number"}
	var got []string
	owners := map[string]string{}
	for _, d := range Dimensions() {
		got = append(got, d.Name)
		if _, err := d.Parse(d.Example()); err != nil {
			t.Errorf("%s refuses its own example: %v", d.Name, err)
		}
		for _, s := range append(d.Spellings(), d.ambiguous...) {
			if other, taken := owners[s]; taken {
				t.Errorf("unit %q belongs to %s and %s", s, other, d.Name)
			}
			owners[s] = d.Name
			if s != strings.TrimSpace(s) || leadingDigits(s) != "" {
				t.Errorf("unit %q cannot be told from the number", s)
			}
		}
		for _, u := range d.usual {
			if _, ok := d.spellings[u]; !ok {
				t.Errorf("%s proposes %q, which it does not accept", d.Name, u)
			}
		}
		if !slices.IsSortedFunc(d.shown, func(a, b measure) int { return int(math.Copysign(1, a.from-b.from)) }) || d.shown[0].from != 0 {
			t.Errorf("%s: printed units are not in order from nought", d.Name)
		}
	}
	if !slices.Equal(got, names) {
		t.Errorf("names %q", got)
	}
	if _, ok := DimensionNamed("Current"); ok {
		t.Error("names are taken without regard to capitals")
	}
}

func TestQuantitiesHaveTheirDimension(t *testing.T) {
	t.Parallel()
	for i, u := range []interface{ Dimension() *Dimension }{Ampere(1), Volt(1), Second(1), Metre(1), SquareMetre(1), Ohm(1), OhmPerMetre(1),
		Hertz(1), VoltAmpere(1), Watt(1), Celsius(1), Newton(1), Pascal(1), Joule(1), JoulePerSquareMetre(1), AmpereSquaredSecond(1),
		Percentage(1), Multiple(1), Ratio(1)} {
		if u.Dimension() != dimensions[i] {
			t.Errorf("%T measures %s", u, u.Dimension().Name)
		}
	}
}
