package main

import (
	"fmt"
	"io"
	"os"
	"path/filepath"
	"runtime"
	"strings"
	"sync"

	"soffit/calc/design"
	"soffit/calc/member"
	"soffit/calc/trace"
	"soffit/report/sheet"
)

type noteCommand struct {
	Files []string `arg:"" name:"file" help:"Member files."`
	Out   string   `name:"out" short:"o" placeholder:"DIR" help:"Folder for the notes; made if it is not there. Without it they go beside the member file."`
}

// result is what became of one member file.
type result struct {
	pdf  string
	note *trace.Note
	err  error
}

func (c *noteCommand) run(out, problems io.Writer) int {
	if err := c.distinct(); err != nil {
		say(problems, "soffit: %v\n", err)
		return noNote
	}
	results := make([]result, len(c.Files))
	c.all(results, problems)
	code := passes
	for i, r := range results {
		switch {
		case r.err != nil:
			say(problems, "%v\n", r.err)
			code = noNote
			continue
		case failed(r.note) && code == passes:
			code = fails
		}
		say(out, "%s: %s: %s\n", c.Files[i], r.pdf, summary(r.note))
	}
	return code
}

// all writes the notes, as many at once as there are processors, and tells how far it is when there are several.
func (c *noteCommand) all(results []result, progress io.Writer) {
	var wait sync.WaitGroup
	var mutex sync.Mutex
	done := 0
	work := make(chan int)
	for range min(runtime.GOMAXPROCS(0), len(results)) {
		wait.Add(1)
		go func() {
			defer wait.Done()
			for i := range work {
				results[i] = c.one(c.Files[i])
				mutex.Lock()
				done++
				if len(results) > 1 {
					say(progress, "%d of %d: %s\n", done, len(results), c.Files[i])
				}
				mutex.Unlock()
			}
		}()
	}
	for i := range results {
		work <- i
	}
	close(work)
	wait.Wait()
}

func failed(n *trace.Note) bool {
	for _, c := range n.Checks() {
		if c.Failed() {
			return true
		}
	}
	return false
}

// base is the path of a note without its ending.
func (c *noteCommand) base(file string) string {
	dir := c.Out
	if dir == "" {
		dir = filepath.Dir(file)
	}
	name := filepath.Base(file)
	return filepath.Join(dir, strings.TrimSuffix(name, filepath.Ext(name)))
}

// distinct refuses two member files whose notes would have the same name.
func (c *noteCommand) distinct() error {
	seen := map[string]string{}
	for _, f := range c.Files {
		b := c.base(f)
		if other, taken := seen[b]; taken {
			return fmt.Errorf("%s and %s would both write %s.pdf: give them other names, or run them one after the other", other, f, b)
		}
		seen[b] = f
	}
	return nil
}

func (c *noteCommand) one(file string) (r result) {
	m, err := read(file)
	if err != nil {
		return result{err: err}
	}
	made, err := compose(m)
	if err != nil {
		return result{err: err}
	}
	if c.Out != "" {
		if err := os.MkdirAll(c.Out, 0o755); err != nil {
			return result{err: err}
		}
	}
	base := c.base(file)
	if err := write(piece{base + ".pdf", made.pdf}, piece{base + ".trace.json", made.record}); err != nil {
		return result{err: err}
	}
	return result{pdf: base + ".pdf", note: made.note}
}

// made is a note with its two files.
type made struct {
	note        *trace.Note
	record, pdf []byte
}

// compose designs a member, recomputes its record from the printed values, and sets the note.
func compose(m *member.Member) (made, error) {
	n, err := design.Run(m)
	if err != nil {
		return made{}, err
	}
	if _, differences := trace.Closure(n); len(differences) > 0 {
		return made{}, fmt.Errorf("%s: a printed value does not follow from its printed operands, so there is no note; a fault of soffit, not of the file: %w", m.File, differences[0])
	}
	record, err := n.JSON()
	if err != nil {
		return made{}, fmt.Errorf("%s: %w", m.File, err)
	}
	pdf, err := sheet.Render(n, sheet.Options{})
	if err != nil {
		return made{}, placed(m, err)
	}
	return made{n, record, pdf}, nil
}

// placed gives what the sheet says of a narrative its line in the member file.
func placed(m *member.Member, err error) error {
	for _, p := range m.Narrative {
		if _, fault, found := strings.Cut(err.Error(), "text "+p.Slot+"."); found {
			if _, fault, found = strings.Cut(fault, "/narrative: "); found {
				return fmt.Errorf("%s:%d:%d: narrative, %s: %s", m.File, p.Pos.Line, p.Pos.Col, p.Slot, fault)
			}
		}
	}
	return fmt.Errorf("%s: %w", m.File, err)
}
