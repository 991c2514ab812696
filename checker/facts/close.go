package facts

import (
	"fmt"
	"slices"

	"boardproof/checker/network"
	"boardproof/checker/spec"
	"boardproof/checker/units"
	"boardproof/checker/working"
)

// closeCollections finds out whether anything could be missing that would make a fault
// larger or a supply state possible: every source has an incomer, the number of
// sources and units is that of the single-line diagram, and other supplies are listed
// or stated none.
func (w *walk) closeCollections() {
	b := w.board
	w.counted(b.Counted.Sources, len(b.Sources.Entries), "sources")
	w.counted(b.Counted.Units, len(b.Units.Entries), "units")
	w.counted(b.Counted.Busbars, len(b.Busbars.Entries), "busbars")
	for _, s := range b.Sources.Entries {
		if !w.hasIncomer(s.Name) {
			w.open = w.open.Union(working.Lacks{{Path: "units", What: "the incomer of " + s.Name, Place: s.Place, Unit: "a unit with duty: incomer, connects: " + s.Name}})
		}
	}
	for i := range b.Units.Entries {
		u := &b.Units.Entries[i]
		if u.Value.On.Said() && u.Value.Load.State == spec.NotSaid {
			l := w.lack(u.Value.Load.At)
			l.Unit = "none if nothing hangs on it, else current and motor: none, or motor, current, starting and fed_through"
			w.open = w.open.Union(working.Lacks{l})
		}
	}
	switch b.OtherSupplies.State {
	case spec.NotSaid:
		l := w.lack(b.OtherSupplies.At)
		l.Unit = "none"
		w.open = w.open.Union(working.Lacks{l})
	case spec.StatedNone:
		w.closedBy = append(w.closedBy, &working.Working{Symbol: "other supplies", Name: Name(b.OtherSupplies.At), Word: "none", Leaf: w.leaf(b.OtherSupplies.At)})
	default:
		for _, s := range b.OtherSupplies.Entries {
			w.open = w.open.Union(working.Lacks{capability("what "+s.Name+" feeds into a fault", s.Place)})
		}
	}
	for name, lock := range w.interlocks {
		if !slices.ContainsFunc(w.states, func(s network.State) bool { return s.ExcludedBy == name }) {
			continue // nothing rests on it
		}
		w.closedBy = append(w.closedBy, &working.Working{
			Symbol: "interlock", Name: Name(lock.Kind.At), Word: lock.Kind.Value.Text(), Leaf: w.leaf(lock.Kind.At),
		})
	}
	sortByPath(w.closedBy)
}

// counted compares a count taken from the single-line diagram with what is described.
func (w *walk) counted(count spec.Given[int], described int, what string) {
	switch {
	case !count.Said():
		w.open = w.open.Union(working.Lacks{w.lack(count.At)})
	case count.Value != described:
		l := w.lack(count.At)
		l.Because = fmt.Sprintf("%d counted on the single-line diagram, %d described", count.Value, described)
		w.open = w.open.Union(working.Lacks{l})
	default:
		w.closedBy = append(w.closedBy, working.Stated(units.Ratio(count.Value), what, Name(count.At), w.leaf(count.At)).How())
	}
}

func (w *walk) hasIncomer(source string) bool {
	for _, in := range w.diagram.Incomers {
		if in.Source == source {
			return true
		}
	}
	return false
}

// reckonedWith are the admitted supply states; of bars that none of them makes live,
// all states that do: an interlock that keeps bars dead for good is not believed.
func (w *walk) reckonedWith(bars string) []network.State {
	live := func(s network.State) bool { return len(w.diagram.Branches(s, bars)) > 0 }
	if admitted := w.admitted(); slices.ContainsFunc(admitted, live) {
		return admitted
	}
	return w.states
}

// admitted are the supply states that can come about.
func (w *walk) admitted() []network.State {
	var list []network.State
	for _, s := range w.states {
		if s.ExcludedBy == "" {
			list = append(list, s)
		}
	}
	return list
}
