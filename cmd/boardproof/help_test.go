package main

import (
	"bytes"
	"context"
	"os"
	"path/filepath"
	"regexp"
	"strings"
	"testing"

	"github.com/spf13/cobra"
	"github.com/spf13/pflag"
)

// everyCommand lists the commands and theirs, as the words that call them.
func everyCommand(cmd *cobra.Command, words []string) [][]string {
	list := [][]string{words}
	for _, sub := range cmd.Commands() {
		if sub.Name() != "help" {
			list = append(list, everyCommand(sub, append(words[:len(words):len(words)], sub.Name()))...)
		}
	}
	return list
}

func everyOwnCommand() [][]string {
	root := newRoot(&bytes.Buffer{}, &bytes.Buffer{})
	root.InitDefaultCompletionCmd()
	return everyCommand(root, nil)
}

// TestHelpIsTrue: the help of every command names its flags and nothing that the
// library behind it would say better of another program.
func TestHelpIsTrue(t *testing.T) {
	wrong := regexp.MustCompile(`(?m)arg\(s\)|\bSubcommand|<no value>|%!|TODO|\bcobra\b`)
	for _, words := range everyOwnCommand() {
		name := strings.Join(append([]string{"boardproof"}, words...), " ")
		t.Run(name, func(t *testing.T) {
			text := output(t, statusNothingOpen, append(words[:len(words):len(words)], "--help")...)
			if found := wrong.FindString(text); found != "" {
				t.Errorf("the help says %q", found)
			}
			if !strings.Contains(text, "Usage:") || !strings.Contains(text, name) {
				t.Errorf("the help does not say how %s is used", name)
			}
			if same := output(t, statusNothingOpen, append([]string{"help"}, words...)...); same != text {
				t.Errorf("boardproof help %s says something else: %s", strings.Join(words, " "), firstDifference(same, text))
			}
			for i, line := range strings.Split(text, "\n") {
				if strings.HasSuffix(line, " ") {
					t.Errorf("line %d ends in a blank", i+1)
				}
			}
		})
	}
}

// TestHelpNamesEveryFlag: a flag has a sentence, and the words it takes are the words
// it accepts.
func TestHelpNamesEveryFlag(t *testing.T) {
	root := newRoot(&bytes.Buffer{}, &bytes.Buffer{})
	for _, cmd := range root.Commands() {
		cmd.LocalFlags().VisitAll(func(f *pflag.Flag) {
			if len(f.Usage) < 10 {
				t.Errorf("%s --%s: the help is %q", cmd.Name(), f.Name, f.Usage)
			}
		})
	}
	dir := t.TempDir()
	board := filepath.Join(dir, "tender.yaml")
	if err := os.WriteFile(board, []byte("board: X\n"), 0o644); err != nil {
		t.Fatal(err)
	}
	words := regexp.MustCompile(`: (\w+(?:, \w+)+)`)
	for _, name := range []string{"review", "worksheet"} {
		cmd, _, err := root.Find([]string{name})
		if err != nil {
			t.Fatal(err)
		}
		cmd.LocalFlags().VisitAll(func(f *pflag.Flag) {
			m := words.FindStringSubmatch(f.Usage)
			if m == nil || f.Name == "on" {
				return
			}
			for _, word := range strings.Split(m[1], ", ") {
				var stdout, stderr bytes.Buffer
				if run(context.Background(), []string{name, "--" + f.Name, word, board}, &stdout, &stderr) == statusUnusable {
					t.Errorf("%s --%s %s: %s", name, f.Name, word, stderr.String())
				}
			}
		})
	}
}

// TestExamplesOfTheHelpWork runs each example in a folder that has the files it names.
func TestExamplesOfTheHelpWork(t *testing.T) {
	demonstration, err := filepath.Abs("../../specs/brackwater")
	if err != nil {
		t.Fatal(err)
	}
	dir := t.TempDir()
	if err := os.CopyFS(filepath.Join(dir, "specs", "brackwater"), os.DirFS(demonstration)); err != nil {
		t.Fatal(err)
	}
	for from, to := range map[string]string{"tenderer-d.yaml": "tender.yaml", "basis.yaml": "basis.yaml"} {
		text, err := os.ReadFile(filepath.Join(demonstration, from))
		if err != nil {
			t.Fatal(err)
		}
		if err := os.WriteFile(filepath.Join(dir, to), text, 0o644); err != nil {
			t.Fatal(err)
		}
	}
	t.Chdir(dir)
	examples := 0
	for _, cmd := range newRoot(&bytes.Buffer{}, &bytes.Buffer{}).Commands() {
		for _, line := range strings.Split(cmd.Example, "\n") {
			words := shellWords(t, strings.TrimSpace(line))
			if len(words) == 0 || words[0] != "boardproof" {
				t.Errorf("%s: the example %q does not begin with boardproof", cmd.Name(), line)
				continue
			}
			examples++
			var stdout, stderr bytes.Buffer
			if run(context.Background(), words[1:], &stdout, &stderr) == statusUnusable {
				t.Errorf("%s: %s", line, stderr.String())
			}
		}
	}
	if examples < 5 {
		t.Errorf("%d examples were tried, expected at least 5", examples)
	}
}

// shellWords splits a command as a shell does where only single quotes are used.
func shellWords(t *testing.T, line string) []string {
	t.Helper()
	var words []string
	for i, part := range strings.Split(line, "'") {
		if i%2 == 1 {
			words = append(words, part)
			continue
		}
		words = append(words, strings.Fields(part)...)
	}
	return words
}
