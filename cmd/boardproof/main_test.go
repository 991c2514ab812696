package main

import (
	"bytes"
	"context"
	"errors"
	"flag"
	"fmt"
	"os"
	"os/exec"
	"path/filepath"
	"strconv"
	"strings"
	"testing"

	"github.com/rogpeppe/go-internal/testscript"
)

// update rewrites expected outputs: go test ./cmd/boardproof -update. Read the
// difference as you would code.
var update = flag.Bool("update", false, "rewrite expected outputs and the excerpt in README.md")

// onDate is the date that every expected output speaks for.
const onDate = "2026-12-01"

func TestMain(m *testing.M) {
	testscript.Main(m, map[string]func(){"boardproof": main})
}

// TestScript plays the stories of testdata/script: one file, one story. The folder
// brackwater of each is a copy of the demonstration.
func TestScript(t *testing.T) {
	demonstration, err := filepath.Abs("../../specs/brackwater")
	if err != nil {
		t.Fatal(err)
	}
	testscript.Run(t, testscript.Params{
		Dir:           "testdata/script",
		UpdateScripts: *update,
		Setup: func(env *testscript.Env) error {
			return os.CopyFS(filepath.Join(env.WorkDir, "brackwater"), os.DirFS(demonstration))
		},
		Cmds: map[string]func(*testscript.TestScript, bool, []string){
			"status": scriptStatus, "replace": scriptReplace,
		},
	})
}

// scriptStatus is "status N ARGUMENTS": boardproof ends with exit status N.
func scriptStatus(ts *testscript.TestScript, neg bool, args []string) {
	want, err := strconv.Atoi(strings.Join(args[:min(1, len(args))], ""))
	if neg || err != nil {
		ts.Fatalf("usage: status N [arguments of boardproof]")
	}
	got := 0
	var exit *exec.ExitError
	switch err := ts.Exec("boardproof", args[1:]...); {
	case errors.As(err, &exit):
		got = exit.ExitCode()
	case err != nil:
		ts.Fatalf("boardproof did not run: %v", err)
	}
	if got != want {
		ts.Fatalf("boardproof %s: exit status %d, expected %d", strings.Join(args[1:], " "), got, want)
	}
}

// scriptReplace is "replace FILE OLD NEW": OLD stands in FILE and becomes NEW.
func scriptReplace(ts *testscript.TestScript, neg bool, args []string) {
	if neg || len(args) != 3 {
		ts.Fatalf("usage: replace FILE OLD NEW")
	}
	text := ts.ReadFile(args[0])
	if !strings.Contains(text, args[1]) {
		ts.Fatalf("%s does not hold %q", args[0], args[1])
	}
	ts.Check(os.WriteFile(ts.MkAbs(args[0]), []byte(strings.ReplaceAll(text, args[1], args[2])), 0o644))
}

// atRoot runs the rest of a test in the top folder of the repository, where the
// README's commands are given.
func atRoot(t testing.TB) {
	t.Helper()
	t.Chdir(filepath.Join("..", ".."))
}

// output runs a command in this process; the status must be the one expected.
func output(t testing.TB, status int, args ...string) string {
	t.Helper()
	for _, name := range []string{"NO_COLOR", "CLICOLOR_FORCE", "CLICOLOR", "SOURCE_DATE_EPOCH"} {
		t.Setenv(name, "")
	}
	var stdout, stderr bytes.Buffer
	if got := run(context.Background(), args, &stdout, &stderr); got != status {
		t.Fatalf("boardproof %s: exit status %d, expected %d\n%s", strings.Join(args, " "), got, status, stderr.String())
	}
	return stdout.String()
}

// firstDifference names the first line in which two texts differ.
func firstDifference(got, want string) string {
	g, w := strings.Split(got, "\n"), strings.Split(want, "\n")
	for i := range max(len(g), len(w)) {
		a, b := "(end)", "(end)"
		if i < len(g) {
			a = g[i]
		}
		if i < len(w) {
			b = w[i]
		}
		if a != b {
			return fmt.Sprintf("line %d\n  got      %s\n  expected %s", i+1, a, b)
		}
	}
	return ""
}
