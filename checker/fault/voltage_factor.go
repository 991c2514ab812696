package fault

import (
	"fmt"
	"sync"

	"boardproof/checker/units"
	"boardproof/checker/working"
)

// Edition is an edition of IEC 60909-0.
type Edition string

// The editions whose voltage factors differ.
const (
	Edition2001 Edition = "2001"
	Edition2016 Edition = "2016"
)

// factorRow is one line of Table 1.
type factorRow struct {
	edition   Edition
	above, to units.Volt
	tolerance units.Percentage // upper end; zero if the row holds for any
	max, min  units.Ratio
}

var voltageFactors = sync.OnceValues(loadVoltageFactors)

func loadVoltageFactors() ([]factorRow, error) {
	lines, err := rows("voltage_factor.csv", "edition", "above_v", "to_v", "tolerance_percent", "c_max", "c_min")
	if err != nil {
		return nil, err
	}
	var out []factorRow
	for _, line := range lines {
		v, err := line.numbers(1, 1, 2, 4, 5)
		if err != nil {
			return nil, err
		}
		r := factorRow{edition: Edition(line.cells[0]), above: units.Volt(v[0]), to: units.Volt(v[1]), max: units.Ratio(v[2]), min: units.Ratio(v[3])}
		if line.cells[3] != anything {
			percent, err := line.numbers(1, 3)
			if err != nil {
				return nil, err
			}
			r.tolerance = units.Percentage(percent[0] / 100)
		}
		if r.to <= r.above || r.min > r.max || r.max > 1.1 || r.min < 0.9 {
			return nil, fmt.Errorf("%s: the bounds or factors are out of order", line.place)
		}
		out = append(out, r)
	}
	return out, nil
}

var (
	lowVoltageRange    = limits[units.Volt]("U_n", 100, 1000)
	mediumVoltageRange = limits[units.Volt]("U_nQ", 1001, 35e3)
	toleranceRange     = limits[units.Percentage]("ΔU", 0, 0.10)
)

// VoltageFactorMaxFormula is c_max of a low-voltage network; both editions agree.
var VoltageFactorMaxFormula = working.Formula{
	ID: "fault.voltage_factor_max", Symbol: "c_max", Name: "voltage factor for the largest current",
	Equation: "Table 1 for {U_n} and the upper voltage tolerance {ΔU}",
	Source:   iec60909("Table 1", seen),
	Range:    []working.Interval{lowVoltageRange, toleranceRange},
	Note:     "a tolerance up to 6 % takes the row of 6 %, above that the row of 10 %",
}

// VoltageFactorMinFormula is c_min of a low-voltage network in the edition of 2016.
var VoltageFactorMinFormula = working.Formula{
	ID: "fault.voltage_factor_min", Symbol: "c_min", Name: "voltage factor for the smallest current",
	Equation: "Table 1 for {U_n} and the voltage tolerance {ΔU}",
	Source:   iec60909("Table 1", seen),
	Range:    []working.Interval{lowVoltageRange, toleranceRange},
	Note:     "a tolerance up to 6 % takes the row of 6 %, above that the row of 10 %",
}

// VoltageFactorMin2001Formula is c_min of a low-voltage network in the edition of 2001.
var VoltageFactorMin2001Formula = working.Formula{
	ID: "fault.voltage_factor_min_2001", Symbol: "c_min", Name: "voltage factor for the smallest current",
	Equation: "Table 1 for {U_n} and the voltage tolerance {ΔU}",
	Source:   working.Source{Standard: "IEC 60909-0", Edition: "2001", Clause: "Table 1", Status: seen},
	Range:    []working.Interval{lowVoltageRange, toleranceRange},
	Note:     "0.95 for both tolerances in this edition",
}

// FeederVoltageFactorMaxFormula is c_max at the connection point of a network above 1 kV.
var FeederVoltageFactorMaxFormula = working.Formula{
	ID: "fault.feeder_voltage_factor_max", Symbol: "c_Q", Name: "voltage factor of the feeding network, largest current",
	Equation: "Table 1 for {U_nQ}", Source: iec60909("Table 1", seen), Range: []working.Interval{mediumVoltageRange},
	Note: "the factor of the feeder's own bus, not that of the fault location",
}

// FeederVoltageFactorMinFormula is c_min at the connection point of a network above 1 kV.
var FeederVoltageFactorMinFormula = working.Formula{
	ID: "fault.feeder_voltage_factor_min", Symbol: "c_Q", Name: "voltage factor of the feeding network, smallest current",
	Equation: "Table 1 for {U_nQ}", Source: iec60909("Table 1", seen), Range: []working.Interval{mediumVoltageRange},
	Note: "the factor of the feeder's own bus, not that of the fault location",
}

