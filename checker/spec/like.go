package spec

import (
	"fmt"
	"slices"
	"strings"

	"boardproof/checker/place"
)

// longestLike is how many entries may copy each other in a row.
const longestLike = 16

// A resolver works out the `like:` of the entries of one collection.
type resolver struct {
	r      *reader
	inner  *branch
	path   string // of the collection
	from   string // the document in force around the collection
	find   func(name string) (key, bool)
	names  []string
	ready  map[string]copied
	active []string // the entries being worked out, for circles
}

// A copied entry is worked out; length counts the entries it copies in a row.
type copied struct {
	*node
	length int
}

// resolve returns the entries of a collection with what each takes from its sibling.
func (r *reader) resolve(inner *branch, collection *node, path, from string) []key {
	v := &resolver{r: r, inner: inner, path: path, from: from, find: collection.lookup(), ready: map[string]copied{}}
	for _, k := range collection.keys {
		v.names = append(v.names, k.name)
	}
	out := make([]key, len(collection.keys))
	for i, k := range collection.keys {
		k.value = v.entry(k).node
		out[i] = k
	}
	return out
}

func (v *resolver) entry(k key) copied {
	if done, ok := v.ready[k.name]; ok {
		return done
	}
	out := copied{node: k.value}
	if like, ok := v.likeOf(k); ok {
		v.active = append(v.active, k.name)
		if base, ok := v.sibling(k, like); ok {
			if entry := long(v.inner, base.node); entry.shape == mapping {
				steps := join([]place.Place{like.place}, entry.via)
				out = copied{merger{resolved: true}.object(v.inner, k.value, entry, steps, pin{true, v.from}), base.length + 1}
			}
		}
		v.active = v.active[:len(v.active)-1]
	}
	v.ready[k.name] = out
	return out
}

// likeOf returns the value of `like:` if there is one that names something.
func (v *resolver) likeOf(k key) (*node, bool) {
	if k.value.shape != mapping {
		return nil, false
	}
	like, ok := k.value.child("like")
	switch {
	case !ok || like.value.shape == faulty:
		return nil, false
	case like.value.shape != scalar || like.value.isSilent() || like.value.isNone():
		v.r.problem(place.Problem{Place: like.at(), Path: v.path + "." + k.name + ".like", Kind: place.WrongShape,
			Got: like.value.describe(), Want: "the name of another entry of " + v.path, Hint: "write the name, or leave the key out"})
		return nil, false
	}
	return like.value, true
}

// sibling finds the entry that is copied, itself worked out.
func (v *resolver) sibling(k key, like *node) (copied, bool) {
	refuse := func(kind place.Kind, got, want, hint string, related ...place.Place) (copied, bool) {
		v.r.problem(place.Problem{Place: like.place, Path: v.path + "." + k.name + ".like", Kind: kind,
			Got: place.Quote(like.text) + got, Want: want, Hint: hint, Related: related})
		return copied{}, false
	}
	target, ok := v.find(like.text)
	switch {
	case !ok && v.r.incomplete || ok && target.value.shape == faulty:
		return copied{}, false
	case !ok:
		return refuse(place.UnknownName, "", "the name of another entry of "+v.path, nearestHint(like.text, v.names))
	}
	if first := slices.Index(v.active, like.text); first >= 0 {
		circle := v.active[first:]
		var related []place.Place
		for _, name := range circle[:len(circle)-1] {
			other, _ := v.find(name)
			related = append(related, other.place)
		}
		return refuse(place.Contradiction, ", which closes a circle", "entries that do not copy each other in a circle",
			"take like: out of "+strings.Join(quoteAll(circle, 8), " or "), related...)
	}
	base := copied{}
	if len(v.active) <= longestLike {
		base = v.entry(target)
	}
	if base.node == nil || base.length >= longestLike {
		return refuse(place.TooDeep, fmt.Sprintf(", the end of a chain of more than %d entries that copy each other", longestLike),
			"a short chain", "let the entries copy the same one")
	}
	return base, true
}
