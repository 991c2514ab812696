package spec

import (
	"fmt"
	"strings"

	"boardproof/checker/place"
)

// mostFields is the number of fields that a board may spread out into, said or not: a board of a
// thousand units has fewer. It bounds the memory that a small hostile file can ask for.
const mostFields = 500_000

// A reader walks over the tree once and gathers what it finds.
type reader struct {
	problems   *place.Problems
	remarks    []Remark
	doubts     []Doubt
	names      map[string]map[string]bool // of the collections, by path; a missing collection is not known
	incomplete bool                       // some file could not be used: what is missing may be there
	reported   map[report]bool
	fields     int
	overrun    bool
}

// A report identifies what has been told: a value that is copied is told once, where it stands.
type report struct {
	place place.Place
	kind  place.Kind
	text  string
}

func (r *reader) once(at place.Place, kind place.Kind, text string) bool {
	key := report{at, kind, text}
	if r.reported[key] {
		return false
	}
	r.reported[key] = true
	return true
}

func (r *reader) problem(p place.Problem) {
	if r.once(p.Place, p.Kind, p.Got) {
		r.problems.Add(p)
	}
}

// spend counts fields and tells whether there is room for them.
func (r *reader) spend(fields int, at At) bool {
	r.fields += fields
	if r.fields > mostFields && !r.overrun {
		r.overrun = true
		r.problem(place.Problem{Place: at.Place, Path: at.Path, Kind: place.TooLarge, Got: "more entries than a board can have",
			Want: fmt.Sprintf("at most %d fields in all", mostFields), Hint: "give each board a file of its own"})
	}
	return !r.overrun
}

// collectNames notes the names of every collection that fixed keys lead to.
func (r *reader) collectNames(b *branch, n *node, path string) {
	if r.names == nil {
		r.names = map[string]map[string]bool{}
	}
	for i, inner := range b.inner {
		l := b.fields[i]
		if inner == nil || l.List {
			continue
		}
		var value *node
		if n != nil {
			if k, ok := n.child(l.Key); ok {
				value = k.value
			}
		}
		switch known := value == nil || value.shape == scalar; {
		case l.Kind == KindObject && (known || value.shape == mapping):
			if known {
				value = nil
			}
			r.collectNames(inner, value, path+l.Key+".")
		case l.Kind == KindCollection && known:
			r.names[path+l.Key] = map[string]bool{}
		case l.Kind == KindCollection && value.shape == mapping:
			names := make(map[string]bool, len(value.keys))
			for _, k := range value.keys {
				names[k.name] = true
			}
			r.names[path+l.Key] = names
		}
	}
}

// nearestHint proposes the known word that was probably meant.
func nearestHint(word string, known []string) string {
	if near, ok := place.Nearest(word, known); ok {
		return "write " + place.Quote(near)
	}
	return ""
}

// quoteAll puts quotes around the first few words.
func quoteAll(words []string, most int) []string {
	var out []string
	for i, w := range words {
		if i == most {
			return append(out, fmt.Sprintf("%d more", len(words)-most))
		}
		out = append(out, place.Quote(w))
	}
	return out
}

// oneOf lists words: "a", "b" or "c".
func oneOf(words []string, most int) string {
	all := quoteAll(words, most)
	if len(all) == 1 {
		return all[0]
	}
	return strings.Join(all[:len(all)-1], ", ") + " or " + all[len(all)-1]
}

// at is the place that a problem with the value points to: the value, or the key where nothing
// stands behind it or more than one line does.
func (k key) at() place.Place {
	if k.value.shape == scalar && k.value.text != "" {
		return k.value.place
	}
	return k.place
}

// describe says what a node is, for a sentence.
func (n *node) describe() string {
	switch {
	case n.shape == mapping:
		return "a mapping"
	case n.shape == sequence:
		return "a list"
	case n.null || strings.TrimSpace(n.text) == "":
		return "nothing"
	}
	return place.Quote(n.text)
}