// VoltageFactorMax returns c_max of a network of 100 V to 1000 V.
//
//	c_max = Table 1 (U_n, ΔU)
//
// Valid for a tolerance of 0 to 10 %. Source: IEC 60909-0 Table 1, seen in published
// material; confirmed by testdata/iec60909/reference-cases.yaml.
func VoltageFactorMax(nominal units.Volt, tolerance units.Percentage) (units.Ratio, error) {
	r, err := lowVoltageFactors(&VoltageFactorMaxFormula, Edition2016, nominal, tolerance)
	return r.max, err
}

// VoltageFactorMin returns c_min of a network of 100 V to 1000 V after the edition of 2016:
// 0.95 up to 6 %, 0.90 up to 10 %.
//
//	c_min = Table 1 (U_n, ΔU)
//
// Source: IEC 60909-0:2016 Table 1, seen in published material; confirmed by
// testdata/iec60909/reference-cases.yaml (min_2016).
func VoltageFactorMin(nominal units.Volt, tolerance units.Percentage) (units.Ratio, error) {
	r, err := lowVoltageFactors(&VoltageFactorMinFormula, Edition2016, nominal, tolerance)
	return r.min, err
}

// VoltageFactorMin2001 returns c_min of a network of 100 V to 1000 V after the edition of
// 2001: 0.95.
//
//	c_min = Table 1 (U_n, ΔU)
//
// Source: IEC 60909-0:2001 Table 1, seen in published material; confirmed by
// testdata/iec60909/reference-cases.yaml (min_library).
func VoltageFactorMin2001(nominal units.Volt, tolerance units.Percentage) (units.Ratio, error) {
	r, err := lowVoltageFactors(&VoltageFactorMin2001Formula, Edition2001, nominal, tolerance)
	return r.min, err
}

// FeederVoltageFactorMax returns c_max of a network above 1 kV up to 35 kV: 1.10.
//
//	c_Q = Table 1 (U_nQ)
//
// Source: IEC 60909-0 Table 1, seen in published material; that c belongs to the feeder's
// own bus is confirmed by Z_Qt in testdata/iec60909/tr60909-4.yaml.
func FeederVoltageFactorMax(nominal units.Volt) (units.Ratio, error) {
	r, err := mediumVoltageFactors(&FeederVoltageFactorMaxFormula, nominal)
	return r.max, err
}

// FeederVoltageFactorMin returns c_min of a network above 1 kV up to 35 kV: 1.00.
//
//	c_Q = Table 1 (U_nQ)
//
// Source: IEC 60909-0 Table 1, seen in published material; confirmed by
// testdata/iec60909/reference-cases.yaml.
func FeederVoltageFactorMin(nominal units.Volt) (units.Ratio, error) {
	r, err := mediumVoltageFactors(&FeederVoltageFactorMinFormula, nominal)
	return r.min, err
}

// MinimumVoltageFactor returns the formula and the function of c_min in an edition of the
// standard, for a caller that has the edition as data. The error names an edition that is
// not known.
func MinimumVoltageFactor(edition Edition) (*working.Formula, func(units.Volt, units.Percentage) (units.Ratio, error), error) {
	switch edition {
	case Edition2016:
		return &VoltageFactorMinFormula, VoltageFactorMin, nil
	case Edition2001:
		return &VoltageFactorMin2001Formula, VoltageFactorMin2001, nil
	}
	return nil, nil, fmt.Errorf("found edition %q of IEC 60909-0, expected %s or %s", edition, Edition2001, Edition2016)
}

func lowVoltageFactors(f *working.Formula, edition Edition, nominal units.Volt, tolerance units.Percentage) (factorRow, error) {
	if err := f.CheckRange(float64(nominal), float64(tolerance)); err != nil {
		return factorRow{}, err
	}
	return lookUpFactors(edition, nominal, tolerance)
}

func mediumVoltageFactors(f *working.Formula, nominal units.Volt) (factorRow, error) {
	if err := f.CheckRange(float64(nominal)); err != nil {
		return factorRow{}, err
	}
	return lookUpFactors(Edition2016, nominal, 0)
}

// lookUpFactors takes the first row whose voltage fits and whose tolerance is not exceeded.
func lookUpFactors(edition Edition, nominal units.Volt, tolerance units.Percentage) (factorRow, error) {
	table, err := voltageFactors()
	if err != nil {
		return factorRow{}, err
	}
	for _, r := range table {
		fits := nominal > r.above && nominal <= r.to || nominal == 100 && r.above == 100
		if r.edition == edition && fits && (r.tolerance == 0 || tolerance <= r.tolerance) {
			return r, nil
		}
	}
	return factorRow{}, fmt.Errorf("table 1 has no row for %s and %s", units.Format(nominal), units.Format(tolerance))
}
