package facts

import (
	"math"
	"slices"
	"strings"

	"boardproof/checker/fault"
	"boardproof/checker/network"
	"boardproof/checker/spec"
	"boardproof/checker/units"
	"boardproof/checker/working"
)

// ratioTolerance allows for ratings rounded when printed: 145 kA for 2.2 × 66 kA. It
// is used for the ratio of two ratings only, never against a fault current.
const ratioTolerance = 0.005

var (
	jouleOfRating = working.Formula{
		ID: "facts.joule_of_rating", Symbol: "Icw²·tcw", Name: "short-time withstand", Equation: "{Icw}²·{tcw}",
		Source: working.Source{Standard: "IEC 61439-1", Edition: "2020", Clause: "5.3.5"},
		Range:  []working.Interval{{Symbol: "tcw", Low: 0, High: 3, Dimension: units.Second(0).Dimension()}},
		Note:   "conversion to another time only up to 3 s and only with the peak not above Ipk",
	}
	peakOfRating = working.Formula{
		ID: "facts.peak_of_rating", Symbol: "n·Icw", Name: "peak that belongs to the short-time withstand current",
		Equation: "{n}·{Icw}·(1 − 0.005)", Source: working.Source{Standard: "IEC 61439-1", Edition: "2020", Clause: "Table 7"},
		Note: "0.5 % allows for ratings rounded when printed (common practice, no source)",
	}
)

// busbarFacts fills what is known of one set of bars.
func (w *walk) busbarFacts(bars *spec.Entry[spec.Busbar]) {
	s := NewSubject(Busbars, bars.Name, bars.Place)
	current := stated(w, bars.Value.ShortTimeWithstand.Current, withstandCurrent.Symbol)
	duration := stated(w, bars.Value.ShortTimeWithstand.Duration, withstandDuration.Symbol)
	setNumber(s, withstandCurrent, current)
	setNumber(s, withstandDuration, duration)
	setNumber(s, withstandPeak, stated(w, bars.Value.PeakWithstand, withstandPeak.Symbol))
	setNumber(s, withstandJoule, working.Apply2(&jouleOfRating, func(i units.Ampere, t units.Second) (units.AmpereSquaredSecond, error) {
		if err := jouleOfRating.CheckRange(float64(t)); err != nil {
			return 0, err
		}
		return units.AmpereSquaredSecond(float64(i) * float64(i) * float64(t)), nil
	}, current, duration))
	n := working.Apply1(&fault.PeakRatioFormula, fault.PeakRatio, current.As("I"))
	setNumber(s, peakOfRatio, working.Apply2(&peakOfRating, func(n units.Ratio, i units.Ampere) (units.Ampere, error) {
		return units.Ampere(float64(n) * float64(i) * (1 - ratioTolerance)), nil
	}, n, current))
	w.faultsAt(s, bars.Name)
	w.out.Subjects = append(w.out.Subjects, s)
}

// faultsAt computes the fault range at bars over all supply states.
func (w *walk) faultsAt(s *Subject, bars string) {
	var most, least, low, peakMost, peakLeast []working.Case[units.Ampere]
	var joule []working.Case[units.AmpereSquaredSecond]
	var duration []working.Case[units.Second]
	for _, state := range w.reckonedWith(bars) {
		ways := w.diagram.Branches(state, bars)
		if len(ways) == 0 {
			continue
		}
		upper := w.branchesOf(state, bars, ways, largest)
		lower := w.branchesOf(state, bars, ways, largestAtLeast)
		small := w.branchesOf(state, bars, ways, smallest)
		name := state.Name()
		most = append(most, working.Case[units.Ampere]{Name: name, Result: boundOfCurrent(upper).In(name)})
		least = append(least, working.Case[units.Ampere]{Name: name, Result: totalCurrent(lower).In(name)})
		low = append(low, working.Case[units.Ampere]{Name: name, Result: totalCurrent(small).In(name)})
		peakMost = append(peakMost, working.Case[units.Ampere]{Name: name, Result: totalPeak(upper).In(name)})
		peakLeast = append(peakLeast, working.Case[units.Ampere]{Name: name, Result: totalPeak(lower).In(name)})
		duration = append(duration, working.Case[units.Second]{Name: name, Result: w.longestDuration(ways, small).In(name)})
		joule = append(joule, working.Case[units.AmpereSquaredSecond]{Name: name, Result: w.jouleIntegral(ways, upper, small).In(name)})
	}
	open := w.open.Union(w.barsOpen(bars))
	setBounds(s, faultCurrent, least, most, open, w.closedBy)
	setBounds(s, faultPeak, peakLeast, peakMost, open, w.closedBy)
	w.setInterlock(s)
	setPair(s, faultSmallest, working.Smallest(faultSmallest.atLeast.Symbol, faultSmallest.atLeast.Label, low, open, w.closedBy...))
	setPair(s, faultDuration, working.Largest(faultDuration.atLeast.Symbol, faultDuration.atLeast.Label, duration, open, w.closedBy...))
	setPair(s, faultJoule, working.Largest(faultJoule.atLeast.Symbol, faultJoule.atLeast.Label, joule, open, w.closedBy...))
}

