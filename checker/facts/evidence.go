package facts

import (
	"slices"
	"strings"

	"boardproof/checker/spec"
	"boardproof/checker/working"
)

// evidence is what the file says has been shown, by the claim it covers.
type evidence struct {
	board *spec.Board
}

// basis is the strongest basis that evidence gives a claim; whatever no evidence
// covers is declared. A claim about bars is covered by a verification of short-circuit
// withstand that names these bars and values not below the claim's, an interlock by a
// verification of mechanical operation that names its units, a setting by the sheet
// of settings as left, and a claim about the assembly by its verification.
// Source: IEC 61439-1 clause 10 (means of verification; from memory, unconfirmed).
func (e evidence) basis(at spec.At) working.Basis {
	best := working.Declared
	for i := range e.board.Evidence.Items {
		item := &e.board.Evidence.Items[i]
		if item.Shows.Said() && !(item.ThisVariant.Said() && !item.ThisVariant.Value) && e.covers(item, at) {
			best = max(best, meansBasis(item.By))
		}
	}
	if name, _, ok := inside(at.Path, "protection"); ok {
		if p, found := e.board.Protection.Get(name); found && p.Value.SettingsSource.Said() && p.Value.SettingsSource.Value == spec.SettingsSourceAsLeftSheet {
			best = max(best, working.Inspected)
		}
	}
	return best
}

func (e evidence) covers(item *spec.EvidenceItem, at spec.At) bool {
	switch item.Shows.Value {
	case spec.VerificationShortCircuitWithstand:
		name, key, ok := inside(at.Path, "busbars")
		bars, found := e.board.Busbars.Get(name)
		return ok && found && names(item, "busbars", name) && ofPhases(item) && reaches(item, &bars.Value, key)
	case spec.VerificationMechanicalOperation:
		return e.coversInterlock(item, at.Path)
	case spec.VerificationDielectricProperties:
		return e.namesAllBars(item) && at.Path == e.board.Assembly.RatedInsulationVoltage.Path
	case spec.VerificationDegreeOfProtection:
		return e.namesAllBars(item) && strings.HasPrefix(at.Path, e.board.Assembly.Enclosure.Path+".")
	}
	return false
}

// namesAllBars reports whether evidence is for the board as a whole: it names every set
// of bars, and the count on the diagram says that these are all. One that names
// nothing could be for anything.
func (e evidence) namesAllBars(item *spec.EvidenceItem) bool {
	for _, bars := range e.board.Busbars.Entries {
		if !names(item, "busbars", bars.Name) {
			return false
		}
	}
	counted := e.board.Counted.Busbars
	return counted.Said() && counted.Value == len(e.board.Busbars.Entries) && counted.Value > 0
}

// ofPhases reports whether evidence is for the phase conductors, not for neutral or
// protective conductor alone.
func ofPhases(item *spec.EvidenceItem) bool {
	return item.Conductors.State == spec.NotSaid || slices.ContainsFunc(item.Conductors.Items, func(c spec.Given[spec.CircuitConductors]) bool {
		return c.Said() && c.Value == spec.CircuitConductorsPhases
	})
}

// coversInterlock reports whether every unit of the interlock that the path belongs to
// is named.
func (e evidence) coversInterlock(item *spec.EvidenceItem, path string) bool {
	for i := range e.board.Transfer.Interlocks.Items {
		lock := &e.board.Transfer.Interlocks.Items[i]
		if strings.HasPrefix(path, lock.Path+".") {
			return lock.Of.Said() && !slices.ContainsFunc(lock.Of.Items, func(of spec.Given[spec.Name]) bool {
				return !names(item, "units", of.Value.Text)
			})
		}
	}
	return false
}

// inside splits "busbars.main A.peak_withstand" into name and key.
func inside(path, collection string) (name, key string, ok bool) {
	rest, ok := strings.CutPrefix(path, collection+".")
	if !ok {
		return "", "", false
	}
	name, key, _ = strings.Cut(rest, ".")
	return name, key, true
}

func names(item *spec.EvidenceItem, collection, name string) bool {
	return item.Of.Said() && slices.ContainsFunc(item.Of.Items, func(of spec.Given[spec.Name]) bool {
		return of.Said() && of.Value.In == collection && of.Value.Text == name
	})
}

// reaches reports whether the values shown are not below those claimed.
func reaches(item *spec.EvidenceItem, bars *spec.Busbar, key string) bool {
	shown, claimed := &item.Values.ShortTimeWithstand, &bars.ShortTimeWithstand
	switch {
	case strings.HasPrefix(key, "short_time_withstand"):
		return shown.Current.Said() && shown.Duration.Said() && claimed.Current.Said() && claimed.Duration.Said() &&
			shown.Current.Value >= claimed.Current.Value && shown.Duration.Value >= claimed.Duration.Value
	case key == "peak_withstand":
		return item.Values.Peak.Said() && bars.PeakWithstand.Said() && item.Values.Peak.Value >= bars.PeakWithstand.Value
	}
	return false
}

// meansBasis is the basis that a means of verification gives.
func meansBasis(by spec.Given[spec.EvidenceMeans]) working.Basis {
	if !by.Said() {
		return working.Declared
	}
	switch by.Value {
	case spec.EvidenceMeansTest:
		return working.Tested
	case spec.EvidenceMeansComparisonWithATestedDesign:
		return working.Compared
	case spec.EvidenceMeansInspection:
		return working.Inspected
	case spec.EvidenceMeansCalculation, spec.EvidenceMeansAssessment:
		return working.Calculated
	}
	return working.Declared
}
