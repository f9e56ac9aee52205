package design

import (
	"soffit/calc/diag"
)

// narratives puts the engineer's texts at the head of their chapters, last of all, so that they may speak of any
// value. What they name wrongly is found like a fault of the member file.
func (j *job) narratives() {
	if j.n.Err() != nil {
		return
	}
	for _, p := range j.m.Narrative {
		for _, c := range j.n.Chapters {
			if c.Slug != p.Slot {
				continue
			}
			if err := c.Narrative(p.Text); err != nil {
				j.findings.Add(diag.Finding{File: j.m.File, Pos: p.Pos, Msg: "narrative, " + p.Slot + ": " + err.Error(),
					Hint: "write a symbol as the note prints it, such as {M_Rd} or {f_cd}, in a chapter where it stands once"})
			}
		}
	}
}
