package facts

import (
	"strings"
	"sync"

	"boardproof/checker/place"
	"boardproof/checker/spec"
	"boardproof/checker/units"
	"boardproof/checker/working"
)

// stated turns a value of the file into a result: the value with its place, or what
// would have to be stated.
func stated[U units.Unit](w *walk, g spec.Given[U], symbol string) working.Result[U] {
	if g.Said() {
		return working.Stated(g.Value, symbol, Name(g.At), w.leaf(g.At))
	}
	return working.Lacking[U](w.lack(g.At))
}

// orAssumed is the stated value, or an assumption where nothing was said. A doubted
// value is never replaced by an assumption: it is asked.
func orAssumed[U units.Unit](w *walk, g spec.Given[U], symbol string, value U, why string, source working.Source) working.Result[U] {
	if g.State == spec.NotSaid {
		return working.Assumed(value, symbol, Name(g.At), why, source)
	}
	return stated(w, g, symbol)
}

// leaf is the provenance of a stated value.
func (w *walk) leaf(at spec.At) *working.Leaf {
	l := &working.Leaf{Path: at.Path, Title: Name(at), Place: at.Place, Via: at.Via, From: at.From, Claim: at.Says == spec.Claims && !isLoad(at)}
	if l.Claim {
		l.Basis = w.evidence.basis(at)
	}
	return l
}

// isLoad tells whether a leaf describes what hangs on a unit: the owner's plant, not a
// statement about the assembly.
func isLoad(at spec.At) bool {
	return at.Leaf != nil && strings.HasPrefix(at.Leaf.Path, "units.*.load")
}

// lack asks for one leaf of the file.
func (w *walk) lack(at spec.At) working.Lack {
	l := working.Lack{Path: at.Path, What: Name(at), Place: at.Place}
	l.Unit = Example(at)
	for _, doubt := range w.board.Doubts {
		if doubt.Path == at.Path {
			l.Because = doubt.Text + " is outside the usual range " + doubt.Usual + ": is the unit right?"
		}
	}
	for _, remark := range w.board.Remarks {
		if remark.Path == at.Path || strings.HasPrefix(at.Path, remark.Path+".") {
			// One answer to the whole is asked once, for the whole.
			l.Path, l.What, l.Place = remark.Path, Name(remark.At), remark.Place
			l.Unit, l.Because = Example(remark.At), place.Quote(remark.Text)+" is no value"
		}
	}
	return l
}

// Example is how a leaf is written: its example, or for an object those of its values.
func Example(at spec.At) string {
	if at.Leaf == nil || at.Leaf.Example != "" {
		if at.Leaf == nil {
			return ""
		}
		return at.Leaf.Example
	}
	var parts []string
	for _, l := range spec.Outline() {
		if key, ok := strings.CutPrefix(l.Path, at.Leaf.Path+"."); ok && l.IsValue() && l.Example != "" && !strings.Contains(key, ".") {
			parts = append(parts, key+": "+l.Example)
		}
	}
	if len(parts) == 0 || len(parts) > 3 {
		return ""
	}
	return "{" + strings.Join(parts, ", ") + "}"
}

// lackOf asks for one of several leaves.
func lackOf(lacks ...working.Lack) working.Lack {
	whats := make([]string, len(lacks))
	for i, l := range lacks {
		whats[i] = l.What
	}
	return working.Lack{What: strings.Join(whats, " or "), OneOf: lacks, Place: lacks[0].Place}
}

// capability is a lack that no value of the file would cure: something this program
// does not compute.
func capability(what string, at place.Place) working.Lack {
	return working.Lack{What: what, Place: at, Because: "this version does not compute it; it has to be shown in another way"}
}

// Name is a leaf's name as a person would say it: its title, that of the object it
// belongs to, and the named thing: "duration of the rated short-time withstand
// current, main A".
func Name(at spec.At) string {
	if at.Leaf == nil {
		return at.Path
	}
	name := at.Leaf.Title
	pattern := strings.Split(at.Leaf.Path, ".")
	for i := len(pattern) - 1; i > 0; i-- {
		if pattern[i-1] == "*" {
			break
		}
		if list, ok := strings.CutSuffix(strings.Join(pattern[:i], "."), "[*]"); ok {
			name += " of " + strings.TrimSuffix(titles()[list], "s") + " " + itemNumber(at.Path)
			break
		}
		title, ok := titles()[strings.Join(pattern[:i], ".")]
		switch {
		case !ok || i == 1:
		case strings.Contains(title, name):
			name = title
		default:
			name += " of the " + title
		}
	}
	for i, step := range pattern {
		if step == "*" && i > 0 {
			return name + ", " + entryName(at.Path, pattern[:i], pattern[i+1:])
		}
	}
	return name
}

// itemNumber is the number in the brackets of a path: "transfer.interlocks[2].kind".
func itemNumber(path string) string {
	_, rest, _ := strings.Cut(path, "[")
	number, _, _ := strings.Cut(rest, "]")
	return number
}

// entryName is the free name that stands in a path between known keys. Names may hold
// dots themselves.
func entryName(path string, before, after []string) string {
	name := strings.TrimPrefix(path, strings.Join(before, ".")+".")
	if len(after) == 0 {
		return name
	}
	return strings.TrimSuffix(name, "."+strings.Join(after, "."))
}

var titles = sync.OnceValue(func() map[string]string {
	m := map[string]string{}
	for _, l := range spec.Outline() {
		m[l.Path] = l.Title
	}
	return m
})
