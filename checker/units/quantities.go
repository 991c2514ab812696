package units

// A Unit is a quantity type of this package: a float64 in the base unit of its Dimension.
type Unit interface {
	~float64
	// Dimension returns the quantity the type measures; it does not depend on the value.
	Dimension() *Dimension
}

// Ampere is a current in A.
type Ampere float64

// Volt is a voltage in V.
type Volt float64

// Second is a time in s.
type Second float64

// Metre is a length in m.
type Metre float64

// SquareMetre is an area in m².
type SquareMetre float64

// Ohm is a resistance, reactance or impedance in Ω.
type Ohm float64

// OhmPerMetre is a resistance, reactance or impedance per length in Ω/m.
type OhmPerMetre float64

// Hertz is a frequency in Hz.
type Hertz float64

// VoltAmpere is an apparent power, or a short-circuit level, in VA.
type VoltAmpere float64

// Watt is an active power in W.
type Watt float64

// Celsius is a temperature in °C; a difference of temperatures is written in the same unit.
type Celsius float64

// Newton is a force in N.
type Newton float64

// Pascal is a pressure or a mechanical stress in Pa.
type Pascal float64

// Joule is an energy in J.
type Joule float64

// JoulePerSquareMetre is an incident energy in J/m²; files write cal/cm2 or J/cm2.
type JoulePerSquareMetre float64

// AmpereSquaredSecond is a joule integral, ∫i²·dt, in A²s.
type AmpereSquaredSecond float64

// Percentage is a share of one, written with the percent sign: "6 %" is 0.06.
type Percentage float64

// Multiple is a multiple of a rated value, written with a cross: "5 x" is 5.
type Multiple float64

// Ratio is a bare number such as a power factor: "0.95" is 0.95.
type Ratio float64

// Dimension returns the quantity current.
func (Ampere) Dimension() *Dimension { return current }

// Dimension returns the quantity voltage.
func (Volt) Dimension() *Dimension { return voltage }

// Dimension returns the quantity time.
func (Second) Dimension() *Dimension { return duration }

// Dimension returns the quantity length.
func (Metre) Dimension() *Dimension { return length }

// Dimension returns the quantity area.
func (SquareMetre) Dimension() *Dimension { return area }

// Dimension returns the quantity resistance.
func (Ohm) Dimension() *Dimension { return resistance }

// Dimension returns the quantity resistance_per_length.
func (OhmPerMetre) Dimension() *Dimension { return resistancePerLength }

// Dimension returns the quantity frequency.
func (Hertz) Dimension() *Dimension { return frequency }

// Dimension returns the quantity apparent_power.
func (VoltAmpere) Dimension() *Dimension { return apparentPower }

// Dimension returns the quantity power.
func (Watt) Dimension() *Dimension { return power }

// Dimension returns the quantity temperature.
func (Celsius) Dimension() *Dimension { return temperature }

// Dimension returns the quantity force.
func (Newton) Dimension() *Dimension { return force }

// Dimension returns the quantity pressure.
func (Pascal) Dimension() *Dimension { return pressure }

// Dimension returns the quantity energy.
func (Joule) Dimension() *Dimension { return energy }

// Dimension returns the quantity incident_energy.
func (JoulePerSquareMetre) Dimension() *Dimension { return incidentEnergy }

// Dimension returns the quantity joule_integral.
func (AmpereSquaredSecond) Dimension() *Dimension { return jouleIntegral }

// Dimension returns the quantity percentage.
func (Percentage) Dimension() *Dimension { return percentage }

// Dimension returns the quantity multiple.
func (Multiple) Dimension() *Dimension { return multiple }

// Dimension returns the quantity number.
func (Ratio) Dimension() *Dimension { return number }
