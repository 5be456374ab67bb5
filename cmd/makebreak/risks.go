package main

import (
	"fmt"
	"io"

	"github.com/spf13/cobra"
)

func newRisks(out, errw io.Writer) *cobra.Command {
	var o options
	cmd := &cobra.Command{
		Use:   "risks SHEET",
		Short: "The risk table and the function table",
		Args:  cobra.ExactArgs(1),
		RunE: func(cmd *cobra.Command, args []string) error {
			w, err := o.assess(args[0], errw)
			if err != nil {
				return err
			}
			if err := w.printRisks(out, o.as); err != nil {
				return exit{exitOutside, err}
			}
			fmt.Fprintf(errw, "\n%s\n", w.verdict(""))
			return w.stopped()
		},
	}
	o.bind(cmd)
	return cmd
}
