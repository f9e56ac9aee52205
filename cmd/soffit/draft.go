package main

import (
	"errors"
	"fmt"
	"io"
	"io/fs"
	"os"
	"path/filepath"
	"strings"

	"soffit/templates"
)

type draftCommand struct {
	Kind []string `arg:"" name:"kind" help:"Kind of cross-section: ${drafts}; double-T for double T."`
	Out  string   `name:"out" short:"o" placeholder:"FILE" help:"File to write; its folder is made if it is not there. Without it: KIND.yaml."`
}

func (c *draftCommand) run(out, problems io.Writer) int {
	kind := strings.Join(c.Kind, " ")
	text, ok := templates.Draft(kind)
	if !ok {
		say(problems, "soffit: draft: %s\n", unknown(kind, templates.Drafts()))
		return noNote
	}
	file := c.Out
	if file == "" {
		file = templates.DraftFile(kind)
	}
	if err := create(file, text); err != nil {
		say(problems, "soffit: %v\n", err)
		return noNote
	}
	say(out, "%s: a member file to start from; next: soffit note %[1]s\n", file)
	return passes
}

// create writes a file that was not there before; if it cannot be written whole, it is not there afterwards.
func create(file string, data []byte) error {
	if err := os.MkdirAll(filepath.Dir(file), 0o755); err != nil {
		return err
	}
	f, err := os.OpenFile(file, os.O_WRONLY|os.O_CREATE|os.O_EXCL, 0o644)
	if errors.Is(err, fs.ErrExist) {
		return fmt.Errorf("%s is there already and stays as it is: give another name with --out", file)
	} else if err != nil {
		return err
	}
	_, err = f.Write(data)
	if e := f.Close(); err == nil {
		err = e
	}
	if err != nil {
		os.Remove(file)
	}
	return err
}
