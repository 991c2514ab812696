// Boardproof reviews the safety design of low-voltage switchboards written as YAML
// files. See README.md.
package main

import (
	"context"
	"errors"
	"fmt"
	"io"
	"os"
	"os/signal"
	"runtime/debug"
	"strings"

	"github.com/spf13/cobra"
	"github.com/spf13/pflag"

	"boardproof/checker/place"
)

// The exit statuses.
const (
	statusNothingOpen = 0 // every requirement complies or is exempt
	statusOpen        = 1 // something departs or is not proven
	statusUnusable    = 2 // input, command or a rule was unusable
)

func main() {
	ctx, stop := signal.NotifyContext(context.Background(), os.Interrupt)
	defer stop()
	os.Exit(run(ctx, os.Args[1:], os.Stdout, os.Stderr))
}

// run is the whole program with its streams as arguments; it returns the exit status.
func run(ctx context.Context, args []string, stdout, stderr io.Writer) (status int) {
	defer func() {
		if fault := recover(); fault != nil {
			fmt.Fprintf(stderr, "boardproof: internal fault: %v\nThis is a defect of the program, not of the board. No review was made.\n%s", fault, debug.Stack())
			status = statusUnusable
		}
	}()
	// The rule library lives as long as the process; a larger heap while it is compiled
	// saves about a quarter of the start-up time and costs some 20 MB.
	debug.SetGCPercent(400)
	root := newRoot(stdout, stderr)
	root.SetArgs(args)
	err := root.ExecuteContext(ctx)
	var open *openError
	switch {
	case err == nil:
		return statusNothingOpen
	case errors.As(err, &open):
		fmt.Fprintf(stderr, "boardproof: %v\n", open)
		return statusOpen
	}
	var problems *problemsError
	if errors.As(err, &problems) {
		problems.list.Print(stderr, problems.sources)
	}
	fmt.Fprintf(stderr, "boardproof: %v\n", err)
	return statusUnusable
}

// openError says how much stands against the boards.
type openError struct{ text string }

func (e *openError) Error() string { return e.text }

// problemsError carries what is wrong with files, to be printed with their lines.
type problemsError struct {
	list    *place.Problems
	sources place.Sources
	outcome string // what was not done because of it
}

func (e *problemsError) Error() string {
	n := e.list.Len()
	if n == 1 {
		return "1 problem; " + e.outcome
	}
	return fmt.Sprintf("%d problems; %s", n, e.outcome)
}

func newRoot(stdout, stderr io.Writer) *cobra.Command {
	root := &cobra.Command{
		Use:   "boardproof",
		Short: "Safety design review of low-voltage switchboards",
		Long: `Boardproof reads a switchboard from a YAML file, computes what a short circuit
would do, judges the board against a library of rules in three lines of
defence, and writes a review that can be signed and queries that can be sent.

It supports a competent engineer and does not replace one. Local codes, the
full text of the standards and licensed practice decide.

Exit status: 0 every requirement complies or does not apply; 1 something departs
or is not proven; 2 input, command or a rule was unusable.`,
		Version:       version(),
		SilenceUsage:  true,
		SilenceErrors: true,
		RunE:          func(cmd *cobra.Command, _ []string) error { return cmd.Help() },
	}
	root.SetOut(stdout)
	root.SetErr(stderr)
	root.SetVersionTemplate("boardproof {{.Version}}\n")
	root.AddCommand(newReview(), newWorksheet(), newRules())
	root.InitDefaultCompletionCmd()
	if completion, _, err := root.Find([]string{"completion"}); err == nil {
		completion.Example = "  boardproof completion bash"
		completion.Args = cobra.ArbitraryArgs
		completion.RunE = func(cmd *cobra.Command, args []string) error {
			if len(args) > 0 {
				return fmt.Errorf("found no completion for %s; see boardproof completion --help", place.Quote(args[0]))
			}
			return cmd.Help()
		}
	}
	root.SetFlagErrorFunc(func(cmd *cobra.Command, err error) error {
		text := err.Error()
		var flags []string
		cmd.Flags().VisitAll(func(f *pflag.Flag) { flags = append(flags, "--"+f.Name) })
		if _, name, ok := strings.Cut(text, "unknown flag: "); ok {
			if near, ok := place.Nearest(name, flags); ok {
				text += "; write " + near
			}
		}
		return errors.New(text + "; see " + cmd.CommandPath() + " --help")
	})
	root.SetHelpCommand(&cobra.Command{
		Use:   "help [COMMAND]",
		Short: "Explain a command",
		RunE: func(cmd *cobra.Command, args []string) error {
			found, rest, err := root.Find(args)
			if err != nil || len(rest) > 0 {
				return fmt.Errorf("found no command %s", place.Quote(strings.Join(args, " ")))
			}
			found.InitDefaultHelpFlag()
			found.InitDefaultVersionFlag()
			return found.Help()
		},
	})
	return root
}

// takes checks the number of arguments and says what a command takes.
func takes(least, most int, what string) cobra.PositionalArgs {
	return func(cmd *cobra.Command, args []string) error {
		if len(args) < least || len(args) > most {
			return fmt.Errorf("%s takes %s; found %d arguments", cmd.CommandPath(), what, len(args))
		}
		return nil
	}
}

// complete offers the words of a flag. The flag exists: it was added just before.
func complete(cmd *cobra.Command, flag string, words []string) {
	if err := cmd.RegisterFlagCompletionFunc(flag, cobra.FixedCompletions(words, cobra.ShellCompDirectiveNoFileComp)); err != nil {
		panic(err)
	}
}

// version is the module version and, where the build recorded it, the commit.
func version() string {
	info, ok := debug.ReadBuildInfo()
	if !ok {
		return "of unknown origin"
	}
	text := info.Main.Version
	if text == "" || text == "(devel)" {
		text = "development"
	}
	for _, s := range info.Settings {
		if s.Key == "vcs.revision" && len(s.Value) >= 12 {
			text += " " + s.Value[:12]
		}
	}
	return text
}
