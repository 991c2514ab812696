package facts

import (
	"boardproof/checker/fault"
	"boardproof/checker/spec"
	"boardproof/checker/units"
	"boardproof/checker/working"
)

// behindLink adds the cable or bars between a source and its incomer.
func (w *walk) behindLink(z impedance, s *spec.Source, e end) impedance {
	link := &s.Link
	switch link.State {
	case spec.StatedNone:
		return z
	case spec.NotSaid:
		l := w.lack(link.At)
		l.Unit = "none, or kind, conductor, area, in_parallel and length"
		return lacking(l)
	}
	length := stated(w, link.Length, "l")
	count := working.Assumed(units.Ratio(1), "n", Name(link.InParallel.At), "nothing said of parallel conductors: one per phase", working.Source{Status: "common practice, no source"})
	switch {
	case link.InParallel.Said():
		count = working.Stated(units.Ratio(link.InParallel.Value), "n", Name(link.InParallel.At), w.leaf(link.InParallel.At))
	case e != smallest:
		// One conductor where there are five would make the fault smaller than it is.
		count = working.Lacking[units.Ratio](w.lack(link.InParallel.At))
	}
	r := working.Apply3(&fault.LineResistanceFormula, fault.LineResistance, w.resistancePerLength(link, e).As("R'_L"), length, count)
	if e == smallest {
		warm := working.Assumed(conductorTemperature, "θ_e", "temperature of the link", "conductors warm from load when the smallest current flows", working.Source{Standard: "IEC 60909-0", Clause: "7.1.2", Status: "the value is that of a published example"})
		r = working.Apply2(&fault.ResistanceAtTemperatureFormula, fault.ResistanceAtTemperature, r, warm)
	}
	x := working.Apply3(&fault.LineReactanceFormula, fault.LineReactance, w.reactancePerLength(link, e).As("X'_L"), length, count)
	return impedance{
		series("R", "resistance up to the board", z.r.As("R_S"), r.As("R_L")),
		series("X", "reactance up to the board", z.x.As("X_S"), x.As("X_L")),
		series("R", "resistance up to the board, for the peak", z.peakR.As("R_S"), r.As("R_L")),
		series("X", "reactance up to the board, for the peak", z.peakX.As("X_S"), x.As("X_L")),
	}
}

// resistancePerLength is that of one conductor at 20 °C: stated, from the table of
// stranded conductors, or from the area and the resistivity on the safe side.
func (w *walk) resistancePerLength(link *spec.Link, e end) working.Result[units.OhmPerMetre] {
	if link.ResistancePerLength.State != spec.NotSaid {
		return stated(w, link.ResistancePerLength, "R'_L")
	}
	return w.resistanceByArea(link, e)
}

// resistanceByArea is the resistance per length that follows from metal and area.
func (w *walk) resistanceByArea(link *spec.Link, e end) working.Result[units.OhmPerMetre] {
	area := stated(w, link.Area, "A")
	if !link.Conductor.Said() || !area.Known() {
		var lacks []working.Lack
		if !link.Conductor.Said() {
			lacks = append(lacks, w.lack(link.Conductor.At))
		}
		return working.Lacking[units.OhmPerMetre](append(lacks, area.Missing()...)...)
	}
	if !link.Kind.Said() && e == smallest {
		return working.Lacking[units.OhmPerMetre](w.lack(link.Kind.At))
	}
	material := fault.Copper
	if link.Conductor.Value == spec.ConductorMetalAluminium {
		material = fault.Aluminium
	}
	if isCable(link) && e != largest {
		stranded := working.Apply1(fault.StrandedResistanceFormula(material), func(a units.SquareMetre) (units.OhmPerMetre, error) {
			return fault.StrandedResistance(material, a)
		}, area)
		if stranded.Known() {
			return stranded
		}
	}
	if e != smallest {
		return working.Apply1(fault.SmallestBarResistanceFormula(material), func(a units.SquareMetre) (units.OhmPerMetre, error) {
			return fault.SmallestBarResistance(material, a)
		}, area)
	}
	return working.Apply1(fault.LargestBarResistanceFormula(material), func(a units.SquareMetre) (units.OhmPerMetre, error) {
		return fault.LargestBarResistance(material, a)
	}, area)
}

// reactancePerLength is stated, or usual for the kind of link; nought where the
// largest current is to be bounded.
func (w *walk) reactancePerLength(link *spec.Link, e end) working.Result[units.OhmPerMetre] {
	if e == largest {
		return orAssumed(w, link.ReactancePerLength, "X'_L", 0, "not stated; taken as nought, which makes the current largest", notStated)
	}
	if isCable(link) {
		return orAssumed(w, link.ReactancePerLength, "X'_L", fault.CableReactance, "not stated; usual for a cable", fault.CableReactanceSource)
	}
	if !link.Kind.Said() {
		if link.ReactancePerLength.State != spec.NotSaid {
			return stated(w, link.ReactancePerLength, "X'_L")
		}
		return working.Lacking[units.OhmPerMetre](lackOf(w.lack(link.Kind.At), w.lack(link.ReactancePerLength.At)))
	}
	return orAssumed(w, link.ReactancePerLength, "X'_L", fault.BarReactance, "not stated; usual for bars", fault.BarReactanceSource)
}

func isCable(link *spec.Link) bool { return link.Kind.Said() && link.Kind.Value == spec.LinkKindCable }
