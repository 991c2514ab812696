package generate

import (
	"bytes"
	"regexp"
	"strconv"
	"strings"

	"boardproof/checker/units"
)

// namePattern is what a name of an entry may look like: no blank at its ends, no point or bracket,
// because paths are written with them. The reader has the same rule.
const namePattern = `^[^\s.\[\]{}"\\](?:[^.\[\]{}"\\\r\n\t]{0,78}[^\s.\[\]{}"\\])?$`

// jsonSchema writes the JSON Schema (draft-07) of a board file for editors.
func (m *model) jsonSchema() []byte {
	definitions := object{}
	for _, t := range m.types {
		if t.name == rootType {
			continue
		}
		if m.usedByIs(t) {
			definitions = definitions.with(t.name, m.typeSchema(t, false))
		}
		if m.asEntry[t.name] {
			definitions = definitions.with(t.name+" entry", m.typeSchema(t, true))
		}
	}
	for _, d := range units.Dimensions() {
		definitions = definitions.with("quantity "+d.Name, quantitySchema(d))
	}
	for _, l := range m.lists {
		definitions = definitions.with("words "+l.name, wordsSchema(l))
	}
	root := m.typeNamed[rootType]
	schema := object{
		{"$schema", "http://json-schema.org/draft-07/schema#"},
		{"title", root.title},
		{"description", "A switchboard as data, vocabulary version " + m.format + ". Made from policies/board.yaml by go generate."},
		{"type", "object"},
		{"properties", m.properties(root, false)},
		{"additionalProperties", false},
		{"definitions", definitions},
	}
	b := &bytes.Buffer{}
	print(b, schema, "")
	b.WriteString("\n")
	return b.Bytes()
}

func (m *model) usedByIs(t *objectType) bool {
	for _, owner := range m.types {
		for _, f := range owner.fields {
			if f.kind == is && f.of[0] == t.name {
				return true
			}
		}
	}
	return false
}

// typeSchema is a mapping with the fields of the type or, where there is one, its short form.
func (m *model) typeSchema(t *objectType, entry bool) object {
	full := object{{"title", t.title}, {"type", "object"}, {"properties", m.properties(t, entry)}, {"additionalProperties", false}, {"minProperties", 1}}
	if t.short == "" {
		return full
	}
	for _, f := range t.fields {
		if f.key == t.short {
			return object{{"title", t.title}, {"oneOf", append([]any{full}, m.valueSchemas(f, true)...)}}
		}
	}
	return full
}

func (m *model) properties(t *objectType, entry bool) object {
	all := object{}
	for _, f := range t.fields {
		all = all.with(f.key, m.fieldSchema(f))
	}
	plain := []any{"string", "number", "boolean"}
	if entry {
		all = all.with("like", object{{"description", "Name of an entry of the same collection; what is not said here is taken from it."}, {"type", plain}})
	}
	if t.name == rootType && len(t.fields) > 0 && !hasKey(t, "basis") {
		all = all.with("basis", object{{"description", "File whose content is taken where this file says nothing; a path relative to this file."},
			{"type", "string"}, {"examples", []any{"../basis.yaml"}}})
	}
	return all.with("from", object{{"description", "Document (its name under documents) that the values here are taken from."}, {"type", plain}})
}

func hasKey(t *objectType, key string) bool {
	for _, f := range t.fields {
		if f.key == key {
			return true
		}
	}
	return false
}

// fieldSchema is the description of a field around what may stand behind its key.
func (m *model) fieldSchema(f *field) object {
	o := object{{"title", f.title}, {"description", m.describe(f)}}
	if e := m.exampleText(f); e != "" && !f.list && f.kind != byVoltage && f.kind != pairs {
		o = o.with("examples", []any{strings.Trim(e, `"`)})
	}
	ways := m.ways(f)
	if len(ways) == 1 {
		if whole, ok := ways[0].(object); ok && whole[0].key != "$ref" {
			return append(o, whole...)
		}
		return o.with("allOf", ways)
	}
	return o.with("oneOf", ways)
}

// describe is the hover text: note, unit, usual range, clause.
func (m *model) describe(f *field) string {
	parts := []string{}
	add := func(s string) {
		if s != "" {
			parts = append(parts, strings.TrimSuffix(s, ".")+".")
		}
	}
	add(f.note)
	if f.note == "" {
		add(f.title)
	}
	if f.symbol != "" {
		add("Symbol " + f.symbol)
	}
	for _, name := range f.of {
		if d, ok := units.DimensionNamed(name); ok && (f.kind == quantity || f.kind == byVoltage || f.kind == pairs) {
			add("Write " + d.Phrase() + " such as " + d.Example())
		}
	}
	if f.kind == nameOf {
		add("Write a name from " + strings.Join(f.of, " or "))
	}
	if f.usual != nil {
		add("Usual: " + f.usual.text)
	}
	if f.possible != nil {
		add("Possible: " + f.possible.text)
	}
	if f.none {
		add("Write none if there is none")
	}
	if f.clause != "" {
		add("Source: " + f.clause)
	}
	return strings.Join(parts, " ")
}

