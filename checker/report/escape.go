package report

import (
	"regexp"
	"strings"

	"boardproof/checker/place"
)

// specials are the characters that mean something to markdown anywhere in a line.
var specials = strings.NewReplacer(
	`\`, `\\`, "`", "\\`", "*", `\*`, "_", `\_`, "[", `\[`, "]", `\]`,
	"<", `\<`, ">", `\>`, "|", `\|`, "#", `\#`, "~", `\~`, "&", `\&`, "!", `\!`, "$", `\$`,
)

var listMark = regexp.MustCompile(`^[.)]( |$)`)

// md makes text from a file harmless in markdown: one line, no control or
// bidirectional characters, nothing that formats, links or opens a block.
func md(text string) string {
	text = specials.Replace(visible(text))
	trimmed := strings.TrimLeft(text, " ")
	if trimmed == "" {
		return trimmed
	}
	switch first := trimmed[0]; {
	case first == '-' || first == '+' || first == '=':
		return `\` + trimmed
	case first >= '0' && first <= '9':
		// "1. " and "1) " at the start of a line open a list.
		digits := strings.TrimLeft(trimmed, "0123456789")
		if listMark.MatchString(digits) {
			return trimmed[:len(trimmed)-len(digits)] + `\` + digits
		}
	}
	return trimmed
}

// code sets text in a code span. A vertical bar would still split a table cell and a
// back-tick would end the span, so both are replaced by their look-alikes.
func code(text string) string {
	return "`" + strings.NewReplacer("`", "ˋ", "|", "¦").Replace(visible(text)) + "`"
}

// visible is text with everything invisible made visible and line breaks folded.
func visible(text string) string {
	text = strings.Join(strings.Fields(text), " ")
	return place.Visible(text)
}
