package spec

import (
	"strings"
	"unicode"
	"unicode/utf8"
)

// wanted says what belongs behind the key, for a sentence.
func (l *Leaf) wanted() string {
	what := map[Kind]string{
		KindWords: "a word", KindText: "one line of text", KindDay: "a date", KindMonth: "a month", KindCount: "a whole number",
		KindYesNo: "yes or no", KindProtection: "an IP code", KindVoltageTable: "a mapping of values by voltage",
		KindPairTable: "a list of pairs", KindObject: "a mapping", KindCollection: "a mapping of names",
	}[l.Kind]
	switch l.Kind {
	case KindQuantity:
		what = l.dimension.Phrase()
	case KindNames:
		what = "a name from " + strings.Join(l.Collections, " or ")
	}
	if l.List {
		what = "a list, each item " + what
	}
	if l.None {
		what += " or none"
	}
	return what
}

// writing proposes what to write, from the examples of the vocabulary.
func (l *Leaf) writing() string {
	return "write " + l.Key + ": " + l.sample()
}

// absent are words for none that the file does not know.
var absent = map[string]bool{
	"off": true, "no": true, "without": true, "not fitted": true, "not provided": true, "not present": true, "not installed": true,
	"not required": true, "absent": true, "nothing": true, "0": true, "false": true,
}

// noneHint proposes none where somebody has meant it.
func (s *slot) noneHint() (string, bool) {
	l := s.at.Leaf
	if s.stands != nil { // the value stands for the whole object
		l = s.stands
	}
	if l != nil && l.None && s.n.shape == scalar && absent[strings.ToLower(s.n.text)] {
		return "write " + l.Key + ": none if there is none", true
	}
	return "", false
}

// sample is an example of the value as it may stand behind the key on the same line.
func (l *Leaf) sample() string {
	if l.IsValue() {
		return l.Example
	}
	inner := outline().types[l.Of]
	text := "…"
	for _, f := range inner.fields {
		if f.Kind != KindObject && f.Kind != KindCollection && f.Example != "" {
			text = f.Key + ": " + f.Example
			break
		}
	}
	switch {
	case l.Kind == KindCollection:
		return "{<name>: {" + text + "}}"
	case l.List:
		return "[{" + text + "}]"
	}
	return "{" + text + "}"
}

// lowerFirst makes a title fit the inside of a sentence; abbreviations keep their capitals.
func lowerFirst(title string) string {
	first, size := utf8.DecodeRuneInString(title)
	second, _ := utf8.DecodeRuneInString(title[size:])
	if unicode.IsUpper(first) && unicode.IsLower(second) {
		return string(unicode.ToLower(first)) + title[size:]
	}
	return title
}
