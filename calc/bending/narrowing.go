package bending

// narrowing solves with the block as it is, and where the zone that this gives narrows toward the compressed edge
// again with its stress cut. Less stress takes more depth: the zone narrows then too.
func (p *problem) narrowing(hi float64) (Axis, error) {
	a, err := p.solve(hi)
	if err != nil || p.Narrowing == 0 || !p.section.Narrows(a.X) {
		return a, err
	}
	p.block.EtaFcd *= p.Narrowing
	evals := a.Evals
	if a, err = p.solve(hi); err != nil {
		return Axis{}, err
	}
	a.Evals += evals
	a.Reduced = true
	return a, nil
}
