// Command soffit writes the design note of a prestressed concrete member from its member file.
//
// It ends with 0 if every check passes, with 1 if a check fails (the note is written and says so), and with 2 if
// there is no note.
package main

import (
	"io"
	"os"

	"github.com/alecthomas/kong"
)

// Exit codes.
const (
	passes = 0
	fails  = 1
	noNote = 2
)

type commands struct {
	Note    noteCommand    `cmd:"" help:"Write the design note of each member file, as PDF, and its record, as JSON."`
	Examine examineCommand `cmd:"" help:"Read each member file and say what is wrong with it; write nothing."`
}

// command is one subcommand; it returns the exit code.
type command interface {
	run(out, problems io.Writer) int
}

func main() { os.Exit(run(os.Args[1:], os.Stdout, os.Stderr)) }

func run(args []string, out, problems io.Writer) int {
	var c commands
	code := -1
	parser, err := kong.New(&c, kong.Name("soffit"), kong.Description(purpose), kong.Writers(out, problems),
		kong.Exit(func(n int) { code = n }), kong.UsageOnError())
	if err != nil {
		panic(err) // a fault of the declarations above, met by every test
	}
	ctx, err := parser.Parse(args)
	if code >= 0 { // help was asked for
		return passes
	}
	if err != nil {
		say(problems, "soffit: %v\n%s\n", err, seeHelp)
		return noNote
	}
	switch ctx.Command() {
	case "note <file>":
		return c.Note.run(out, problems)
	default:
		return c.Examine.run(out, problems)
	}
}
