package main

import (
	"fmt"
	"io"

	"github.com/spf13/cobra"
)

func newCodegen(out, errw io.Writer) *cobra.Command {
	var dir string
	var proof bool
	var o options
	cmd := &cobra.Command{
		Use:   "codegen SHEET -o DIR",
		Short: "Only the C",
		Args:  cobra.ExactArgs(1),
		RunE: func(cmd *cobra.Command, args []string) error {
			w, err := o.assess(args[0], errw)
			if err != nil {
				return err
			}
			if err := w.stopped(); err != nil {
				fmt.Fprintln(errw, w.verdict(""))
				return err
			}
			if err := w.writeC(dir, proof); err != nil {
				return err
			}
			fmt.Fprintln(errw, "The C is in", visible(dir)+"; it is a skeleton to start from. The risks are part of the job: makebreak retrofit.")
			return nil
		},
	}
	o.bindRules(cmd)
	cmd.Flags().StringVarP(&dir, "output", "o", "", "folder for the C (needed)")
	cmd.Flags().BoolVar(&proof, "proof", false, "with a harness for a model checker and a value analysis")
	_ = cmd.MarkFlagRequired("output")
	return cmd
}
