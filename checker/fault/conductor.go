package fault

import (
	"fmt"
	"math"
	"strings"
	"sync"

	"boardproof/checker/units"
	"boardproof/checker/working"
)

// Material is what a conductor is made of.
type Material string

// The conductor materials whose resistance is known here.
const (
	Copper    Material = "copper"
	Aluminium Material = "aluminium"
)

// Default reactances per length at 50 Hz, for links whose reactance nobody states. At 60 Hz
// they are a fifth larger.
const (
	CableReactance       units.OhmPerMetre = 0.08e-3 // multicore cable or single cores in trefoil
	FlatCableReactance   units.OhmPerMetre = 0.09e-3 // single cores flat, touching
	SpacedCableReactance units.OhmPerMetre = 0.13e-3 // single cores flat, spaced
	BarReactance         units.OhmPerMetre = 0.15e-3 // open busbars
)

// Where the default reactances come from.
var (
	CableReactanceSource = working.Source{Standard: "CLC/TR 50480 and UTE C 15-500", Clause: "reactance of cables", Status: fromMemory}
	BarReactanceSource   = working.Source{Standard: "printed guide for short-circuit calculations", Clause: "0.15 mΩ/m for busbars", Status: seen}
)

type conductorRow struct {
	material  Material
	area      units.SquareMetre
	perLength units.OhmPerMetre
}

var conductors = sync.OnceValues(loadConductors)

func loadConductors() ([]conductorRow, error) {
	lines, err := rows("conductor_resistance.csv", "material", "area_mm2", "ohm_per_km")
	if err != nil {
		return nil, err
	}
	var out []conductorRow
	for _, line := range lines {
		area, err := line.numbers(1e-6, 1)
		if err != nil {
			return nil, err
		}
		ohms, err := line.numbers(1e-3, 2)
		if err != nil {
			return nil, err
		}
		r := conductorRow{Material(line.cells[0]), units.SquareMetre(area[0]), units.OhmPerMetre(ohms[0])}
		if r.material != Copper && r.material != Aluminium {
			return nil, fmt.Errorf("%s: found material %q, expected copper or aluminium", line.place, r.material)
		}
		if last := len(out) - 1; last >= 0 && out[last].material == r.material && (r.area <= out[last].area || r.perLength >= out[last].perLength) {
			return nil, fmt.Errorf("%s: areas must rise and resistances fall", line.place)
		}
		out = append(out, r)
	}
	return out, nil
}

// StrandedResistanceFormula is R'_L of a cable conductor of the given material.
func StrandedResistanceFormula(m Material) *working.Formula {
	return &working.Formula{
		ID: "fault.stranded_resistance_" + string(m), Symbol: "R'_L", Name: "resistance per length at 20 °C",
		Equation: "Table 2, class 2, " + string(m) + ", {A}",
		Source:   working.Source{Standard: "IEC 60228", Edition: "2004", Clause: "Table 2", Status: seen},
		Note:     "the table gives the largest permitted resistance",
	}
}

// StrandedResistance returns the largest resistance per length at 20 °C of one conductor of a
// cable, stranded, class 2. Only listed areas are answered (copper 1.5 to 630 mm², aluminium
// 10 to 630 mm²); there is no interpolation.
//
//	R'_L = Table 2 (material, A)
//
// Source: IEC 60228:2004 Table 2, seen in published material; confirmed by cases B01 to B06
// of testdata/iec60909/reference-cases.yaml.
func StrandedResistance(m Material, area units.SquareMetre) (units.OhmPerMetre, error) {
	table, err := conductors()
	if err != nil {
		return 0, err
	}
	var listed []string
	for _, r := range table {
		if r.material != m {
			continue
		}
		if math.Abs(float64(area-r.area)) < 1e-9*float64(r.area) {
			return r.perLength, nil
		}
		listed = append(listed, strings.TrimSuffix(units.Format(r.area), " mm²"))
	}
	if len(listed) == 0 {
		return 0, fmt.Errorf("found conductor material %q, expected copper or aluminium", m)
	}
	return 0, &working.RangeError{Symbol: "A", Found: units.Format(area), Limit: "A one of " + strings.Join(listed, ", ") + " mm² in " + string(m)}
}

// resistivity at 20 °C in Ω·m, the smallest and the largest to assume.
var resistivity = map[Material]struct{ smallest, largest float64 }{
	Copper:    {1.7241e-8, 1e-6 / 54},
	Aluminium: {2.826e-8, 1e-6 / 34},
}

var areaRange = limits[units.SquareMetre]("A", 1e-7, 0.1)

// SmallestBarResistanceFormula is R'_L of a bar of good conductivity, for the largest current.
func SmallestBarResistanceFormula(m Material) *working.Formula {
	return barFormula(m, "smallest", map[Material]string{Copper: "17.241", Aluminium: "28.26"}[m],
		working.Source{Standard: "IEC 60028", Clause: "100 % IACS for copper, 61 % for aluminium", Status: fromMemory})
}

// LargestBarResistanceFormula is R'_L of a bar of ordinary conductivity, for the smallest current.
func LargestBarResistanceFormula(m Material) *working.Formula {
	return barFormula(m, "largest", map[Material]string{Copper: "1000/54", Aluminium: "1000/34"}[m],
		iec60909("6.4", "copper seen in published material, aluminium from memory, unconfirmed"))
}

func barFormula(m Material, end, milliohm string, source working.Source) *working.Formula {
	return &working.Formula{
		ID: "fault." + end + "_bar_resistance_" + string(m), Symbol: "R'_L", Name: "resistance per length at 20 °C",
		Equation: milliohm + " mΩ·mm²/m / {A}", Source: source, Range: []working.Interval{areaRange},
		Note: "without the increase by skin and proximity effect",
	}
}

