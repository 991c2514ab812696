package network

import (
	"fmt"
	"slices"
	"strings"
)

// MaxSwitches is the largest number of incomers and couplers for which all
// combinations are formed: 2^12 states. Real boards have fewer than ten.
const MaxSwitches = 12

// Diagram is the one-line diagram by names.
type Diagram struct {
	Incomers   []Incomer
	Couplers   []Coupler
	Bars       []Bar
	Outgoing   []Outgoing
	Interlocks []Interlock
}

// Incomer connects a source to a section of the bars.
type Incomer struct{ Name, Source, Section string }

// Coupler connects two sections.
type Coupler struct {
	Name    string
	Between [2]string
}

// Bar is a set of bars: main bars lie in a section, distribution bars are fed from
// other bars.
type Bar struct{ Name, Section, FedFrom string }

// Outgoing is a unit on bars.
type Outgoing struct{ Name, Bar string }

// Interlock keeps more than AtMost of the named switches from being closed at once.
type Interlock struct {
	Name     string
	Of       []string
	AtMost   int
	Excludes bool // mechanical or key: a combination against it cannot come about
}

// Fault says what is wrong with a diagram; Subject is the name it is about.
type Fault struct{ Subject, Text string }

// Error is the text with its subject.
func (f *Fault) Error() string { return f.Subject + ": " + f.Text }

// Check reports everything that keeps the diagram from being walked: too many
// switches, bars that hang on themselves or on nothing, a coupler with one section
// on both sides.
func (d *Diagram) Check() []*Fault {
	var faults []*Fault
	if n := len(d.Incomers) + len(d.Couplers); n > MaxSwitches {
		faults = append(faults, &Fault{"units", fmt.Sprintf("%d incomers and couplers make more supply states than can be judged one by one; the limit is %d", n, MaxSwitches)})
	}
	for _, c := range d.Couplers {
		if c.Between[0] == c.Between[1] {
			faults = append(faults, &Fault{c.Name, fmt.Sprintf("couples section %q with itself", c.Between[0])})
		}
	}
	for _, b := range d.Bars {
		if _, err := d.section(b.Name); err != nil {
			faults = append(faults, err)
		}
	}
	return faults
}

// section finds the section that a set of bars belongs to, going up fed_from.
func (d *Diagram) section(bar string) (string, *Fault) {
	start, seen := bar, []string{}
	for {
		if slices.Contains(seen, bar) {
			return "", &Fault{start, "is fed from itself: " + strings.Join(append(seen, bar), " from ")}
		}
		seen = append(seen, bar)
		i := slices.IndexFunc(d.Bars, func(b Bar) bool { return b.Name == bar })
		switch {
		case i < 0:
			return "", &Fault{start, fmt.Sprintf("hangs on the bars %q, which nobody describes", bar)}
		case d.Bars[i].Section != "":
			return d.Bars[i].Section, nil
		case d.Bars[i].FedFrom == "":
			return "", &Fault{bar, "belongs to no section and is fed from no other bars"}
		}
		bar = d.Bars[i].FedFrom
	}
}
