package main

import (
	"bytes"
	"fmt"
	"slices"
	"strings"

	"github.com/spf13/cobra"

	"boardproof/checker/facts"
	"boardproof/checker/place"
	"boardproof/checker/report"
)

// The formats of a worksheet.
const (
	formatText = "text"
)

func newWorksheet() *cobra.Command {
	var format, output, root string
	cmd := &cobra.Command{
		Use:   "worksheet FILE [SUBJECT [TERM]]",
		Short: "Show every number with its equation, inputs, places and sources",
		Long: `Worksheet prints every quantity of a board with symbol, equation, the numbers put
in, the places its inputs were read from, source and range of validity. With a
subject and a term it prints only the chain behind that one number, as a tree.`,
		Example: `  boardproof worksheet tender.yaml
  boardproof worksheet tender.yaml 'main A' fault.peak`,
		Args: takes(1, 3, "a board FILE and, if wanted, a SUBJECT and a TERM"),
		RunE: func(cmd *cobra.Command, args []string) error {
			if err := oneOf("--format", format, []string{formatText, formatJSON}); err != nil {
				return err
			}
			boards, err := readBoards(args[:1], root)
			if err != nil {
				return err
			}
			if len(boards) != 1 {
				return fmt.Errorf("a worksheet is of one board; %s holds %d", place.Quote(args[0]), len(boards))
			}
			var out bytes.Buffer
			board := facts.Of(boards[0])
			switch {
			case format == formatJSON:
				var chosen report.Chosen
				if chosen, err = choose(board, args[1:]); err == nil {
					err = report.WorksheetJSON(&out, board, chosen)
				}
			case len(args) == 1:
				err = report.Worksheet(&out, board)
			default:
				err = writeChains(&out, board, args[1:])
			}
			if err != nil {
				return err
			}
			return deliver(out.Bytes(), cmd.OutOrStdout(), output)
		},
	}
	cmd.Flags().StringVar(&format, "format", formatText, "format: text, json")
	complete(cmd, "format", []string{formatText, formatJSON})
	cmd.Flags().StringVarP(&output, "output", "o", "", "write to this file, wholly or not at all (default: standard output)")
	cmd.Flags().StringVar(&root, "root", "", "folder that basis files must lie in (default: the repository, else the file's folder)")
	return cmd
}

// writeChains prints the chain of one term, or of all terms of a subject. A term
// without its last part stands for its bounds: fault.peak for fault.peak.at_least
// and fault.peak.at_most.
func writeChains(out *bytes.Buffer, board *facts.Board, names []string) error {
	chosen, err := choose(board, names)
	if err != nil {
		return err
	}
	for i, id := range chosen.Terms {
		if i > 0 {
			out.WriteString("\n")
		}
		if err := report.Chain(out, chosen.Subject, chosen.Subject.Fact(id)); err != nil {
			return err
		}
	}
	return nil
}

// choose finds a subject and the terms that a name stands for; without names everything
// is chosen.
func choose(board *facts.Board, names []string) (report.Chosen, error) {
	if len(names) == 0 {
		return report.Chosen{}, nil
	}
	var subjects []string
	for _, s := range board.Subjects {
		subjects = append(subjects, s.ID)
	}
	i := slices.Index(subjects, names[0])
	if i < 0 {
		return report.Chosen{}, fmt.Errorf("found subject %s%s", place.Quote(names[0]), known(names[0], subjects))
	}
	chosen := report.Chosen{Subject: board.Subjects[i]}
	var terms []string
	for _, f := range chosen.Subject.Facts() {
		terms = append(terms, f.Term.ID)
		if len(names) == 1 || f.Term.ID == names[1] || strings.HasPrefix(f.Term.ID, names[1]+".") {
			chosen.Terms = append(chosen.Terms, f.Term.ID)
		}
	}
	if len(chosen.Terms) == 0 {
		return chosen, fmt.Errorf("found term %s%s", place.Quote(names[1]), known(names[1], terms))
	}
	return chosen, nil
}

// known says what is there instead of a name that is not.
func known(name string, names []string) string {
	text := ", expected one of " + strings.Join(names, ", ")
	if near, ok := place.Nearest(name, names); ok {
		text += "; write " + place.Quote(near)
	}
	return text
}
