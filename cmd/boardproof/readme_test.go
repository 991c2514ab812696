package main

import (
	"bytes"
	"context"
	"os"
	"regexp"
	"slices"
	"strings"
	"testing"
)

// readmeCommands are the two commands that the README promises, as they are typed.
var readmeCommands = []string{
	"go run ./cmd/boardproof review specs/brackwater/tenderer-d.yaml",
	"go test ./...",
}

func readme(t *testing.T) string {
	t.Helper()
	text, err := os.ReadFile("README.md")
	if err != nil {
		t.Fatal(err)
	}
	return string(text)
}

// indented lists the lines of the README that are set as code by four blanks.
func indented(text string) []string {
	var list []string
	for _, line := range strings.Split(text, "\n") {
		if command, ok := strings.CutPrefix(line, "    "); ok {
			list = append(list, command)
		}
	}
	return list
}

func TestReadmeCommands(t *testing.T) {
	atRoot(t)
	commands := indented(readme(t))
	for i, want := range readmeCommands {
		if !slices.Contains(commands, want) {
			t.Errorf("README.md does not show the command %q on a line of its own, indented by four blanks", want)
			continue
		}
		// .ci/run takes the first test command that stands there.
		if at := slices.Index(commands, want); at != i {
			t.Errorf("command %q is number %d of README.md, expected number %d", want, at+1, i+1)
		}
	}
	// Every command of the program that stands there is one that works.
	for _, line := range commands {
		arguments, ok := strings.CutPrefix(line, "go run ./cmd/boardproof ")
		if !ok {
			continue
		}
		var stdout, stderr bytes.Buffer
		if run(context.Background(), shellWords(t, arguments), &stdout, &stderr) == statusUnusable {
			t.Errorf("%s: %s", line, stderr.String())
		}
	}
}

// excerpt is the mark in the README, the file it names, and the fenced block that
// follows it if it is there.
var excerpt = regexp.MustCompile("(?m)^<!-- excerpt: (\\S+) -->\n(?:\n?```(?:text)?\n((?s:.*?))```\n)?")

// TestReadmeExcerpt: the review shown is the one that the program prints.
func TestReadmeExcerpt(t *testing.T) {
	atRoot(t)
	text := readme(t)
	m := excerpt.FindStringSubmatchIndex(text)
	if m == nil {
		t.Fatal("README.md has no line <!-- excerpt: FILE -->")
	}
	file := text[m[2]:m[3]]
	if file != departing {
		t.Errorf("the excerpt is of %s, the first command reviews %s", file, departing)
	}
	want := strings.Join(terminalReport(t, statusOpen, file)[:screenLines], "\n") + "\n"
	if *update {
		text = text[:m[0]] + "<!-- excerpt: " + file + " -->\n\n```text\n" + want + "```\n" + text[m[1]:]
		if err := os.WriteFile("README.md", []byte(text), 0o644); err != nil {
			t.Fatal(err)
		}
		return
	}
	if m[4] < 0 {
		t.Fatal("README.md shows no excerpt behind its mark (go test ./cmd/boardproof -update writes it)")
	}
	if difference := firstDifference(text[m[4]:m[5]], want); difference != "" {
		t.Errorf("README.md shows another review than %s gives: %s", file, difference)
	}
}

// TestReadmeCarriesCautions: what must never be missing from the first page.
func TestReadmeCarriesCautions(t *testing.T) {
	atRoot(t)
	text := strings.Join(strings.Fields(readme(t)), " ")
	for _, sentence := range []string{"supports a competent engineer and does not replace one", "can kill", "last line of defence", "full text of the standards"} {
		if !strings.Contains(text, sentence) {
			t.Errorf("README.md does not say %q", sentence)
		}
	}
}
