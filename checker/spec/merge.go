package spec

import "boardproof/checker/place"

// A merger puts one object over another: own values win, objects and collections merge deeply,
// values and lists replace each other as a whole.
type merger struct {
	// resolved is set when the lower object has no `like:` of its own any more.
	resolved bool
}

// mergeBasis puts a file over its basis; step is the place of the `basis:` that named it.
func mergeBasis(own, base *node, step place.Place) *node {
	m := merger{}
	// The document in force at the top of the file does not speak for the basis.
	merged := m.object(outline().root, own, without(base, "basis", "board"), []place.Place{step}, pin{set: true})
	return merged
}

func without(n *node, names ...string) *node {
	w := *n
	w.keys = nil
	for _, k := range n.keys {
		leave := false
		for _, name := range names {
			leave = leave || k.name == name
		}
		if !leave {
			w.keys = append(w.keys, k)
		}
	}
	return &w
}

// long returns a short form as the mapping it stands for, everything else as it is.
func long(b *branch, n *node) *node {
	if b.of.short == "" || n.shape != scalar || n.isNone() || n.isSilent() {
		return n
	}
	value := *n
	value.via, value.pin = nil, pin{}
	return &node{shape: mapping, place: n.place, via: n.via, pin: n.pin, keys: []key{{b.of.short, n.place, &value}}}
}

// pinned is the document in force for the children of n.
func pinned(n *node, above pin) pin {
	above = above.or(n.pin)
	if k, ok := n.child("from"); ok && n.shape == mapping {
		above = pin{set: true}
		if k.value.shape == scalar && !k.value.isSilent() {
			above.document = k.value.text
		}
	}
	return above
}

// object merges two mappings of the type of b. Steps lead from base to own, p is the document in
// force around base.
func (m merger) object(b *branch, own, base *node, steps []place.Place, p pin) *node {
	p = pinned(base, p)
	out := *own
	out.keys = make([]key, 0, len(own.keys)+len(base.keys))
	find, has := base.lookup(), own.lookup()
	for _, k := range own.keys {
		if below, both := find(k.name); both {
			k.value = m.field(b, k, below, steps, p)
		}
		out.keys = append(out.keys, k)
	}
	for _, k := range base.keys {
		if _, both := has(k.name); both || k.name == "from" || k.name == "like" && m.resolved {
			continue
		}
		k.value = k.value.moved(steps, p)
		out.keys = append(out.keys, k)
	}
	return &out
}

// field merges what stands behind the same key.
func (m merger) field(b *branch, own, base key, steps []place.Place, p pin) *node {
	i, known := b.of.index[own.name]
	if !known || b.inner[i] == nil || own.value.shape != mapping {
		return own.value
	}
	inner, below := b.inner[i], base.value
	steps = join(steps, below.via)
	switch l := b.fields[i]; {
	case l.Kind == KindCollection && below.shape == mapping:
		return m.collection(inner, own.value, below, steps, p.or(below.pin))
	case l.Kind == KindObject && !l.List:
		if below = long(inner, below); below.shape == mapping {
			return m.object(inner, own.value, below, steps, p)
		}
	}
	return own.value
}

// collection merges two collections entry by entry.
func (m merger) collection(inner *branch, own, base *node, steps []place.Place, p pin) *node {
	out := *own
	out.keys = make([]key, 0, len(own.keys)+len(base.keys))
	find, has := base.lookup(), own.lookup()
	for _, k := range own.keys {
		if below, both := find(k.name); both && k.value.shape == mapping {
			if entry := long(inner, below.value); entry.shape == mapping {
				k.value = m.object(inner, k.value, entry, join(steps, entry.via), p)
			}
		}
		out.keys = append(out.keys, k)
	}
	for _, k := range base.keys {
		if _, both := has(k.name); !both {
			k.value = k.value.moved(steps, p)
			out.keys = append(out.keys, k)
		}
	}
	return &out
}
