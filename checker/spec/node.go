package spec

import "boardproof/checker/place"

// A shape is what YAML calls the kind of a node.
type shape uint8

const (
	scalar shape = iota
	mapping
	sequence
	faulty // reported already; nothing more is said about it
)

// A node is a piece of a file. Nodes are shared between trees and never changed once made.
type node struct {
	shape shape
	text  string // of a scalar, as written and without quotes
	null  bool   // nothing behind the key, "~" or "null"
	keys  []key  // of a mapping, in the order of the file
	items []*node
	place place.Place // of the scalar, or of the first key or item
	// via are the steps through which the node came into its parent; those of the parent come before.
	via []place.Place
	// pin is the document in force where the node came from, if it came from elsewhere.
	pin pin
}

// A pin is a document that stays in force although the value was moved.
type pin struct {
	set      bool
	document string
}

// or returns the inner pin if it is set, else p.
func (p pin) or(inner pin) pin {
	if inner.set {
		return inner
	}
	return p
}

type key struct {
	name  string
	place place.Place
	value *node
}

// few is the number of keys up to which looking through them is faster than an index.
const few = 12

// child returns the value behind a key.
func (n *node) child(name string) (key, bool) {
	for _, k := range n.keys {
		if k.name == name {
			return k, true
		}
	}
	return key{}, false
}

// lookup returns child for a mapping of any size without taking quadratic time over many calls.
func (n *node) lookup() func(name string) (key, bool) {
	if len(n.keys) <= few {
		return n.child
	}
	index := make(map[string]key, len(n.keys))
	for _, k := range n.keys {
		index[k.name] = k
	}
	return func(name string) (key, bool) {
		k, ok := index[name]
		return k, ok
	}
}

// isNone tells whether the node is the word none.
func (n *node) isNone() bool { return n.shape == scalar && !n.null && n.text == "none" }

// isSilent tells whether the node is a scalar that says nothing.
func (n *node) isSilent() bool { return n.shape == scalar && (n.null || saysNothing(n.text)) }

// moved returns the node as it appears in another mapping, reached through more steps.
func (n *node) moved(steps []place.Place, p pin) *node {
	if len(steps) == 0 && (!p.set || n.pin.set) {
		return n
	}
	m := *n
	m.via = join(steps, n.via)
	if !m.pin.set {
		m.pin = p
	}
	return &m
}

// join returns first and second one after the other without touching either.
func join(first, second []place.Place) []place.Place {
	switch {
	case len(first) == 0:
		return second
	case len(second) == 0:
		return first
	}
	return append(append(make([]place.Place, 0, len(first)+len(second)), first...), second...)
}
