package pdf

import (
	"bytes"
	"compress/zlib"
	"crypto/sha256"
	"errors"
	"fmt"
	"maps"
	"regexp"
	"slices"
	"strconv"
	"strings"
	"sync"

	"soffit/fonts"
	"soffit/report/draw"
)

// embedded is a face in the file: resource is the name that the writer gave it.
type embedded struct {
	face     fonts.Face
	resource string
	runes    string
}

// baseName is the PostScript name of the face.
func (e embedded) baseName() string {
	switch e.face {
	case fonts.Italic:
		return "LiberationSerif-Italic"
	case fonts.Bold:
		return "LiberationSerif-Bold"
	case fonts.Marks:
		return "DejaVuSansMono"
	}
	return "LiberationSerif"
}

// tag is the six letters before the name of a subset; they depend on the runes in it.
func (e embedded) tag() string {
	sum := sha256.Sum256([]byte(e.face.String() + e.runes))
	var b [6]byte
	for i := range b {
		b[i] = 'A' + sum[i]%26
	}
	return string(b[:])
}

// dates are the entries of the file's information that say when it was made.
var dates = regexp.MustCompile(`/(?:CreationDate|ModDate) \([^)]*\)\n?`)

type finishing struct {
	faces    []embedded
	outline  []outlineEntry
	anchors  map[string]place
	language string
	sheets   int
	plain    bool
	undated  bool
}

// finish goes over the writer's file object by object and adds what the writer leaves out: compressed
// sheets, names that tell subsets from whole fonts, counts in the outline, named places, print flags of
// links, language, and an identifier made from the content.
func finish(file []byte, f finishing) ([]byte, error) {
	objects, trailer, err := split(file)
	if err != nil {
		return nil, err
	}
	names := make([]string, 0, 4*len(f.faces))
	resources := make([]string, 0, 2*len(f.faces))
	for _, e := range f.faces {
		full := e.tag() + "+" + e.baseName()
		names = append(names, "/BaseFont /utf8"+e.face.String()+"\n", "/BaseFont /"+full+"\n",
			"/FontName /utf8"+e.face.String()+"\n", "/FontName /"+full+"\n")
		resources = append(resources, "/"+e.resource+" ", fmt.Sprintf("/F%d ", e.face))
	}
	fontNames, resourceNames := strings.NewReplacer(names...), strings.NewReplacer(resources...)
	counts, visible := outlineCounts(f.outline)
	nextEntry := 0
	var out bytes.Buffer
	out.Grow(len(file) + 8<<10)
	out.WriteString("%PDF-1.7\n%\xE2\xE3\xCF\xD3\n")
	offsets := make([]int, len(objects)+1)
	byPlace := make([]int, 0, len(objects))
	for n := range objects {
		byPlace = append(byPlace, n)
	}
	slices.SortFunc(byPlace, func(a, b int) int { return objects[a].start - objects[b].start })
	for _, n := range byPlace {
		o := file[objects[n].start:objects[n].end]
		offsets[n+1] = out.Len()
		head, rest := o, []byte(nil)
		if i := bytes.Index(o, []byte("stream\n")); i >= 0 {
			head, rest = o[:i], o[i:]
		}
		switch {
		case bytes.Contains(head, []byte("/Type /Page\n")):
			head = bytes.ReplaceAll(head, []byte("/Subtype /Link "), []byte("/Subtype /Link /F 4 "))
		case bytes.Contains(head, []byte("/Type /Font")):
			head = []byte(fontNames.Replace(string(head)))
		case f.undated && bytes.Contains(head, []byte("/CreationDate (")):
			head = dates.ReplaceAll(head, nil)
		case bytes.Contains(head, []byte("/ProcSet")):
			head = []byte(resourceNames.Replace(string(head)))
		case bytes.Contains(head, []byte("/Type /Outlines")):
			head = bytes.Replace(head, []byte("/Type /Outlines"), []byte("/Type /Outlines /Count "+strconv.Itoa(visible)), 1)
		case bytes.Contains(head, []byte("/Type /Catalog")):
			head = f.catalog(head)
		case bytes.HasSuffix(bytes.TrimSpace(head), []byte("/Count 0>>\nendobj")):
			if nextEntry >= len(counts) {
				return nil, errors.New("pdf: more outline entries in the file than given")
			}
			count := ">>"
			if c := counts[nextEntry]; c != 0 {
				count = fmt.Sprintf("/Count %d>>", c)
			}
			head = bytes.Replace(head, []byte("/Count 0>>"), []byte(count), 1)
			nextEntry++
		}
		if rest != nil && !f.plain && n%2 == 1 && n+1 >= pageObject(1)+1 && n+1 <= pageObject(f.sheets)+1 {
			if head, rest, err = squeezed(n+1, rest); err != nil {
				return nil, err
			}
		}
		out.Write(head)
		out.Write(rest)
	}
	if nextEntry != len(counts) {
		return nil, fmt.Errorf("pdf: %d outline entries in the file, want %d", nextEntry, len(counts))
	}
	id := sha256.Sum256(out.Bytes())
	xref := out.Len()
	fmt.Fprintf(&out, "xref\n0 %d\n0000000000 65535 f \n", len(objects)+1)
	for _, o := range offsets[1:] {
		fmt.Fprintf(&out, "%010d 00000 n \n", o)
	}
	trailer = bytes.Replace(trailer, []byte("<<\n"), fmt.Appendf(nil, "<<\n/ID [<%x> <%x>]\n", id[:16], id[:16]), 1)
	out.Write(trailer)
	fmt.Fprintf(&out, "startxref\n%d\n%%%%EOF\n", xref)
	return out.Bytes(), nil
}

