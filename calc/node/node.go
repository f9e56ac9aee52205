// Package node reads YAML into nodes with their places. It is the one place that knows YAML: what it hands on
// is mappings, lists and scalars that are plain text, whatever YAML would make of them ("010", "yes", "2.5").
// Anchors, aliases, merge keys, tags and second documents are findings.
package node

import (
	"soffit/calc/diag"
)

// Kind is the kind of a node.
type Kind int

const (
	Scalar  Kind = iota
	Mapping      // Entries
	List         // Items
	Broken       // what could not be read; the findings say so already
)

// Node is a part of the file.
type Node struct {
	Kind    Kind
	Pos     diag.Pos
	Width   int     // characters on the first line; at least 1
	Text    string  // of a scalar, blanks around it cut off
	Quoted  bool    // of a scalar: in quotes or a block
	Entries []Entry // of a mapping, in the order of the file; keys may occur twice
	Items   []*Node // of a list
}

// Entry is one key of a mapping with its value.
type Entry struct {
	Key   *Node // a scalar
	Value *Node
}

// Empty reports whether n is a scalar of which nothing was written.
func (n *Node) Empty() bool { return n.Kind == Scalar && n.Text == "" }

// File is a file as read.
type File struct {
	Name  string
	Root  *Node // nil where there is nothing in the file, or nothing that could be read
	lines []string
}

// Finding is a finding about the text at a place, with its line.
func (f *File) Finding(at diag.Pos, width int, msg, hint string) diag.Finding {
	return diag.Finding{File: f.Name, Pos: at, Msg: msg, Snippet: f.line(at.Line), Width: max(width, 1), Hint: hint}
}

func (f *File) line(n int) string {
	if n < 1 || n > len(f.lines) {
		return ""
	}
	return f.lines[n-1]
}