// setInterlock records the interlock that speaks against the state with the largest
// peak and does not exclude it: a better one would.
func (w *walk) setInterlock(s *Subject) {
	f := &Fact{Term: supplyInterlock, Lacks: working.Lacks{{What: "an interlock that speaks against the governing supply state without excluding it"}}}
	s.Set(f)
	peak := s.Fact(faultPeak.atLeast.ID)
	for _, state := range w.states {
		if !peak.Known || state.Name() != peak.How.Case {
			continue
		}
		if lock, ok := w.interlocks[w.diagram.Disregarded(state)]; ok {
			setWord(s, supplyInterlock, lock.Kind.Value.Text(), w.leaf(lock.Kind.At), w.lack(lock.Kind.At))
		}
		return
	}
}

// setBounds records a largest current whose two bounds rest on different assumptions.
func setBounds(s *Subject, p pair, least, most []working.Case[units.Ampere], open working.Lacks, closedBy []*working.Working) {
	setNumber(s, p.atLeast, working.Largest(p.atLeast.Symbol, p.atLeast.Label, least, open).AtLeast)
	setNumber(s, p.atMost, working.Largest(p.atMost.Symbol, p.atMost.Label, most, open, closedBy...).AtMost)
}

// barsOpen is what keeps bars from being found on the diagram.
func (w *walk) barsOpen(bars string) working.Lacks {
	for _, state := range w.states {
		if len(w.diagram.Branches(state, bars)) > 0 {
			return nil
		}
	}
	b, _ := w.board.Busbars.Get(bars)
	if b.Value.Section.Said() || b.Value.FedFrom.Said() || w.sectionOf(b) != "" {
		return nil
	}
	return working.Lacks{lackOf(w.lack(b.Value.Section.At), w.lack(b.Value.FedFrom.At))}
}

// branchesOf is what each source, and each motor connected with the bars, sends into a
// fault in a state.
func (w *walk) branchesOf(state network.State, bars string, ways []network.Branch, e end) []branch {
	var list []branch
	for _, way := range ways {
		source, ok := w.board.Sources.Get(way.Source)
		if !ok {
			continue // a name not defined is a problem of the file
		}
		list = append(list, w.cached(way.Source, e, func() impedance { return w.sourceImpedance(source, e) }))
	}
	for _, motor := range w.motors(w.diagram.Together(state, bars), e) {
		list = append(list, w.cached(motor.Name, e, func() impedance { return w.motorBranch(motor) }))
	}
	return list
}

// cached computes a branch once: what a source sends does not depend on the state.
func (w *walk) cached(name string, e end, impedanceOf func() impedance) branch {
	key := name + "\x00" + string(rune('0'+int(e)))
	b, ok := w.branches[key]
	if !ok {
		b = w.branchOf(name, impedanceOf(), e)
		w.branches[key] = b
	}
	return b
}

// equivalentCurrent is the current that brings a Joule integral in a time.
func equivalentCurrent(joule, seconds float64) float64 {
	return units.Round12(math.Sqrt(joule / seconds))
}

func sortByPath(list []*working.Working) {
	slices.SortFunc(list, func(a, b *working.Working) int { return strings.Compare(a.Leaf.Path, b.Leaf.Path) })
}
