package spec

import (
	"fmt"
	"os"
	"slices"
	"strings"
	"testing"

	"boardproof/checker/place"
)

// A said leaf is a value of the example board that says every field once.
type saidLeaf struct {
	leaf    *Leaf
	path    string
	pointer string // of its node, as JSON Schema counts
	node    *node
}

// saidLeaves lists the single values of a tree; of a list, table or pair the first one.
func saidLeaves(b *branch, n *node, path, pointer string) []saidLeaf {
	var all []saidLeaf
	for i, l := range b.fields {
		k, ok := n.child(l.Key)
		if !ok {
			continue
		}
		v, at, ptr := k.value, strings.TrimPrefix(path+"."+l.Key, "."), pointer+"/"+l.Key
		switch {
		case l.Kind == KindCollection:
			for _, e := range v.keys {
				all = append(all, saidLeaves(b.inner[i], e.value, at+"."+e.name, ptr+"/"+e.name)...)
			}
		case l.Kind == KindObject && l.List:
			all = append(all, saidLeaves(b.inner[i], v.items[0], at+"[1]", ptr+"/0")...)
		case l.Kind == KindObject:
			all = append(all, saidLeaves(b.inner[i], v, at, ptr)...)
		case l.Kind == KindPairTable:
			all = append(all, saidLeaf{l, at + "[1][1]", ptr + "/0/0", v.items[0].items[0]})
		case l.Kind == KindVoltageTable:
			all = append(all, saidLeaf{l, at + "[" + v.keys[0].name + "]", ptr + "/" + v.keys[0].name, v.keys[0].value})
		case l.List:
			all = append(all, saidLeaf{l, at + "[1]", ptr + "/0", v.items[0]})
		case l.Key == "basis": // worked out by the loader
		default:
			all = append(all, saidLeaf{l, at, ptr, v})
		}
	}
	return all
}

func fullLeaves(t *testing.T) (text string, leaves []saidLeaf) {
	t.Helper()
	data, err := os.ReadFile("testdata/full.yaml")
	if err != nil {
		t.Fatal(err)
	}
	b := mustRead(t, "testdata/full.yaml")
	return string(data), saidLeaves(outline().root, b.tree, "", "")
}

func TestFullExampleSaysEveryField(t *testing.T) {
	t.Parallel()
	_, leaves := fullLeaves(t)
	said := map[*Leaf]bool{}
	for _, l := range leaves {
		said[l.leaf] = true
	}
	for _, l := range Leaves() {
		if !said[l] && l.Key != "basis" {
			t.Errorf("%s is not said", l.Path)
		}
		if l.Title == "" || l.Example == "" || l.IsValue() == (l.Kind == KindObject || l.Kind == KindCollection) {
			t.Errorf("%s has no title or example", l.Path)
		}
	}
	if len(leaves) < 500 {
		t.Errorf("only %d leaves", len(leaves))
	}
}

// A damage is a text to put in the place of a leaf, and the kinds of problem it may give.
type damage struct {
	name string
	text func(l *Leaf) string // empty: the damage does not go with the leaf
	// structural damages are those that the JSON Schema must see as well.
	structural bool
}

var damages = []damage{
	{"unit of another dimension", func(l *Leaf) string {
		switch l.Kind {
		case KindQuantity, KindVoltageTable, KindPairTable:
			if l.Dimension == "current" {
				return "12 mm"
			}
			return "12 kA"
		case KindText, KindNames:
			return ""
		}
		return "12 kA"
	}, true},
	{"impossible number", func(l *Leaf) string {
		switch l.Kind {
		case KindQuantity, KindVoltageTable:
			if l.Possible == nil {
				return ""
			}
			if l.Dimension == "temperature" {
				return "999 °C"
			}
			return l.dimension.Format(l.Possible.High * 1.5)
		case KindPairTable:
			return "12345678901234567 A"
		case KindCount:
			return fmt.Sprint(l.Most + 1)
		case KindDay, KindMonth:
			return "2026-02-31"
		}
		return ""
	}, false},
	{"unknown word", func(l *Leaf) string {
		if l.Kind == KindText {
			return ""
		}
		return "wibble"
	}, true},
	{"list in place of a value", func(*Leaf) string { return "[a, b]" }, true},
	{"mapping in place of a value", func(*Leaf) string { return "{wibble: a}" }, true},
}

