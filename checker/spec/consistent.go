package spec

import (
	"fmt"

	"boardproof/checker/place"
)

// checkWhole looks for what no single value shows: a file without a board, statements that cannot
// both hold.
func (r *reader) checkWhole(c *Content, tree *node) {
	if _, ok := tree.child("board"); !ok {
		r.problem(place.Problem{Place: c.Place, Path: "board", Kind: place.MissingKey, Got: `no key "board"`, Want: "the name of the board",
			Hint: "write board: with the name of the board"})
	}
	for i := range c.Units.Entries {
		r.checkDuty(&c.Units.Entries[i].Value)
	}
	for i := range c.Busbars.Entries {
		r.checkFeed(c, &c.Busbars.Entries[i].Value)
	}
}

// checkFeed holds the section of bars against that of the bars they are fed from.
func (r *reader) checkFeed(c *Content, b *Busbar) {
	if !b.Section.Said() || !b.FedFrom.Said() {
		return
	}
	feeding, ok := c.Busbars.Get(b.FedFrom.Value.Text)
	if ok && feeding.Value.Section.Said() && feeding.Value.Section.Value == b.Section.Value {
		return
	}
	r.problem(place.Problem{Place: b.Section.Place, Path: b.Section.Path, Kind: place.Contradiction,
		Got:  "section: beside fed_from:",
		Want: "the section for main bars, the bars ahead for distribution bars", Hint: "keep one of the two", Related: []place.Place{b.FedFrom.Place}})
}

// checkDuty holds the duty of a unit against the keys that only another duty has. A key that was
// copied from another unit while the duty was not says nothing about this unit.
func (r *reader) checkDuty(u *Unit) {
	if !u.Duty.Said() {
		return
	}
	contradict := func(at At, hint string) {
		if len(at.Via) == len(u.Duty.Via) {
			r.problem(place.Problem{Place: at.Place, Path: at.Path, Kind: place.Contradiction,
				Got:  at.Leaf.Key + ": at a unit with the duty " + place.Quote(u.Duty.Value.Text()),
				Want: "keys that fit the duty", Hint: hint, Related: []place.Place{u.Duty.Place}})
		}
	}
	switch u.Duty.Value {
	case UnitDutyIncomer:
		if u.Between.State != NotSaid {
			contradict(u.Between.At, "write connects: and to: for an incomer, or the duty coupler")
		}
	case UnitDutyCoupler:
		for _, g := range []Given[Name]{u.Connects, u.To} {
			if g.State != NotSaid {
				contradict(g.At, "write between: for a coupler, or the duty incomer")
			}
		}
		if b := u.Between; b.Said() && (len(b.Items) != 2 || b.Items[0].Value == b.Items[1].Value) {
			got := fmt.Sprintf("%d sections", len(b.Items))
			if len(b.Items) == 2 {
				got = "the same section twice"
			} else if len(b.Items) == 1 {
				got = "one section"
			}
			r.problem(place.Problem{Place: b.Place, Path: b.Path, Kind: place.Contradiction, Got: got,
				Want: "the two sections that the coupler joins", Hint: "write between: [A, B]"})
		}
	}
}
