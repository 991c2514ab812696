package generate

import (
	"fmt"
	"go/format"
	"strconv"
	"strings"
)

// goSource writes the structs, the words, the tables and the reading functions.
func (m *model) goSource() ([]byte, error) {
	b := &strings.Builder{}
	b.WriteString("// Code generated from policies/board.yaml by go generate; DO NOT EDIT.\n\npackage spec\n\n")
	if m.usesUnits() {
		b.WriteString("import \"boardproof/checker/units\"\n\n")
	}
	for _, t := range m.types {
		m.goStruct(b, t)
	}
	for _, l := range m.lists {
		goWords(b, l)
	}
	for _, t := range m.types {
		m.goReader(b, t)
	}
	m.goTables(b)
	return format.Source([]byte(b.String()))
}

func (m *model) usesUnits() bool {
	for _, t := range m.types {
		for _, f := range t.fields {
			if f.kind == quantity || f.kind == byVoltage || f.kind == pairs {
				return true
			}
		}
	}
	return false
}

func structName(t string) string {
	if t == rootType {
		return "Content"
	}
	return goName(t)
}

func (m *model) goStruct(b *strings.Builder, t *objectType) {
	name := structName(t.name)
	comment(b, "", name+" is what the file says of this: "+t.title+".")
	fmt.Fprintf(b, "type %s struct {\n\tAt\n\tState State\n\n", name)
	for _, f := range t.fields {
		comment(b, "\t", fieldComment(f))
		fmt.Fprintf(b, "\t%s %s\n", fieldName(f.key), fieldType(f))
	}
	b.WriteString("}\n\n")
}

func fieldComment(f *field) string {
	s := f.title
	if f.symbol != "" {
		s += " (" + f.symbol + ")"
	}
	s += "."
	if f.note != "" {
		s += " " + strings.TrimSuffix(strings.TrimSpace(f.note), ".") + "."
	}
	if f.usual != nil {
		s += " Usual: " + f.usual.text + "."
	}
	if f.clause != "" {
		s += " Source: " + f.clause + "."
	}
	return s
}

// comment writes text as a Go comment, wrapped at about 100 columns.
func comment(b *strings.Builder, indent, text string) {
	line := indent + "//"
	for _, w := range strings.Fields(text) {
		if len(line)+1+len(w) > 110 {
			b.WriteString(line + "\n")
			line = indent + "//"
		}
		line += " " + w
	}
	b.WriteString(line + "\n")
}

// leafType is the Go type of the value of one leaf.
func leafType(f *field) string {
	switch f.kind {
	case quantity:
		return "units." + dimensionTypes[f.of[0]]
	case words:
		return goName(f.of[0])
	case text:
		return "string"
	case date:
		return "Date"
	case count:
		return "int"
	case yesNo:
		return "bool"
	case nameOf:
		return "Name"
	case ipCode:
		return "IPCode"
	}
	return ""
}

func fieldType(f *field) string {
	switch {
	case f.kind == is && f.list:
		return "List[" + goName(f.of[0]) + "]"
	case f.kind == is:
		return goName(f.of[0])
	case f.kind == named:
		return "Named[" + goName(f.of[0]) + "]"
	case f.kind == byVoltage:
		return "ByVoltage[units." + dimensionTypes[f.of[0]] + "]"
	case f.kind == pairs:
		return "Pairs[units." + dimensionTypes[f.of[0]] + ", units." + dimensionTypes[f.of[1]] + "]"
	case f.list:
		return "List[Given[" + leafType(f) + "]]"
	}
	return "Given[" + leafType(f) + "]"
}

// goWords writes the type of a word list: a small number whose order is that of the list, so that
// words of an ordered list compare with < and >.
func goWords(b *strings.Builder, l *wordList) {
	name := goName(l.name)
	sentence := name + " is a word of this list: " + l.title + "."
	if l.ordered {
		sentence += " The words are in order, the lowest first."
	}
	comment(b, "", sentence+" Zero is no word.")
	fmt.Fprintf(b, "type %s uint8\n\n", name)
	comment(b, "", "The words: "+l.title+".")
	b.WriteString("const (\n")
	for i, w := range l.words {
		comment(b, "\t", fmt.Sprintf("%s%s is %q: %s.", name, goName(w.text), w.text, strings.TrimSuffix(w.description, ".")))
		fmt.Fprintf(b, "\t%s%s %s = %d\n", name, goName(w.text), name, i+1)
	}
	b.WriteString(")\n\n")
	fmt.Fprintf(b, "// Text returns the word as the file spells it, empty for zero.\nfunc (w %s) Text() string { return %sList.Text(int(w)) }\n\n", name, lower(name))
	fmt.Fprintf(b, "// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.\nfunc (w %s) Rank() int { return %sList.Rank(int(w)) }\n\n", name, lower(name))
	fmt.Fprintf(b, "// List returns the list the word belongs to.\nfunc (%s) List() *WordList { return %sList }\n\n", name, lower(name))
	fmt.Fprintf(b, "var %sList = &WordList{Name: %q, Title: %q, Ordered: %t, Words: []string{", lower(name), l.name, l.title, l.ordered)
	for _, w := range l.words {
		b.WriteString(strconv.Quote(w.text) + ", ")
	}
	b.WriteString("}, Descriptions: []string{\n")
	for _, w := range l.words {
		b.WriteString("\t" + strconv.Quote(w.description) + ",\n")
	}
	b.WriteString("}}\n\n")
}

func lower(name string) string { return "the" + name }

// goReader writes the function that fills one struct, a line for each field.
func (m *model) goReader(b *strings.Builder, t *objectType) {
	name := structName(t.name)
	fmt.Fprintf(b, "func read%s(o *object, v *%s) {\n\tv.At, v.State = o.at, o.state\n", name, name)
	for i, f := range t.fields {
		into := "&v." + fieldName(f.key)
		call := ""
		switch f.kind {
		case quantity:
			call = "quantityOf"
		case words:
			call = "wordOf"
		case text:
			call = "textOf"
		case date:
			call = "dateOf"
		case count:
			call = "countOf"
		case yesNo:
			call = "yesNoOf"
		case nameOf:
			call = "nameOf"
		case ipCode:
			call = "ipCodeOf"
		}
		switch {
		case f.kind == is && f.list:
			fmt.Fprintf(b, "\tobjectList(o, %d, %s, read%s)\n", i, into, goName(f.of[0]))
		case f.kind == is:
			fmt.Fprintf(b, "\tinnerObject(o, %d, %s, read%s)\n", i, into, goName(f.of[0]))
		case f.kind == named:
			fmt.Fprintf(b, "\tnamedObjects(o, %d, %s, read%s)\n", i, into, goName(f.of[0]))
		case f.kind == byVoltage:
			fmt.Fprintf(b, "\tbyVoltage(o, %d, %s)\n", i, into)
		case f.kind == pairs:
			fmt.Fprintf(b, "\tpairsOf(o, %d, %s)\n", i, into)
		case f.list:
			fmt.Fprintf(b, "\tlist(o, %d, %s, %s)\n", i, into, call)
		default:
			fmt.Fprintf(b, "\tone(o, %d, %s, %s)\n", i, into, call)
		}
	}
	b.WriteString("}\n\n")
}
