package main

import (
	"bytes"
	"context"
	"errors"
	"fmt"
	"io"
	"io/fs"
	"os"
	"slices"
	"strconv"
	"strings"
	"time"

	"github.com/google/renameio/v2"
	"github.com/spf13/cobra"
	"golang.org/x/term"

	"boardproof/checker/report"
	"boardproof/checker/review"
)

// The formats of a review. Automatic is terminal on a terminal, else markdown.
const (
	formatAutomatic = "automatic"
	formatMarkdown  = "markdown"
	formatTerminal  = "terminal"
	formatJSON      = "json"
)

var reviewFormats = []string{formatAutomatic, formatMarkdown, formatTerminal, formatJSON}

type reviewOptions struct {
	on, format, output, root, color string
	stopAt                          string
}

func newReview() *cobra.Command {
	var opt reviewOptions
	cmd := &cobra.Command{
		Use:   "review [FILE or FOLDER ...]",
		Short: "Review board files and write what was found",
		Long: `Review judges each board file and writes the review: what departs, with what was
found, required and would cure it; what has to be asked; what complies and on
what basis. Without an argument it reviews every board file below this folder.
A board file is a YAML file with a key "board".`,
		Example: `  boardproof review tender.yaml
  boardproof review --format json --output review.json specs/brackwater`,
		RunE: func(cmd *cobra.Command, args []string) error {
			return runReview(cmd.Context(), cmd.OutOrStdout(), cmd.ErrOrStderr(), args, opt)
		},
	}
	flags := cmd.Flags()
	flags.StringVar(&opt.on, "on", "", "date the review speaks for, YYYY-MM-DD (default: SOURCE_DATE_EPOCH, else today)")
	flags.StringVar(&opt.format, "format", formatAutomatic, "format: "+strings.Join(reviewFormats, ", "))
	flags.StringVarP(&opt.output, "output", "o", "", "write to this file, wholly or not at all (default: standard output)")
	flags.StringVar(&opt.root, "root", "", "folder that basis files must lie in (default: the repository, else the file's folder)")
	flags.StringVar(&opt.color, "color", "auto", "colour on a terminal: auto, always, never")
	flags.StringVar(&opt.stopAt, "stop-at", string(review.AnyQuery), "lowest weight that makes the exit status 1: "+boundNames())
	complete(cmd, "format", reviewFormats)
	complete(cmd, "color", colourChoices)
	complete(cmd, "stop-at", strings.Split(boundNames(), ", "))
	return cmd
}

var colourChoices = []string{"auto", "always", "never"}

func boundNames() string {
	names := make([]string, 0, 4)
	for _, b := range review.Bounds() {
		names = append(names, string(b))
	}
	return strings.Join(names, ", ")
}

func runReview(ctx context.Context, stdout, stderr io.Writer, args []string, opt reviewOptions) error {
	if err := oneOf("--format", opt.format, reviewFormats); err != nil {
		return err
	}
	if err := oneOf("--stop-at", opt.stopAt, strings.Split(boundNames(), ", ")); err != nil {
		return err
	}
	if err := oneOf("--color", opt.color, colourChoices); err != nil {
		return err
	}
	on, err := reviewDate(opt.on)
	if err != nil {
		return err
	}
	pack := startLoading()
	boards, err := readBoards(args, opt.root)
	if err != nil {
		return err
	}
	library, err := pack.wait()
	if err != nil {
		return err
	}
	reviews, err := review.Make(ctx, library, boards, review.Options{On: on, Cures: true})
	if err != nil {
		return err
	}
	var out bytes.Buffer
	if err := write(&out, stdout, reviews, opt); err != nil {
		return err
	}
	if err := deliver(out.Bytes(), stdout, opt.output); err != nil {
		return err
	}
	return conclude(reviews, review.Bound(opt.stopAt))
}

// write sets the reviews in the format asked for.
func write(w io.Writer, stdout io.Writer, reviews []*review.Review, opt reviewOptions) error {
	width, isTerminal := terminal(stdout)
	isTerminal = isTerminal && opt.output == ""
	format := opt.format
	if format == formatAutomatic {
		format = formatMarkdown
		if isTerminal {
			format = formatTerminal
		}
	}
	if format == formatJSON {
		return report.JSON(w, reviews)
	}
	for i, r := range reviews {
		if i > 0 {
			fmt.Fprint(w, "\n---\n\n")
		}
		var err error
		if format == formatTerminal {
			err = report.Terminal(w, r, width, colour(opt.color, isTerminal))
		} else {
			err = report.Markdown(w, r)
		}
		if err != nil {
			return err
		}
	}
	return nil
}

// deliver writes to standard output, or replaces a file as a whole.
func deliver(content []byte, stdout io.Writer, output string) error {
	if output == "" || output == "-" {
		_, err := stdout.Write(content)
		return err
	}
	if err := renameio.WriteFile(output, content, 0o644); err != nil {
		var path *fs.PathError
		if errors.As(err, &path) {
			err = path.Err // the name in it is that of a temporary file
		}
		return fmt.Errorf("the output was not written to %s: %w", output, err)
	}
	return nil
}

// conclude decides the exit status: a rule that could not be used first.
func conclude(reviews []*review.Review, bound review.Bound) error {
	open, unjudged := 0, 0
	for _, r := range reviews {
		open += r.Open(bound)
		unjudged += len(r.Unjudged)
	}
	switch {
	case unjudged > 0:
		return fmt.Errorf("a rule could not be used for %d of the requirements; see the review", unjudged)
	case open > 0:
		return &openError{fmt.Sprintf("%d open: something departs or is not proven", open)}
	}
	return nil
}

func oneOf(flag, value string, allowed []string) error {
	if slices.Contains(allowed, value) {
		return nil
	}
	return fmt.Errorf("%s: found %q, expected one of %s", flag, value, strings.Join(allowed, ", "))
}

// reviewDate is the date argument, else SOURCE_DATE_EPOCH, else today in UTC.
func reviewDate(text string) (time.Time, error) {
	if text != "" {
		on, err := time.Parse(time.DateOnly, text)
		if err != nil {
			return on, fmt.Errorf("--on: found %q, expected a date such as 2026-12-01", text)
		}
		return on, nil
	}
	if epoch := os.Getenv("SOURCE_DATE_EPOCH"); epoch != "" {
		seconds, err := strconv.ParseInt(epoch, 10, 64)
		if err != nil {
			return time.Time{}, fmt.Errorf("SOURCE_DATE_EPOCH: found %q, expected seconds since 1970", epoch)
		}
		return time.Unix(seconds, 0).UTC(), nil
	}
	return time.Now().UTC(), nil
}

// terminal reports the width of standard output and whether it is a terminal.
func terminal(stdout io.Writer) (width int, is bool) {
	file, ok := stdout.(*os.File)
	if !ok || !term.IsTerminal(int(file.Fd())) {
		return 80, false
	}
	width, _, err := term.GetSize(int(file.Fd()))
	if err != nil || width < 40 {
		return 80, true
	}
	return min(width, 120), true
}

// colour follows, strongest first: --color, NO_COLOR, CLICOLOR_FORCE, CLICOLOR,
// TERM=dumb, and whether the output is a terminal.
func colour(flag string, isTerminal bool) bool {
	force := os.Getenv("CLICOLOR_FORCE")
	switch {
	case flag != "auto":
		return flag == "always"
	case os.Getenv("NO_COLOR") != "":
		return false
	case force != "" && force != "0":
		return true
	case os.Getenv("CLICOLOR") == "0", os.Getenv("TERM") == "dumb":
		return false
	}
	return isTerminal
}
