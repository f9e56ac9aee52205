package main

import (
	"io"
	"os"
	"path/filepath"

	"soffit/calc/design"
	"soffit/calc/member"
)

type examineCommand struct {
	Files []string `arg:"" name:"file" help:"Member files."`
}

// run makes each note and throws it away: what only the finished design can judge is found too, and what the checks come to
// is said.
func (c *examineCommand) run(out, problems io.Writer) int {
	code := passes
	for _, file := range c.Files {
		m, err := read(file)
		var made made
		if err == nil {
			made, err = compose(m)
		}
		if err != nil {
			say(problems, "%v\n", err)
			code = noNote
			continue
		}
		say(out, "%s: no faults found; %s: %s\n", file, m.Document.Title.Text, summary(made.note))
		for _, line := range failing(made.note) {
			say(out, "  %s\n", line)
		}
		if failed(made.note) && code == passes {
			code = fails
		}
	}
	return code
}

// read takes a member file in; its error is all findings, one after another.
func read(file string) (*member.Member, error) {
	src, err := os.ReadFile(file)
	if err != nil {
		return nil, err
	}
	m, findings := member.Read(filepath.ToSlash(file), src, design.Options())
	if err := findings.Err(); err != nil {
		return nil, err
	}
	return m, nil
}
