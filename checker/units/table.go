package units

// thermochemicalCalorie is one calorie in J, exact by definition. Source: NIST Special Publication
// 811, conversion factors, "1 cal_th = 4.184 J", read in a reprint of that table. That incident
// energies in cal/cm2 mean this calorie and not another is from memory, unconfirmed.
const thermochemicalCalorie = 4.184

// The magnitudes from which a larger unit is printed are common practice, no source: rated currents
// are spoken of in A up to 10 kA, transformers in kVA up to 10 MVA, low voltages in V up to 1000 V.
//
// Not in the table on purpose, because one slip of the shift key would change the value by 10⁹ and
// nobody writes them for a switchboard: MA, MV, Mm, mVA, mW, mJ, mN, mPa, mHz.
var (
	current = dimension(Dimension{Name: "current", Base: "A", phrase: "a current", example: "65 kA", usual: []string{"kA", "A"}},
		shown("µA", -6, 0), shown("mA", -3, 1e-3), shown("A", 0, 1), shown("kA", 3, 1e4))

	voltage = dimension(Dimension{Name: "voltage", Base: "V", phrase: "a voltage", example: "400 V", usual: []string{"V", "kV"}},
		shown("µV", -6, 0), shown("mV", -3, 1e-3), shown("V", 0, 1), shown("kV", 3, 1100))

	duration = dimension(Dimension{Name: "time", Base: "s", phrase: "a time", example: "200 ms", usual: []string{"ms", "s"}},
		shown("µs", -6, 0), shown("ms", -3, 1e-3), shown("s", 0, 1),
		shown("min", 0, 600).times(60), shown("h", 0, 7200).times(3600))

	length = dimension(Dimension{Name: "length", Base: "m", phrase: "a length", example: "20 mm", usual: []string{"mm", "m"}},
		shown("µm", -6, 0), shown("mm", -3, 1e-4), read("cm", -2), shown("m", 0, 1), shown("km", 3, 1e4))

	area = dimension(Dimension{Name: "area", Base: "m2", phrase: "an area", example: "240 mm2", usual: []string{"mm2"}},
		shown("mm²", -6, 0), read("cm²", -4), shown("m²", 0, 0.1))

	resistance = dimension(Dimension{Name: "resistance", Base: "Ω", phrase: "a resistance", example: "12 mΩ", usual: []string{"mΩ", "Ω"}},
		shown("µΩ", -6, 0), shown("mΩ", -3, 1e-3), shown("Ω", 0, 1), shown("kΩ", 3, 1e3), shown("MΩ", 6, 1e6))

	resistancePerLength = dimension(Dimension{Name: "resistance_per_length", Base: "Ω/m", phrase: "a resistance per length",
		example: "0.08 mΩ/m", usual: []string{"mΩ/m", "µΩ/m"}},
		shown("µΩ/m", -6, 0), read("mΩ/km", -6), shown("mΩ/m", -3, 1e-3), read("Ω/km", -3), shown("Ω/m", 0, 1))

	frequency = dimension(Dimension{Name: "frequency", Base: "Hz", phrase: "a frequency", example: "50 Hz", usual: []string{"Hz"}},
		shown("Hz", 0, 0), shown("kHz", 3, 1e3), shown("MHz", 6, 1e6))

	apparentPower = dimension(Dimension{Name: "apparent_power", Base: "VA", phrase: "an apparent power",
		example: "1600 kVA", usual: []string{"kVA", "MVA"}},
		shown("VA", 0, 0), shown("kVA", 3, 1e3), shown("MVA", 6, 1e7), read("GVA", 9))

	power = dimension(Dimension{Name: "power", Base: "W", phrase: "a power", example: "250 kW", usual: []string{"kW", "W"}},
		shown("W", 0, 0), shown("kW", 3, 1e3), shown("MW", 6, 1e7))

	temperature = dimension(Dimension{Name: "temperature", Base: "°C", phrase: "a temperature", example: "40 °C", usual: []string{"°C"}},
		shown("°C", 0, 0, "° C", "\u2103", "C", "deg C", "degC"))

	force = dimension(Dimension{Name: "force", Base: "N", phrase: "a force", example: "15 kN", usual: []string{"kN", "N"}},
		shown("N", 0, 0), shown("kN", 3, 1e3))

	pressure = dimension(Dimension{Name: "pressure", Base: "Pa", phrase: "a pressure", example: "250 MPa", usual: []string{"MPa", "kPa"}},
		shown("Pa", 0, 0), shown("kPa", 3, 1e3), read("mbar", 2), read("bar", 5),
		shown("MPa", 6, 1e6, "N/mm²"), shown("GPa", 9, 1e10, "kN/mm²"))

	energy = dimension(Dimension{Name: "energy", Base: "J", phrase: "an energy", example: "376 kJ", usual: []string{"kJ", "J"}},
		shown("J", 0, 0), shown("kJ", 3, 1e3), shown("MJ", 6, 1e7))

	incidentEnergy = dimension(Dimension{Name: "incident_energy", Base: "J/m2", phrase: "an incident energy",
		example: "8 cal/cm2", usual: []string{"cal/cm2", "J/cm2"}},
		shown("cal/cm2", 4, 0, "cal/cm²").times(thermochemicalCalorie), read("J/cm²", 4), read("kJ/m²", 3), read("J/m²", 0))

	// MA²s is read as 10⁶ A²s and GA²s as 10⁹ A²s, not as (MA)²·s (common practice, no source).
	// kA²s is used in the trade both for 10³ A²s and for (kA)²·s = 10⁶ A²s, so it is refused.
	jouleIntegral = dimension(Dimension{Name: "joule_integral", Base: "A2s", phrase: "a joule integral", example: "2.1 MA2s",
		usual: []string{"MA2s", "A2s"}, ambiguous: []string{"kA²s", "kA²·s", "kA² s"}},
		shown("A²s", 0, 0, "A²·s", "A² s"), shown("MA²s", 6, 1e6, "MA²·s", "MA² s"), shown("GA²s", 9, 1e9, "GA²·s", "GA² s"))

	percentage = dimension(Dimension{Name: "percentage", Base: "1", phrase: "a percentage", example: "6 %", usual: []string{"%"}},
		shown("%", -2, 0))

	multiple = dimension(Dimension{Name: "multiple", Base: "1", phrase: "a multiple", example: "5 x", usual: []string{"x"}},
		shown("x", 0, 0, "×"))

	number = dimension(Dimension{Name: "number", phrase: "a bare number", example: "0.95"},
		shown("", 0, 0))
)

// dimensions lists the quantities in the order of quantities.go.
var dimensions = []*Dimension{
	current, voltage, duration, length, area, resistance, resistancePerLength, frequency, apparentPower, power,
	temperature, force, pressure, energy, incidentEnergy, jouleIntegral, percentage, multiple, number,
}
