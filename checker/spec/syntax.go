package spec

import (
	"errors"
	"regexp"
	"strconv"
	"strings"

	"boardproof/checker/place"
)

var (
	lineInMessage   = regexp.MustCompile(`^(?:yaml: )?(?:line ([0-9]+): )?(.*)$`)
	anchorInMessage = regexp.MustCompile(`unknown anchor '(.*)' referenced`)
)

// triesBack is how many lines above the reported one are looked at for the place of a fault.
const triesBack = 60

// syntaxProblem makes a problem of an error of the YAML library, which knows a line at best.
func syntaxProblem(s *sourceText, err error) place.Problem {
	second := &secondDocument{}
	if errors.As(err, &second) {
		return place.Problem{Place: s.wholeLine(second.line), Kind: place.SecondDocument, Got: "a second document in the file",
			Want: "one board", Hint: "give each board a file of its own, or delete the line ---"}
	}
	m := lineInMessage.FindStringSubmatch(strings.TrimSpace(err.Error()))
	message := ""
	line := 0
	if m != nil {
		message = m[2]
		line, _ = strconv.Atoi(m[1]) // an absent line is 0
	}
	if a := anchorInMessage.FindStringSubmatch(message); a != nil {
		return s.unknownAnchor(a[1])
	}
	line = s.faultyLine(line)
	p := place.Problem{Place: s.wholeLine(line), Kind: place.Unreadable, Got: place.Quote(strings.TrimSpace(s.line(line))), Want: "YAML"}
	p.Want, p.Hint = s.explain(line, message)
	return p
}

func (s *sourceText) unknownAnchor(name string) place.Problem {
	at := place.Place{File: s.name, Line: 1}
	for i, text := range s.lines {
		if before, _, ok := strings.Cut(text, "*"+name); ok {
			column := len([]rune(before)) + 1
			at = place.Place{File: s.name, Line: i + 1, Column: column, EndColumn: column + 1 + len([]rune(name))}
			break
		}
	}
	return place.Problem{Place: at, Kind: place.Alias, Got: "the alias " + place.Quote("*"+name) + ", which is defined nowhere above",
		Want: "a value", Hint: "write the value out, or put it between quotes if the * belongs to it"}
}

// faultyLine finds the line at which a file stops being YAML: the line behind the longest beginning
// that can be parsed. The library's own line may be that of the mapping the fault is in, and is one
// off for some messages.
func (s *sourceText) faultyLine(reported int) int {
	total := len(s.lines)
	bad := func(lines int) bool { // are the first lines no YAML?
		_, err := parse([]byte(strings.Join(s.lines[:lines], "\n")))
		second := &secondDocument{}
		return err != nil && !errors.As(err, &second) && lineInMessage.MatchString(err.Error()) && err.Error() != "EOF"
	}
	if reported == 0 {
		reported = 1
	}
	start := min(reported, total)
	for start < total && start < reported+triesBack && !bad(start) {
		start++
	}
	line := start
	for tries := 0; line > 1 && tries < triesBack; tries++ {
		if !bad(line - 1) {
			return line
		}
		line--
	}
	if line == 1 {
		return 1
	}
	return min(reported, total)
}

// explain turns the state of the faulty line into what to do about it.
func (s *sourceText) explain(line int, message string) (want, hint string) {
	text := strings.TrimSpace(s.line(line))
	_, value, hasKey := strings.Cut(text, ": ")
	value = strings.TrimSpace(value)
	switch {
	case strings.HasPrefix(s.line(line), "\t") || strings.Contains(message, "cannot start any token") && strings.Contains(s.line(line), "\t"):
		return "a line indented with blanks", "replace the tabs at the beginning of the line by blanks"
	case strings.Contains(message, "mapping values are not allowed"):
		return "one key and one value on a line", `put a text that contains ": " between quotes, and check the indent of the line above`
	case hasKey && value != "" && strings.ContainsAny(value[:1], "@`%"):
		return "a value", "put a text that begins with " + value[:1] + " between quotes"
	case strings.Count(text, "[") != strings.Count(text, "]"):
		return "a closing ] for each [", "close the list, or put the text between quotes"
	case strings.Count(text, "{") != strings.Count(text, "}"):
		return "a closing } for each {", "close the mapping, or put the text between quotes"
	case strings.Count(text, `"`)%2 == 1 || strings.Count(text, `'`)%2 == 1:
		return "a closing quote", "close the text with the quote it begins with"
	case !hasKey && !strings.HasSuffix(text, ":") && !strings.HasPrefix(text, "-"):
		return "a key, a colon, a blank and a value", "check the indent and the colon of this line and the one above"
	}
	return "a line that follows the indent of the lines above", "check indent, colons, quotes and brackets of this line and the one above"
}

// wholeLine is the place of the text of a line.
func (s *sourceText) wholeLine(number int) place.Place {
	text := s.line(number)
	trimmed := strings.TrimLeft(text, " \t")
	column := len([]rune(text)) - len([]rune(trimmed)) + 1
	return place.Place{File: s.name, Line: number, Column: column, EndColumn: column + max(1, len([]rune(strings.TrimRight(trimmed, " \t"))))}
}
