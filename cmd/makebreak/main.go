// Command makebreak plans the replacement of a mechanical temperature control
// by a microcontroller: survey sheet in, portable C and an honest table of
// risks out.
package main

import (
	"errors"
	"fmt"
	"io"
	"os"

	"github.com/spf13/cobra"
)

func main() { os.Exit(run(os.Args[1:], os.Stdout, os.Stderr)) }

// Exit codes, as people and scripts hold on to them.
const (
	exitDone     = 0
	exitOutside  = 1 // something outside the sheet failed: disk, no C compiler
	exitWrong    = 2 // the command line or the sheet is wrong; nothing was written
	exitStopOpen = 3 // a stop finding is open; the C is withheld
)

// exit is an error that knows its exit code. What there was to say about it may
// have been said already.
type exit struct {
	code int
	err  error // nil: said already
}

func (e exit) Error() string {
	if e.err == nil {
		return ""
	}
	return e.err.Error()
}

func (e exit) Unwrap() error { return e.err }

// run is the whole program but for the process around it.
func run(args []string, out, errw io.Writer) int {
	root := newRoot(out, errw)
	root.SetArgs(args)
	err := root.Execute()
	if err == nil {
		return exitDone
	}
	var e exit
	if !errors.As(err, &e) {
		e = exit{exitWrong, err} // cobra's own: the command line is wrong
	}
	if e.err != nil {
		fmt.Fprintln(errw, "makebreak:", visible(e.err.Error()))
	}
	return e.code
}

// newRoot builds the command tree.
//
// Manners: data goes to standard output, everything else to standard error; a
// message says what would help; nothing is written unless all of it can be.
func newRoot(out, errw io.Writer) *cobra.Command {
	root := &cobra.Command{
		Use:   "makebreak",
		Short: "Plan the replacement of a mechanical temperature control by a microcontroller",
		Long: `makebreak takes a survey sheet of an old mechanical temperature control,
translates it into an equivalent control program, and shows function by
function which protection would be lost and which hardware has to stay.

It helps to plan. Local codes, the equipment's listing or approval and a
licensed person decide.`,
		SilenceUsage:  true,
		SilenceErrors: true,
		Args:          cobra.NoArgs,
		RunE:          func(cmd *cobra.Command, _ []string) error { return cmd.Help() },
	}
	root.CompletionOptions.HiddenDefaultCmd = true
	root.SetOut(out)
	root.SetErr(errw)
	root.AddCommand(
		newRetrofit(out, errw),
		newSurvey(out, errw),
		newTranslate(out, errw),
		newCodegen(out, errw),
		newRisks(out, errw),
		newCycle(out, errw),
	)
	return root
}
