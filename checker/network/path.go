package network

import "slices"

// Branch is the way from one source to a point: the incomer, and the couplers in
// order from the incomer's section to the point's.
type Branch struct {
	Source   string
	Incomer  string
	Couplers []string
}

// Devices lists what can interrupt the branch on this board, nearest the fault
// first: couplers, then the incomer. What interrupts it before the incomer belongs
// to the source.
func (b Branch) Devices() []string {
	devices := slices.Clone(b.Couplers)
	slices.Reverse(devices)
	return append(devices, b.Incomer)
}

// Branches finds the way from every source that feeds the bars in a state, by the
// fewest couplers. It is empty when the bars are dead in that state.
func (d *Diagram) Branches(state State, bar string) []Branch {
	target, fault := d.section(bar)
	if fault != nil {
		return nil
	}
	ways := d.ways(state, target)
	var branches []Branch
	for _, in := range d.Incomers {
		way, live := ways[in.Section]
		if live && state.Is(in.Name) {
			branches = append(branches, Branch{Source: in.Source, Incomer: in.Name, Couplers: way})
		}
	}
	return branches
}

// Together lists the outgoing units whose bars are connected with the given bars in
// a state, the bars' own units included.
func (d *Diagram) Together(state State, bar string) []string {
	target, fault := d.section(bar)
	if fault != nil {
		return nil
	}
	ways := d.ways(state, target)
	var units []string
	for _, out := range d.Outgoing {
		section, fault := d.section(out.Bar)
		if _, connected := ways[section]; fault == nil && connected {
			units = append(units, out.Name)
		}
	}
	return units
}

// ways maps every section connected with target to the closed couplers between, in
// the order in which current from that section meets them.
func (d *Diagram) ways(state State, target string) map[string][]string {
	ways := map[string][]string{target: nil}
	for queue := []string{target}; len(queue) > 0; queue = queue[1:] {
		here := queue[0]
		for _, c := range d.Couplers {
			for side, near := range c.Between {
				far := c.Between[1-side]
				if _, known := ways[far]; known || near != here || !state.Is(c.Name) {
					continue
				}
				ways[far] = append([]string{c.Name}, ways[here]...)
				queue = append(queue, far)
			}
		}
	}
	return ways
}
