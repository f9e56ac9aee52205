package design

// contents is the order of the note. A chapter may be filled before one that stands ahead of it: the stations
// depend on the transmission lengths, the verdict on everything.
func (j *job) contents() {
	verdict := j.n.Chapter("verdict", "Verdict")
	basis := j.n.Chapter("basis", "Basis")
	member := j.n.Chapter("given", "The member as given")
	materials := j.n.Chapter("materials", "Materials")
	section := j.n.Chapter("section", "Section")
	actions := j.n.Chapter("actions", "Actions and their effects")
	prestress := j.n.Chapter("prestress", "Prestress, transmission and anchorage")
	ultimate := j.n.Chapter("ultimate", "Bending at the ultimate limit state")
	second := j.n.Chapter("second", "Second methods")

	j.basisChapter(basis)
	j.givenChapter(member)
	j.materialsChapter(materials)
	j.sectionChapter(section)
	j.givenFigures(member)
	j.prestressChapter(prestress)
	j.actionsChapter(actions)
	j.profileAlong(prestress, section)
	j.alongChapter(prestress)
	j.ultimateChapter(ultimate)
	j.secondChapter(second)
	j.verdictChapter(verdict)
	j.narratives()
}
