package generate

import (
	"fmt"
	"strconv"
	"strings"

	"gopkg.in/yaml.v3"
)

var kindConstants = map[string]string{
	quantity: "Quantity", words: "Words", text: "Text", count: "Count", yesNo: "YesNo", nameOf: "Names",
	is: "Object", named: "Collection", byVoltage: "VoltageTable", pairs: "PairTable", ipCode: "Protection",
}

// goTables writes the fields of every type as data, for the reader, the hints and the forms.
func (m *model) goTables(b *strings.Builder) {
	fmt.Fprintf(b, "// vocabularyFormat is the version of the vocabulary that this file was made from.\nconst vocabularyFormat = %q\n\n", m.format)
	b.WriteString("// objectTypes are the types of the vocabulary in its order.\nvar objectTypes = []*objectType{\n")
	for _, t := range m.types {
		fmt.Fprintf(b, "{name: %q, title: %q, short: %q, fields: []*Field{\n", t.name, t.title, t.short)
		for _, f := range t.fields {
			m.goField(b, t, f)
		}
		b.WriteString("}},\n")
	}
	b.WriteString("}\n")
}

func (m *model) goField(b *strings.Builder, t *objectType, f *field) {
	kind := "Kind" + kindConstants[f.kind]
	if f.kind == date {
		kind = "Kind" + goName(f.of[0])
	}
	fmt.Fprintf(b, "\t{Type: %q, Key: %q, Kind: %s", t.name, f.key, kind)
	put := func(name, value string) {
		if value != "" {
			fmt.Fprintf(b, ", %s: %s", name, strconv.Quote(value))
		}
	}
	switch f.kind {
	case quantity, byVoltage:
		put("Dimension", f.of[0])
	case pairs:
		put("Dimension", f.of[0])
		put("Second", f.of[1])
	case words:
		fmt.Fprintf(b, ", Words: %sList", lower(goName(f.of[0])))
	case is, named:
		put("Of", f.of[0])
	case nameOf:
		fmt.Fprintf(b, ", Collections: %#v", f.of)
	case count:
		fmt.Fprintf(b, ", Least: %d, Most: %d", f.least, f.most)
	}
	for _, flag := range []struct {
		name string
		set  bool
	}{{"List", f.list}, {"None", f.none}} {
		if flag.set {
			fmt.Fprintf(b, ", %s: true", flag.name)
		}
	}
	put("Title", f.title)
	put("Symbol", f.symbol)
	put("Note", f.note)
	put("Clause", f.clause)
	for _, r := range []struct {
		name string
		in   *interval
	}{{"Usual", f.usual}, {"Possible", f.possible}} {
		if r.in != nil {
			fmt.Fprintf(b, ", %s: &Range{Text: %q, Low: %v, High: %v}", r.name, r.in.text, r.in.low, r.in.high)
		}
	}
	put("Example", m.exampleText(f))
	if f.says != "" {
		fmt.Fprintf(b, ", says: %s", goName(f.says))
	}
	b.WriteString("},\n")
}

// exampleText is the value of the field as it may stand behind its key on one line.
func (m *model) exampleText(f *field) string { return flow(m.example(f)) }

// flow prints a YAML value in flow form.
func flow(n *yaml.Node) string {
	if n == nil {
		return ""
	}
	var parts []string
	switch n.Kind {
	case yaml.MappingNode:
		for i := 0; i+1 < len(n.Content); i += 2 {
			parts = append(parts, flow(n.Content[i])+": "+flow(n.Content[i+1]))
		}
		return "{" + strings.Join(parts, ", ") + "}"
	case yaml.SequenceNode:
		for _, item := range n.Content {
			parts = append(parts, flow(item))
		}
		return "[" + strings.Join(parts, ", ") + "]"
	}
	return plainOrQuoted(n.Value)
}

// plainOrQuoted puts a text between quotes where YAML would read it as something else.
func plainOrQuoted(value string) string {
	risky := value == "" || strings.ContainsAny(value, "{}[],#&*!|>'\"%@`") || strings.Contains(value, ": ") ||
		strings.HasSuffix(value, ":") || strings.HasPrefix(value, "- ") || strings.HasPrefix(value, "? ")
	if risky && !harmless(value) {
		return strconv.Quote(value)
	}
	return value
}

// harmless values hold a risky sign where YAML does not mind it, such as "6 %".
func harmless(value string) bool {
	return strings.HasSuffix(value, " %") && !strings.ContainsAny(value, "{}[],#&*!|>'\"@`:")
}