// Every leaf at once is damaged in one way; there is one problem at each of them and nowhere else.
func TestEveryLeafDamaged(t *testing.T) {
	t.Parallel()
	text, leaves := fullLeaves(t)
	sentences := map[string]map[string]bool{}
	for _, d := range damages {
		damaged, places := plant(text, leaves, d)
		_, src, problems := Read("full.yaml", Options{Root: ".", ReadFile: func(string) ([]byte, error) { return []byte(damaged), nil }})
		found := map[string]string{}
		for _, p := range problems.All() {
			at := fmt.Sprintf("%d:%d", p.Place.Line, p.Place.Column)
			if before, twice := found[at]; twice {
				t.Errorf("%s: %s has two problems, %q and %q", d.name, at, before, p.Sentence())
			}
			found[at] = p.Sentence()
			if _, planted := places[at]; !planted {
				var out strings.Builder
				ps := &place.Problems{}
				ps.Add(p)
				ps.Print(&out, src)
				t.Errorf("%s: a problem where nothing was planted:\n%s", d.name, out.String())
			}
		}
		for at, path := range places {
			if found[at] == "" {
				t.Errorf("%s: no problem at %s for %s", d.name, at, path)
				continue
			}
			if sentences[path] == nil {
				sentences[path] = map[string]bool{}
			}
			if sentences[path][found[at]] {
				t.Errorf("%s: %s has a sentence it had for another damage: %s", d.name, path, found[at])
			}
			sentences[path][found[at]] = true
		}
		if len(places) < 400 && d.name != "impossible number" {
			t.Errorf("%s: only %d planted", d.name, len(places))
		}
	}
	for path, s := range sentences {
		if len(s) < 2 {
			t.Errorf("%s: only %d different sentences", path, len(s))
		}
	}
}

// plant puts the damage into every leaf it goes with and returns where problems must be: at the
// value, or at the key where a list or mapping has taken its place.
func plant(text string, leaves []saidLeaf, d damage) (damaged string, places map[string]string) {
	lines := strings.Split(text, "\n")
	places = map[string]string{}
	ordered := slices.Clone(leaves)
	slices.SortFunc(ordered, func(a, b saidLeaf) int { return place.Compare(b.node.place, a.node.place) })
	for _, l := range ordered { // from the end, so that the columns in front stay
		with := d.text(l.leaf)
		if with == "" {
			continue
		}
		p := l.node.place
		line := []rune(lines[p.Line-1])
		column := p.Column
		if with[0] == '[' || with[0] == '{' {
			// A list or mapping is pointed to by its key; an item of a list by itself.
			key := len(line) - len([]rune(strings.TrimLeft(string(line), " "))) + 1
			if l.leaf.Kind == KindVoltageTable {
				column = p.Column - len([]rune("400 V: "))
				if strings.Contains(string(line), "690 V") {
					column = p.Column - len([]rune("690 V: "))
				}
			} else if !l.leaf.List && l.leaf.Kind != KindPairTable {
				column = key
				if strings.HasPrefix(string(line[key-1:]), "- ") {
					column += 2
				}
			}
			if with[0] == '{' && (l.leaf.Kind == KindQuantity || l.leaf.Kind == KindVoltageTable) {
				// The mapping form of a quantity: its unknown key and its missing value are two faults.
				continue
			}
		}
		lines[p.Line-1] = string(line[:p.Column-1]) + with + string(line[p.EndColumn-1:])
		places[fmt.Sprintf("%d:%d", p.Line, column)] = l.path
	}
	return strings.Join(lines, "\n"), places
}
