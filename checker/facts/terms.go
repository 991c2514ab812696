package facts

import (
	"slices"
	"sync"

	"boardproof/checker/spec"
	"boardproof/checker/units"
)

// Terms is the vocabulary of subjects. Each term is declared once, beside the walk
// that fills it or below, and listed once in its area's list.
var Terms = sync.OnceValue(func() *Vocabulary {
	v, err := NewVocabulary(slices.Concat(busbarTerms, boardTerms)...)
	if err != nil {
		panic(err) // a defect of this package, found by the first test that runs
	}
	return v
})

var busbarTerms = []*Term{
	supplyInterlock, withstandCurrent, withstandDuration, withstandJoule, withstandPeak, peakOfRatio,
	faultCurrent.atLeast, faultCurrent.atMost, faultSmallest.atLeast, faultSmallest.atMost,
	faultPeak.atLeast, faultPeak.atMost, faultJoule.atLeast, faultJoule.atMost, faultDuration.atLeast, faultDuration.atMost,
}

var boardTerms = []*Term{
	insulationVoltage, voltageRequired.atLeast, voltageRequired.atMost, doorOpen, underVoltage, practice,
}

// Terms of bars.
var (
	withstandCurrent  = declared[units.Ampere](Busbars, "withstand.current", "short-time withstand current", "Icw")
	withstandDuration = declared[units.Second](Busbars, "withstand.duration", "duration of the short-time withstand current", "tcw")
	withstandJoule    = shownAsCurrent(number[units.AmpereSquaredSecond](Busbars, "withstand.joule_integral", "short-time withstand", "Icw²·tcw", claim))
	withstandPeak     = declared[units.Ampere](Busbars, "withstand.peak", "peak withstand current", "Ipk")
	peakOfRatio       = number[units.Ampere](Busbars, "withstand.peak_of_ratio", "peak that belongs to the short-time withstand current", "n·Icw", required)

	supplyInterlock = ordered(Busbars, "supply.interlock", "interlock against the governing supply state", "interlock_kind", spec.InterlockKind(0).List().Words)

	faultCurrent  = worst(number[units.Ampere](Busbars, "fault.current", "largest short-circuit current", "I\"k", key))
	faultSmallest = worst(number[units.Ampere](Busbars, "fault.smallest_current", "smallest short-circuit current", "I\"k,min", key))
	faultPeak     = worst(number[units.Ampere](Busbars, "fault.peak", "largest peak short-circuit current", "ip", key))
	faultDuration = worst(number[units.Second](Busbars, "fault.duration", "longest time until a fault is cleared", "t", key))
	faultJoule    = worst(shownAsCurrent(number[units.AmpereSquaredSecond](Busbars, "fault.joule_integral", "largest Joule integral until cleared", "I²t", key)))
)

// Terms of the board.
var (
	insulationVoltage = declared[units.Volt](Boards, "insulation.rated_voltage", "rated insulation voltage", "Ui")
	voltageRequired   = worst(number[units.Volt](Boards, "insulation.voltage_required", "highest voltage of the system and its circuits", "Ue", required))
	doorOpen          = ordered(Boards, "door_open.contact_protection", "protection against contact with the door open", "contact_protection", contactProtection)
	underVoltage      = word(Boards, "work.under_voltage", "authorised work with doors open and parts live", yesNo)
	practice          = word(Boards, "practice", "practice", spec.Practice(0).List().Words)
)

// contactProtection are the degrees of protection of persons by an enclosure, low to
// high. Source: IEC 60529, additional letters A to D.
var contactProtection = []string{"not protected", "IPXXA", "IPXXB", "IPXXC", "IPXXD"}

var yesNo = []string{"yes", "no"}

// role says what a number is to a comparison and to the report.
type role int

const (
	claim    role = iota // found at the assembly
	required             // asked of it
	key                  // asked of it, and a key figure of the report
)

func number[U units.Unit](kind Kind, id, label, symbol string, r role) *Term {
	return &Term{Kind: kind, ID: id, Label: label, Symbol: symbol, Value: Number, Dimension: U(0).Dimension(), Claim: r == claim, Key: r == key}
}

// declared is a number that one leaf of the file states.
func declared[U units.Unit](kind Kind, id, label, symbol string) *Term {
	return number[U](kind, id, label, symbol, claim)
}

func word(kind Kind, id, label string, words []string) *Term {
	return &Term{Kind: kind, ID: id, Label: label, Value: Word, Words: words, ListID: id}
}

func ordered(kind Kind, id, label, list string, words []string) *Term {
	return &Term{Kind: kind, ID: id, Label: label, Value: Ordered, Words: words, ListID: list, Claim: true}
}

// pair are the two terms of a worst-of.
type pair struct{ atLeast, atMost *Term }

func worst(t *Term) pair {
	least, most := *t, *t
	least.ID, most.ID = t.ID+".at_least", t.ID+".at_most"
	least.Key = false
	return pair{&least, &most}
}

// shownAsCurrent shows a Joule integral as the current that brings it in the bars'
// own rated time, which is how a short-time withstand is spoken of.
func shownAsCurrent(t *Term) *Term {
	t.As = func(s *Subject, joule float64) (Shown, bool) {
		d := s.Fact(withstandDuration.ID)
		if d == nil || !d.Known || d.Number <= 0 || joule < 0 {
			return Shown{}, false
		}
		return Shown{
			Number: equivalentCurrent(joule, d.Number), Dimension: units.Ampere(0).Dimension(),
			Suffix: " for " + d.Text(),
		}, true
	}
	return t
}
