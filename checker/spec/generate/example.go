package generate

import (
	"slices"
	"strconv"
	"strings"

	"boardproof/checker/units"

	"gopkg.in/yaml.v3"
)

// example returns the value the field shows as its example: the one of the vocabulary, or one that
// follows from the kind. It is nil for objects and collections.
func (m *model) example(f *field) *yaml.Node {
	n := f.example
	if isContainer(f.kind) {
		return nil
	}
	if n == nil {
		n = m.standIn(f)
	}
	switch {
	case f.kind == byVoltage && n != nil && n.Kind == yaml.ScalarNode:
		return mapping(scalarNode("400 V"), n)
	case f.list && n != nil && n.Kind != yaml.SequenceNode:
		return sequence(n)
	}
	return n
}

func (m *model) standIn(f *field) *yaml.Node {
	switch f.kind {
	case quantity, byVoltage:
		if d, ok := units.DimensionNamed(f.of[0]); ok {
			return scalarNode(d.Example())
		}
	case pairs:
		one, _ := units.DimensionNamed(f.of[0])
		two, _ := units.DimensionNamed(f.of[1])
		return sequence(sequence(scalarNode(one.Example()), scalarNode(two.Example())))
	case words:
		return scalarNode(m.listNamed[f.of[0]].words[0].text)
	case text:
		return scalarNode("text")
	case date:
		return scalarNode(map[string]string{"day": "2026-03-14", "month": "2026-03"}[f.of[0]])
	case count:
		return scalarNode(strconv.Itoa(min(max(f.least, 1), f.most)))
	case yesNo:
		return scalarNode("yes")
	case nameOf:
		return scalarNode(m.entryName(f.of[0]))
	case ipCode:
		return scalarNode("IP42")
	}
	return nil
}

// entryName is the name of the one entry of a collection in the example board.
func (m *model) entryName(collection string) string {
	if f := m.collections[collection]; f != nil {
		return exampleName(f)
	}
	return "X1"
}

func exampleName(f *field) string {
	if f.example != nil && f.example.Kind == yaml.ScalarNode {
		return f.example.Value
	}
	return strings.ToUpper(f.key[:1]) + "1"
}

// board prints a board file that says every field of the vocabulary once, in its order.
func (m *model) board() []byte {
	b := &strings.Builder{}
	b.WriteString("# An example that says every field of the vocabulary once; made from policies/board.yaml by go generate.\n" +
		"# It is no switchboard: the values fit the single field only.\n\n")
	m.printObject(b, m.typeNamed[rootType], "", true)
	return []byte(b.String())
}

func (m *model) printObject(b *strings.Builder, t *objectType, indent string, root bool) {
	for _, f := range t.fields {
		key := indent + f.key + ":"
		inner := m.typeNamed[strings.Join(f.of, "")]
		switch {
		case f.kind == is && f.list:
			b.WriteString(key + "\n")
			item := &strings.Builder{}
			m.printObject(item, inner, indent+"    ", false)
			b.WriteString(indent + "  - " + strings.TrimPrefix(item.String(), indent+"    "))
		case f.kind == is:
			b.WriteString(key + "\n")
			m.printObject(b, inner, indent+"  ", false)
		case f.kind == named:
			b.WriteString(key + "\n" + indent + "  " + plainOrQuoted(exampleName(f)) + ":\n")
			m.printObject(b, inner, indent+"    ", false)
		case f.key == "basis" && root:
		case f.kind == nameOf:
			name := plainOrQuoted(m.entryName(f.of[0]))
			if f.list {
				name = "[" + name + "]"
			}
			b.WriteString(key + " " + name + "\n")
		default:
			b.WriteString(key + " " + flow(m.example(f)) + "\n")
		}
	}
}

// checkExamples refuses examples that the reader would refuse.
func (m *model) checkExamples(c *complaints) {
	for _, t := range m.types {
		for _, f := range t.fields {
			if n := m.example(f); n != nil {
				for _, value := range leaves(n) {
					m.checkExample("type "+t.name+", "+f.key+": example", f, value, c)
				}
			}
		}
	}
}

// leaves are the values of an example: itself, the items of a list, the values behind voltages.
func leaves(n *yaml.Node) []*yaml.Node {
	switch n.Kind {
	case yaml.SequenceNode:
		return n.Content
	case yaml.MappingNode:
		var all []*yaml.Node
		for i := 1; i < len(n.Content); i += 2 {
			all = append(all, n.Content[i])
		}
		return all
	}
	return []*yaml.Node{n}
}

func (m *model) checkExample(what string, f *field, n *yaml.Node, c *complaints) {
	if n.Kind != yaml.ScalarNode {
		if f.kind != pairs || len(n.Content) != 2 {
			c.add(f.line, "%s: has the wrong shape", what)
			return
		}
		for i, name := range f.of {
			d, _ := units.DimensionNamed(name)
			if _, err := d.Parse(n.Content[i].Value); err != nil {
				c.add(f.line, "%s: %v", what, err)
			}
		}
		return
	}
	switch f.kind {
	case quantity, byVoltage:
		d, _ := units.DimensionNamed(f.of[0])
		v, err := d.Parse(n.Value)
		switch {
		case err != nil:
			c.add(f.line, "%s: %v", what, err)
		case f.possible != nil && (v < f.possible.low || v > f.possible.high):
			c.add(f.line, "%s: %s is not possible, %s", what, n.Value, f.possible.text)
		case f.usual != nil && (v < f.usual.low || v > f.usual.high):
			c.add(f.line, "%s: %s is not usual, %s", what, n.Value, f.usual.text)
		}
	case words:
		if !slices.ContainsFunc(m.listNamed[f.of[0]].words, func(w word) bool { return w.text == n.Value }) {
			c.add(f.line, "%s: %q is not a word of %s", what, n.Value, f.of[0])
		}
	case count:
		if v, err := strconv.Atoi(n.Value); err != nil || v < f.least || v > f.most {
			c.add(f.line, "%s: %q is no count from %d to %d", what, n.Value, f.least, f.most)
		}
	case pairs:
		c.add(f.line, "%s: write a list of pairs", what)
	}
}

func scalarNode(value string) *yaml.Node { return &yaml.Node{Kind: yaml.ScalarNode, Value: value} }

func sequence(items ...*yaml.Node) *yaml.Node {
	return &yaml.Node{Kind: yaml.SequenceNode, Content: items}
}

func mapping(keysAndValues ...*yaml.Node) *yaml.Node {
	return &yaml.Node{Kind: yaml.MappingNode, Content: keysAndValues}
}
