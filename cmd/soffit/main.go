// Command soffit writes the design note of a prestressed concrete member from its member file; and the member file to
// start from, and the schemas of member file and record.
//
// It ends with 0 if it did what was asked and every check passes, with 1 if a check fails (a note is written all the same and
// says so), and with 2 if there is no note, draft or schema.
package main

import (
	"io"
	"os"
	"strings"

	"github.com/alecthomas/kong"

	"soffit/calc/design"
	"soffit/templates"
)

// Exit codes.
const (
	passes = 0
	fails  = 1
	noNote = 2
)

type commands struct {
	Version kong.VersionFlag `help:"Print the version."`

	Note    noteCommand    `cmd:"" help:"Write the design note of each member file, as PDF, and its record, as JSON."`
	Examine examineCommand `cmd:"" help:"Read each member file, say what is wrong with it and what its checks come to; write nothing."`
	Draft   draftCommand   `cmd:"" help:"Write a member file to start from, with a comment on each key."`
	Schema  schemaCommand  `cmd:"" help:"Print the JSON Schema of the member file or of the record; editors complete and check the file by it."`
}

// command is one subcommand; it returns the exit code.
type command interface {
	run(out, problems io.Writer) int
}

func main() {
	out := &checked{w: os.Stdout}
	code := run(os.Args[1:], out, os.Stderr)
	if out.err != nil {
		say(os.Stderr, "soffit: %v\n", out.err)
		code = noNote
	}
	os.Exit(code)
}

// checked remembers that something could not be said.
type checked struct {
	w   io.Writer
	err error
}

func (c *checked) Write(p []byte) (int, error) {
	n, err := c.w.Write(p)
	if err != nil {
		c.err = err
	}
	return n, err
}

func run(args []string, out, problems io.Writer) int {
	var c commands
	code := -1
	parser, err := kong.New(&c, kong.Name("soffit"), kong.Description(purpose), kong.Writers(out, problems),
		kong.Vars{"drafts": strings.Join(templates.Drafts(), ", "), "version": design.Program},
		kong.Exit(func(n int) { code = n }), kong.UsageOnError())
	if err != nil {
		panic(err) // a fault of the declarations above, met by every test
	}
	ctx, err := parser.Parse(args)
	if code >= 0 { // help or the version was asked for
		return passes
	}
	if err != nil {
		say(problems, "soffit: %v\n%s\n", err, seeHelp)
		return noNote
	}
	return ctx.Selected().Target.Addr().Interface().(command).run(out, problems)
}
