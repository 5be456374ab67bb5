package main

import (
	"fmt"
	"io"

	"github.com/spf13/cobra"
)

func newRetrofit(out, errw io.Writer) *cobra.Command {
	var dir string
	var o options
	cmd := &cobra.Command{
		Use:   "retrofit SHEET -o DIR",
		Short: "The main job: sheet in, pack out, risk table on the screen",
		Args:  cobra.ExactArgs(1),
		RunE: func(cmd *cobra.Command, args []string) error {
			w, err := o.assess(args[0], errw)
			if err != nil {
				return err
			}
			if err := w.writePack(dir); err != nil {
				return err
			}
			if err := w.printFindings(out, o.as); err != nil {
				return exit{exitOutside, err}
			}
			fmt.Fprintf(errw, "\n%s\n", w.verdict(dir))
			return w.stopped()
		},
	}
	o.bind(cmd)
	cmd.Flags().StringVarP(&dir, "output", "o", "", "folder for the pack (needed)")
	_ = cmd.MarkFlagRequired("output")
	return cmd
}
