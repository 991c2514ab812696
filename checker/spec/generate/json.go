package generate

import (
	"bytes"
	"encoding/json"
	"strings"
)

// An object is a JSON object that keeps the order of its members.
type object []member

type member struct {
	key   string
	value any // string, bool, int, []any or object
}

// with returns the object with one more member.
func (o object) with(key string, value any) object { return append(o, member{key, value}) }

// print writes a value with two blanks of indent; short lists and objects stay on one line.
func print(b *bytes.Buffer, value any, indent string) {
	line := &bytes.Buffer{}
	flat(line, value)
	if line.Len()+len(indent) <= 110 {
		b.Write(line.Bytes())
		return
	}
	inner := indent + "  "
	switch v := value.(type) {
	case object:
		b.WriteString("{\n")
		for i, m := range v {
			b.WriteString(inner)
			flat(b, m.key)
			b.WriteString(": ")
			print(b, m.value, inner)
			b.WriteString(comma(i, len(v)))
		}
		b.WriteString(indent + "}")
	case []any:
		b.WriteString("[\n")
		for i, item := range v {
			b.WriteString(inner)
			print(b, item, inner)
			b.WriteString(comma(i, len(v)))
		}
		b.WriteString(indent + "]")
	default:
		b.Write(line.Bytes())
	}
}

func comma(i, n int) string {
	if i == n-1 {
		return "\n"
	}
	return ",\n"
}

func flat(b *bytes.Buffer, value any) {
	switch v := value.(type) {
	case object:
		b.WriteString("{")
		for i, m := range v {
			if i > 0 {
				b.WriteString(", ")
			}
			flat(b, m.key)
			b.WriteString(": ")
			flat(b, m.value)
		}
		b.WriteString("}")
	case []any:
		b.WriteString("[")
		for i, item := range v {
			if i > 0 {
				b.WriteString(", ")
			}
			flat(b, item)
		}
		b.WriteString("]")
	default:
		plain := &strings.Builder{}
		e := json.NewEncoder(plain)
		e.SetEscapeHTML(false)
		// Strings, booleans and whole numbers always encode.
		_ = e.Encode(v)
		b.WriteString(strings.TrimSuffix(plain.String(), "\n"))
	}
}
