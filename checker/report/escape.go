package report

import (
	"regexp"
	"strings"

	"boardproof/checker/place"
)

// specials are the characters that mean something to markdown anywhere in a line.
var specials = strings.NewReplacer(
	`\`, `\\`, "`", "\\`", "*", `\*`, "_", `\_`, "[", `\[`, "]", `\]`,
	"|", `\|`, "#", `\#`, "!", `\!`,
	// The terminal renderer shows the backslash before these, and reads a reference once.
	"<", "&lt;", ">", "&gt;", "~", "&#126;", "&", "&amp;", "$", "&#36;",
	// What looks like an address would become a link.
	"://", "&#58;//", "www.", "www&#46;", "@", "&#64;", "mailto:", "mailto&#58;",
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
	case first == '-' || first == '+':
		return `\` + trimmed
	case first == '=':
		return "&#61;" + trimmed[1:]
	case first >= '0' && first <= '9':
		// "1. " and "1) " at the start of a line open a list.
		digits := strings.TrimLeft(trimmed, "0123456789")
		if listMark.MatchString(digits) {
			return trimmed[:len(trimmed)-len(digits)] + `\` + digits
		}
	}
	return trimmed
}

// code sets text in a code span. A vertical bar would still split a table cell, a
// back-tick would end the span, and the terminal renderer reads character references
// there, so these are replaced by look-alikes.
func code(text string) string {
	text = strings.NewReplacer("`", "ˋ", "|", "¦").Replace(visible(text))
	return "`" + characterReference.ReplaceAllString(text, "＆$1") + "`"
}

var characterReference = regexp.MustCompile(`&(#?[0-9A-Za-z]+;)`)

// shell quotes an argument for a command line that a person may copy.
func shell(text string) string {
	if plainArgument.MatchString(text) {
		return text
	}
	return "'" + strings.ReplaceAll(text, "'", `'\''`) + "'"
}

var plainArgument = regexp.MustCompile(`^[A-Za-z0-9_./][A-Za-z0-9_./-]*$`)

// visible is text with everything invisible made visible and line breaks folded.
func visible(text string) string {
	text = strings.Join(strings.Fields(text), " ")
	// Two colons at the start of a line are a command to some build servers, and a line
	// may be folded anywhere.
	text = strings.NewReplacer("::", ": :", "##[", "# #[").Replace(text)
	return place.Visible(text)
}
