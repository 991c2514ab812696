package main

import (
	"bytes"
	"fmt"
	"strings"

	"github.com/spf13/cobra"

	"boardproof/checker/place"
	"boardproof/checker/report"
)

func newRules() *cobra.Command {
	cmd := &cobra.Command{
		Use:   "rules [RULE]",
		Short: "List the rules of the library, or explain one",
		Example: `  boardproof rules
  boardproof rules WTH-01`,
		Args: takes(0, 1, "one RULE or none"),
		ValidArgsFunction: func(*cobra.Command, []string, string) ([]string, cobra.ShellCompDirective) {
			pack, err := loadLibrary()
			if err != nil {
				return nil, cobra.ShellCompDirectiveError
			}
			var ids []string
			for _, r := range pack.Rules() {
				ids = append(ids, r.ID+"\t"+r.Title)
			}
			return ids, cobra.ShellCompDirectiveNoFileComp
		},
		RunE: func(cmd *cobra.Command, args []string) error {
			pack, err := loadLibrary()
			if err != nil {
				return err
			}
			var out bytes.Buffer
			if len(args) == 0 {
				if err := report.Rules(&out, pack); err != nil {
					return err
				}
				return deliver(out.Bytes(), cmd.OutOrStdout(), "")
			}
			rule, ok := pack.Rule(strings.ToUpper(args[0]))
			if !ok {
				var ids []string
				for _, r := range pack.Rules() {
					ids = append(ids, r.ID)
				}
				return fmt.Errorf("found rule %s%s", place.Quote(args[0]), known(args[0], ids))
			}
			if err := report.Rule(&out, rule); err != nil {
				return err
			}
			return deliver(out.Bytes(), cmd.OutOrStdout(), "")
		},
	}
	return cmd
}