// ways are the schemas of all forms a field may take.
func (m *model) ways(f *field) []any {
	var all []any
	switch {
	case f.kind == is && f.list:
		all = append(all, object{{"type", "array"}, {"minItems", 1}, {"items", reference(f.of[0])}})
	case f.kind == is:
		all = append(all, reference(f.of[0]))
	case f.kind == named:
		all = append(all, object{{"type", "object"}, {"minProperties", 1}, {"propertyNames", object{{"not", object{{"enum", reservedNames()}}}}},
			{"patternProperties", object{{namePattern, reference(f.of[0] + " entry")}}}, {"additionalProperties", false}})
	case f.kind == byVoltage:
		voltage, _ := units.DimensionNamed("voltage")
		all = append(all, object{{"type", "object"}, {"minProperties", 1},
			{"patternProperties", object{{voltage.Pattern(), reference("quantity " + f.of[0])}}}, {"additionalProperties", false}})
	case f.kind == pairs:
		all = append(all, object{{"type", "array"}, {"minItems", 1}, {"items", object{{"type", "array"},
			{"items", []any{plainQuantity(f.of[0]), plainQuantity(f.of[1])}}, {"minItems", 2}, {"maxItems", 2}}}})
	case f.list:
		item := m.valueSchemas(f, false)
		if len(item) == 1 {
			all = append(all, object{{"type", "array"}, {"minItems", 1}, {"items", item[0]}})
		} else {
			all = append(all, object{{"type", "array"}, {"minItems", 1}, {"items", object{{"oneOf", item}}}})
		}
	default:
		all = append(all, m.valueSchemas(f, false)...)
	}
	if f.none {
		all = append(all, object{{"const", "none"}})
	}
	return all
}

func reservedNames() []any { return []any{"from", "like", "basis", "none"} }

func reference(definition string) object {
	return object{{"$ref", "#/definitions/" + strings.ReplaceAll(definition, " ", "%20")}}
}

func plainQuantity(name string) any {
	d, _ := units.DimensionNamed(name)
	return object{{"type", scalarTypes(d)}, {"pattern", d.Pattern()}}
}

func scalarTypes(d *units.Dimension) any {
	if d.Base == "" {
		return []any{"string", "number"}
	}
	return "string"
}

// quantitySchema is a value with its unit, or a mapping that says more about the value.
func quantitySchema(d *units.Dimension) object {
	value := object{{"type", scalarTypes(d)}, {"pattern", d.Pattern()}}
	return object{{"oneOf", []any{value, object{{"type", "object"}, {"properties", object{
		{"value", value},
		{"from", object{{"description", "Document (its name under documents) that the value is taken from."}, {"type", []any{"string", "number", "boolean"}}}},
		{"confirmed", object{{"description", "yes: the value was looked at and is right although it is unusual."}, {"enum", yesAndNo()}}},
	}}, {"required", []any{"value"}}, {"additionalProperties", false}}}}}
}

func yesAndNo() []any {
	all := []any{true, false}
	for _, w := range []string{"yes", "no", "true", "false"} {
		all = append(all, w, strings.ToUpper(w[:1])+w[1:], strings.ToUpper(w))
	}
	return all
}

var numberLike = regexp.MustCompile(`^(0|[1-9][0-9]*)$`)

func wordsSchema(l *wordList) object {
	all := []any{}
	lines := []string{}
	for _, w := range l.words {
		all = append(all, w.text)
		if numberLike.MatchString(w.text) {
			n, _ := strconv.Atoi(w.text)
			all = append(all, n)
		}
		lines = append(lines, w.text+": "+w.description)
	}
	return object{{"title", l.title}, {"description", strings.Join(lines, "\n")}, {"enum", all}}
}

// valueSchemas are the forms of one value; a short form leaves out the mapping form of a quantity,
// because the mapping is the long form of the object.
func (m *model) valueSchemas(f *field, short bool) []any {
	switch f.kind {
	case quantity:
		if short {
			return []any{plainQuantity(f.of[0])}
		}
		return []any{reference("quantity " + f.of[0])}
	case words:
		return []any{reference("words " + f.of[0])}
	case text:
		return []any{object{{"type", []any{"string", "number", "boolean"}}, {"minLength", 1}, {"pattern", `^[^\r\n]*\n?$`}}}
	case date:
		pattern := `^[0-9]{4}-(0[1-9]|1[0-2])-(0[1-9]|[12][0-9]|3[01])$`
		if f.of[0] == "month" {
			pattern = `^[0-9]{4}-(0[1-9]|1[0-2])(-(0[1-9]|[12][0-9]|3[01]))?$`
		}
		return []any{object{{"type", "string"}, {"pattern", pattern}}}
	case count:
		return []any{object{{"type", "integer"}, {"minimum", f.least}, {"maximum", f.most}}}
	case yesNo:
		return []any{object{{"enum", yesAndNo()}}}
	case nameOf:
		return []any{object{{"type", []any{"string", "number", "boolean"}}}}
	case ipCode:
		return []any{object{{"type", "string"}, {"pattern", `^IP[0-6X][0-9X][A-D]?[HMSW]{0,4}$`}}}
	}
	return nil
}