// compressors are kept, for each takes more memory than a sheet.
var compressors = sync.Pool{New: func() any {
	w, err := zlib.NewWriterLevel(nil, zlib.BestSpeed)
	if err != nil {
		panic(err) // the level is a constant
	}
	return w
}}

// squeezed is an object of nothing but a stream, compressed.
func squeezed(number int, stream []byte) (head, rest []byte, err error) {
	const start, end = "stream\n", "\nendstream\nendobj\n"
	if !bytes.HasPrefix(stream, []byte(start)) || !bytes.HasSuffix(stream, []byte(end)) {
		return nil, nil, fmt.Errorf("pdf: object %d is not the content of a sheet", number)
	}
	var b bytes.Buffer
	b.Grow(len(stream)/3 + 64)
	b.WriteString(start)
	w := compressors.Get().(*zlib.Writer)
	defer compressors.Put(w)
	w.Reset(&b)
	if _, err := w.Write(stream[len(start) : len(stream)-len(end)]); err != nil {
		return nil, nil, err
	}
	if err := w.Close(); err != nil {
		return nil, nil, err
	}
	n := b.Len() - len(start)
	b.WriteString(end)
	return fmt.Appendf(nil, "%d 0 obj\n<</Filter /FlateDecode /Length %d>>\n", number, n), b.Bytes(), nil
}

// catalog adds named places, language and the wish that the window shows the title.
func (f finishing) catalog(head []byte) []byte {
	var b bytes.Buffer
	lang := f.language
	if lang == "" {
		lang = "en"
	}
	fmt.Fprintf(&b, "/Type /Catalog\n/Lang %s\n/ViewerPreferences <</DisplayDocTitle true>>", literal(lang))
	head = bytes.Replace(head, []byte("/Type /Catalog"), b.Bytes(), 1)
	if len(f.anchors) == 0 {
		return head
	}
	b.Reset()
	b.WriteString("/Names <<\n/Dests <</Names [")
	for _, name := range slices.Sorted(maps.Keys(f.anchors)) {
		at := f.anchors[name]
		b.WriteString(literal(name))
		fmt.Fprintf(&b, "[%d 0 R /XYZ 0 ", pageObject(at.sheet))
		b.Write(appendFixed(nil, float64(draw.SheetHeight-at.y)))
		b.WriteString(" null]\n")
	}
	b.WriteString("]>>\n")
	return bytes.Replace(head, []byte("/Names <<\n"), b.Bytes(), 1)
}

// pageObject is the number of a page's object: the writer gives each page two, from 3 on.
func pageObject(sheet int) int { return 1 + 2*sheet }

func literal(s string) string {
	b := []byte{'('}
	for i := range len(s) {
		b = appendStringByte(b, s[i])
	}
	return string(append(b, ')'))
}

// outlineCounts are the entries' counts of descendants seen when opened, negative for an entry that is
// shown closed, and the number of entries shown at first. Entries of level 0 are shown open.
func outlineCounts(entries []outlineEntry) (counts []int, visible int) {
	counts = make([]int, len(entries))
	for i, e := range entries {
		for _, d := range entries[i+1:] {
			if d.level <= e.level {
				break
			}
			if d.level == e.level+1 {
				counts[i]++
			}
		}
		if e.level > 0 {
			counts[i] = -counts[i]
		}
		if e.level <= 1 {
			visible++
		}
	}
	return counts, visible
}

type extent struct{ start, end int }

// split finds the objects of the writer's file, in the order of their numbers from 1, by its table of
// offsets, and the trailer's dictionary.
func split(file []byte) ([]extent, []byte, error) {
	bad := errors.New("pdf: the writer's table of objects cannot be read")
	i := bytes.LastIndex(file, []byte("startxref\n"))
	if i < 0 {
		return nil, nil, bad
	}
	line, _, _ := bytes.Cut(file[i+len("startxref\n"):], []byte("\n"))
	xref, err := strconv.Atoi(string(line))
	if err != nil || xref >= i || !bytes.HasPrefix(file[xref:], []byte("xref\n0 ")) {
		return nil, nil, bad
	}
	line, rest, _ := bytes.Cut(file[xref+len("xref\n0 "):], []byte("\n"))
	n, err := strconv.Atoi(string(line))
	if err != nil || len(rest) < 20*n {
		return nil, nil, bad
	}
	objects := make([]extent, 0, n)
	order := make([]int, 0, n)
	for k := 1; k < n; k++ {
		at, err := strconv.Atoi(string(rest[20*k : 20*k+10]))
		if err != nil || at >= xref {
			return nil, nil, bad
		}
		objects = append(objects, extent{start: at})
		order = append(order, k-1)
	}
	slices.SortFunc(order, func(a, b int) int { return objects[a].start - objects[b].start })
	for k, o := range order {
		objects[o].end = xref
		if k+1 < len(order) {
			objects[o].end = objects[order[k+1]].start
		}
	}
	t := bytes.Index(file[xref:i], []byte("trailer\n"))
	if t < 0 {
		return nil, nil, bad
	}
	return objects, file[xref+t : i], nil
}
