package node

import (
	"bytes"
	"errors"
	"fmt"
	"io"
	"regexp"
	"strconv"
	"strings"

	"gopkg.in/yaml.v3"

	"soffit/calc/diag"
)

// Read reads a file. It gives whatever can be read, and all findings about the rest; where there are
// findings of broken YAML, the parts of the file that stand at the margin are read each by itself, so that
// one of them does not hide the mistakes in the others.
func Read(name string, src []byte) (*File, diag.List) {
	f := &File{Name: name}
	found, ok := f.text(src)
	if !ok {
		return f, found
	}
	w := &walker{file: f}
	if docs, bad := decode(f.lines, 0); bad == nil {
		f.Root = w.documents(docs)
	} else {
		f.Root = w.sections()
		if len(w.found) == 0 { // each part by itself can be read
			w.syntax(bad, f.lines, 0)
		}
	}
	found.Add(w.found...)
	return f, found
}

// syntax is why YAML cannot be read.
type syntax struct {
	line int // from 1; 0: not known
	msg  string
}

var atLine = regexp.MustCompile(`^yaml: (?:line (\d+): )?(.*)$`)

// decode reads lines, of which the first is line skip+1 of the file, into document nodes, at most two.
func decode(lines []string, skip int) (docs []*yaml.Node, bad *syntax) {
	defer func() {
		if r := recover(); r != nil { // a fault of the decoder must not end the program
			docs, bad = nil, &syntax{msg: fmt.Sprint(r)}
		}
	}()
	d := yaml.NewDecoder(bytes.NewReader([]byte(strings.Join(lines, "\n") + "\n")))
	for len(docs) < 2 {
		doc := new(yaml.Node)
		err := d.Decode(doc)
		if errors.Is(err, io.EOF) {
			return docs, nil
		}
		if err != nil {
			m := atLine.FindStringSubmatch(err.Error())
			if m == nil {
				return nil, &syntax{msg: err.Error()}
			}
			bad = &syntax{msg: m[2]}
			if n, err := strconv.Atoi(m[1]); err == nil {
				bad.line = n + skip
			}
			return nil, bad
		}
		docs = append(docs, doc)
	}
	return docs, nil
}
