package network

import (
	"slices"
	"strings"
)

// State is one combination of closed incomers and couplers.
type State struct {
	Closed     []string // incomers first, then couplers, in the order of the diagram
	ExcludedBy string   // the interlock that makes it impossible; empty if it can come about
}

// Name lists the closed switches: "Q1 + QC closed".
func (s State) Name() string { return strings.Join(s.Closed, " + ") + " closed" }

// Is reports whether a switch is closed.
func (s State) Is(name string) bool { return slices.Contains(s.Closed, name) }

// States forms every combination in which at least one incomer is closed, with the
// interlock that excludes it if one does. Fewer switches come first.
func (d *Diagram) States() []State {
	switches := make([]string, 0, len(d.Incomers)+len(d.Couplers))
	for _, i := range d.Incomers {
		switches = append(switches, i.Name)
	}
	for _, c := range d.Couplers {
		switches = append(switches, c.Name)
	}
	if len(switches) > MaxSwitches {
		return nil
	}
	incomers := uint(1)<<len(d.Incomers) - 1
	var states []State
	for set := uint(1); set < 1<<len(switches); set++ {
		if set&incomers == 0 {
			continue
		}
		var state State
		for i, name := range switches {
			if set&(1<<i) != 0 {
				state.Closed = append(state.Closed, name)
			}
		}
		state.ExcludedBy = d.excluder(state)
		states = append(states, state)
	}
	slices.SortStableFunc(states, func(a, b State) int { return len(a.Closed) - len(b.Closed) })
	return states
}

func (d *Diagram) excluder(state State) string {
	for _, lock := range d.Interlocks {
		if lock.Excludes && lock.against(state) {
			return lock.Name
		}
	}
	return ""
}

// Disregarded names an interlock that speaks against a state and does not exclude it,
// because it is of a kind that can fail or be bypassed; empty if there is none.
func (d *Diagram) Disregarded(state State) string {
	for _, lock := range d.Interlocks {
		if !lock.Excludes && lock.against(state) {
			return lock.Name
		}
	}
	return ""
}

// against reports whether more switches are closed than the interlock allows.
func (l Interlock) against(state State) bool {
	closed := 0
	for _, name := range l.Of {
		if state.Is(name) {
			closed++
		}
	}
	return closed > l.AtMost
}