// SmallestBarResistance returns the resistance per length at 20 °C of a bar, or of a cable
// of an area not listed, at the good end of the usual conductivity.
//
//	R'_L = ρ20 / A,  ρ20 = 17.241 (copper) or 28.26 (aluminium) mΩ·mm²/m
//
// Source: IEC 60028, from memory, unconfirmed; confirmed by the range test against
// IEC 60228.
func SmallestBarResistance(m Material, area units.SquareMetre) (units.OhmPerMetre, error) {
	return barResistance(SmallestBarResistanceFormula(m), m, resistivity[m].smallest, area)
}

// LargestBarResistance returns the resistance per length at 20 °C of a bar, or of a cable
// of an area not listed, at the ordinary end of the usual conductivity.
//
//	R'_L = ρ20 / A,  ρ20 = 1000/54 (copper) or 1000/34 (aluminium) mΩ·mm²/m
//
// Source: IEC 60909-0 6.4, copper seen in published material; confirmed by the range test
// against IEC 60228.
func LargestBarResistance(m Material, area units.SquareMetre) (units.OhmPerMetre, error) {
	return barResistance(LargestBarResistanceFormula(m), m, resistivity[m].largest, area)
}

func barResistance(f *working.Formula, m Material, rho float64, area units.SquareMetre) (units.OhmPerMetre, error) {
	if rho == 0 {
		return 0, fmt.Errorf("found conductor material %q, expected copper or aluminium", m)
	}
	if err := f.CheckRange(float64(area)); err != nil {
		return 0, err
	}
	return finite[units.OhmPerMetre](f, rho/float64(area))
}

// LineResistanceFormula and LineReactanceFormula are the parts of Z_L of equal cables or bars
// in parallel.
var (
	LineResistanceFormula = working.Formula{
		ID: "fault.line_resistance", Symbol: "R_L20", Name: "resistance of the link at 20 °C",
		Equation: "{R'_L}·{l}/{n}", Source: working.Source{Status: identity}, Range: lineRange("R'_L"),
	}
	LineReactanceFormula = working.Formula{
		ID: "fault.line_reactance", Symbol: "X_L", Name: "reactance of the link",
		Equation: "{X'_L}·{l}/{n}", Source: working.Source{Status: identity}, Range: lineRange("X'_L"),
	}
)

func lineRange(symbol string) []working.Interval {
	return []working.Interval{limits[units.OhmPerMetre](symbol, 0, 1), limits[units.Metre]("l", 0, 1e5), limits[units.Ratio]("n", 1, 100)}
}

// LineResistance returns the resistance of a link of n equal conductors per phase.
//
//	R_L20 = R'_L·l / n
//
// n is a whole number. Source: definition; confirmed by testdata/iec60909/tr60909-4.yaml
// (Z_L1 to Z_L4 as published).
func LineResistance(perLength units.OhmPerMetre, length units.Metre, inParallel units.Ratio) (units.Ohm, error) {
	return alongLine(&LineResistanceFormula, perLength, length, inParallel)
}

// LineReactance returns the reactance of a link of n equal conductors per phase.
//
//	X_L = X'_L·l / n
//
// n is a whole number. Source: definition; confirmed by testdata/iec60909/tr60909-4.yaml
// (Z_L1 to Z_L4 as published).
func LineReactance(perLength units.OhmPerMetre, length units.Metre, inParallel units.Ratio) (units.Ohm, error) {
	return alongLine(&LineReactanceFormula, perLength, length, inParallel)
}

func alongLine(f *working.Formula, perLength units.OhmPerMetre, length units.Metre, n units.Ratio) (units.Ohm, error) {
	if err := f.CheckRange(float64(perLength), float64(length), float64(n)); err != nil {
		return 0, err
	}
	if float64(n) != math.Trunc(float64(n)) {
		return 0, fmt.Errorf("the number in parallel n is %s, expected a whole number", units.Format(n))
	}
	return finite[units.Ohm](f, float64(perLength)*float64(length)/float64(n))
}

// ResistanceAtTemperatureFormula is R_L of a warm conductor.
var ResistanceAtTemperatureFormula = working.Formula{
	ID: "fault.resistance_at_temperature", Symbol: "R_L", Name: "resistance of the link at its temperature",
	Equation: "{R_L20}·(1 + 0.004·({θ_e} − 20 °C))", Source: iec60909("6.4 and 7.1.2, eq. (3)", recomputed),
	Range: []working.Interval{partOf("R_L20"), limits[units.Celsius]("θ_e", -40, 300)},
	Note:  "0.004 per kelvin for copper and aluminium",
}

// ResistanceAtTemperature returns the resistance of a copper or aluminium conductor at a
// temperature. For the largest current 20 °C is used, for the smallest the temperature at
// the end of the fault.
//
//	R_L = R_L20·(1 + 0.004·(θ_e − 20 °C))
//
// Source: IEC 60909-0; confirmed by cases B01 to B06 of
// testdata/iec60909/reference-cases.yaml and by lv-exercise.yaml.
func ResistanceAtTemperature(at20 units.Ohm, temperature units.Celsius) (units.Ohm, error) {
	f := &ResistanceAtTemperatureFormula
	if err := f.CheckRange(float64(at20), float64(temperature)); err != nil {
		return 0, err
	}
	return finite[units.Ohm](f, float64(at20)*(1+0.004*(float64(temperature)-20)))
}
