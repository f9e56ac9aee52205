package losses

import (
	"math"
	"slices"
)

// Follow takes the section through its events and the times of the line, and gives its state after every event and, at each
// later time, before the events of that time. Events at one time follow each other as listed; the first stands at the first time. The
// work grows with the square of the number of times.
//
// An error is a *Refusal: BadConcrete, BadSteel, BadEvent, OffTime, Unknown, Early, Loose, Unsettled.
func (l *Timeline) Follow(s Section, events []Event) ([]State, error) {
	if err := l.check(s, events); err != nil {
		return nil, err
	}
	w := l.start(s, len(events))
	for i, t := range l.times {
		if i > 0 {
			if err := w.step(i); err != nil {
				return nil, err
			}
		}
		for ; w.next < len(events) && events[w.next].Time == t; w.next++ {
			if err := w.meet(events[w.next], i); err != nil {
				return nil, err
			}
		}
	}
	return w.states, nil
}

// way is a section on its way.
type way struct {
	line      *Timeline
	concretes []body
	steel     []layer
	next      int // event
	level     float64
	strain    float64 // at the level
	curvature float64
	force     float64 // from outside
	moment    float64 // about the level
	states    []State
	numbers   []float64 // store of the states
	edges     []Edges
}

// body is a concrete on its way. Stresses are mean − slope·(y − centroid), so that slope and curvature have the same sense.
type body struct {
	Concrete
	there       bool
	arm         float64 // centroid over the level
	mean, slope float64
	means       []float64 // what each time has had of stress, to be weighed with the compliances from it
	slopes      []float64
	strain      float64 // at the centroid when it joined
	curvature   float64
	shrunk      float64
	// of the step: the strain that goes without more stress, and the flexibility for more
	freeStrain, freeCurvature, flexible float64
}

// layer is steel on its way.
type layer struct {
	Steel
	there   bool
	held    bool // by a jack
	arm     float64
	strain  float64 // when it joined
	relaxed float64
	begun   float64 // relaxed at the start of the step
	elastic float64 // stress without relaxation at the start of the step
}

func (l *Timeline) start(s Section, events int) *way {
	w := &way{line: l, concretes: make([]body, len(s.Concretes)), steel: make([]layer, len(s.Steel))}
	if len(s.Concretes) > 0 {
		w.level = s.Concretes[0].Centroid
	}
	n := len(l.times)
	store := make([]float64, 2*n*len(s.Concretes))
	for i, c := range s.Concretes {
		w.concretes[i] = body{Concrete: c, arm: c.Centroid - w.level, means: store[:n:n], slopes: store[n : 2*n : 2*n]}
		store = store[2*n:]
	}
	for i, p := range s.Steel {
		w.steel[i] = layer{Steel: p, arm: p.Height - w.level, relaxed: p.Relaxed}
	}
	n += events
	w.states = make([]State, 0, n)
	w.numbers = make([]float64, 2*n*len(s.Steel))
	w.edges = make([]Edges, n*len(s.Concretes))
	return w
}

// at is the strain in the plane at an arm over the level.
func (w *way) at(arm float64) float64 { return w.strain - w.curvature*arm }

// unrelaxed is the stress that the steel would have without relaxation.
func (w *way) unrelaxed(p *layer) float64 {
	if p.held {
		return p.Stress + p.Relaxed
	}
	return p.Stress + p.Relaxed + p.Modulus*(w.at(p.arm)-p.strain)
}

// step goes from the time before to time i.
func (w *way) step(i int) error {
	for k := range w.concretes {
		c := &w.concretes[k]
		if !c.there {
			continue
		}
		a := i - c.Ageing.from
		row := c.Ageing.compliance[a]
		mean, slope := 0.0, 0.0
		for j, v := range row[:a] {
			mean += v * c.means[j]
			slope += v * c.slopes[j]
		}
		c.freeStrain = c.strain + mean - (c.Ageing.shrinkage[a] - c.shrunk)
		c.freeCurvature = c.curvature + slope
		c.flexible = (row[a] + row[a-1]) / 2
	}
	for k := range w.steel {
		p := &w.steel[k]
		p.begun, p.elastic = p.relaxed, w.unrelaxed(p)
	}
	if err := w.settle(i, w.line.times[i]-w.line.times[i-1]); err != nil {
		return err
	}
	for k := range w.concretes {
		if c := &w.concretes[k]; c.there {
			mean, slope := w.more(c)
			c.mean += mean
			c.slope += slope
			a := i - c.Ageing.from
			for _, j := range [2]int{a - 1, a} {
				c.means[j] += mean / 2
				c.slopes[j] += slope / 2
			}
		}
	}
	w.record(i, -1)
	return nil
}

// meet takes an event at time i.
func (w *way) meet(e Event, i int) error {
	w.force += e.Force
	w.moment += e.Moment - e.Force*(e.Height-w.level)
	for _, k := range e.Leaving {
		if !valid(k, len(w.steel)) || !w.steel[k].there {
			return &Refusal{Reason: Unknown, Index: w.next, Have: float64(k)}
		}
		w.steel[k].there = false
	}
	for _, k := range e.Concretes {
		if !valid(k, len(w.concretes)) || w.concretes[k].there {
			return &Refusal{Reason: Unknown, Index: w.next, Have: float64(k)}
		}
		c := &w.concretes[k]
		if i < c.Ageing.from {
			return &Refusal{Reason: Early, Index: w.next, Have: e.Time, Limit: w.line.times[c.Ageing.from]}
		}
		c.there, c.strain, c.curvature = true, w.at(c.arm), w.curvature
		c.shrunk = c.Ageing.shrinkage[i-c.Ageing.from]
	}
	for _, k := range e.Steel {
		if !valid(k, len(w.steel)) || w.steel[k].there || slices.Contains(e.Leaving, k) {
			return &Refusal{Reason: Unknown, Index: w.next, Have: float64(k)}
		}
		p := &w.steel[k]
		p.there, p.held, p.strain = true, e.Jacked, w.at(p.arm)
	}
	for k := range w.concretes {
		if c := &w.concretes[k]; c.there {
			a := i - c.Ageing.from
			c.freeStrain, c.freeCurvature, c.flexible = w.at(c.arm), w.curvature, c.Ageing.compliance[a][a]
		}
	}
	if err := w.settle(i, 0); err != nil {
		return err
	}
	for k := range w.concretes {
		if c := &w.concretes[k]; c.there {
			mean, slope := w.more(c)
			c.mean += mean
			c.slope += slope
			a := i - c.Ageing.from
			c.means[a] += mean
			c.slopes[a] += slope
		}
	}
	for k := range w.steel {
		if p := &w.steel[k]; p.held { // the jack lets go of a tendon as long as this
			p.held, p.strain = false, w.at(p.arm)
		}
	}
	w.record(i, w.next)
	return nil
}

func valid(k, n int) bool { return k >= 0 && k < n }

// more is the stress that a concrete gains in the step or event, in the plane as it is.
func (w *way) more(c *body) (mean, slope float64) {
	return (w.at(c.arm) - c.freeStrain) / c.flexible, (w.curvature - c.freeCurvature) / c.flexible
}

// The plane is settled when the forces balance to rounding and no layer relaxes more by another round.
const (
	rounds   = 60
	balanced = 1e-13 // of the sum of the forces without their signs
	rounding = 4e-16 // of the strains
	quiet    = 1e-10 // MPa
)

// settle finds the plane in which the stresses balance the actions, with the relaxation of the days of the step.
func (w *way) settle(i int, days float64) error {
	k11, k12, k22 := w.stiffness()
	det := k11*k22 - k12*k12
	if !(k11 > 0 && k22 > 0 && det > 1e-12*k11*k22) {
		return &Refusal{Reason: Loose, Index: w.next}
	}
	for range rounds {
		moved := 0.0
		if days > 0 {
			moved = w.relax(days)
		}
		force, moment, gross, turning := w.sums(true)
		n, m := w.force-force, w.moment-moment
		if !finite(n, m, moved) {
			break
		}
		noise := rounding * w.strains()
		if math.Abs(n) <= balanced*(gross+math.Abs(w.force))+noise*k11 && math.Abs(m) <= balanced*(turning+math.Abs(w.moment))+noise*math.Sqrt(k11*k22) && moved <= quiet {
			return nil
		}
		w.strain += (n*k22 - m*k12) / det
		w.curvature += (m*k11 - n*k12) / det
	}
	return &Refusal{Reason: Unsettled, Index: i}
}

// stiffness is the resistance of all parts to strain at the level and to curvature.
func (w *way) stiffness() (k11, k12, k22 float64) {
	for k := range w.concretes {
		if c := &w.concretes[k]; c.there {
			s := c.Area / c.flexible
			k11 += s
			k12 -= s * c.arm
			k22 += s*c.arm*c.arm + c.Inertia/c.flexible
		}
	}
	for k := range w.steel {
		if p := &w.steel[k]; p.there && !p.held {
			s := p.Area * p.Modulus
			k11 += s
			k12 -= s * p.arm
			k22 += s * p.arm * p.arm
		}
	}
	return k11, k12, k22
}

// strains is the size of the strains that the stresses are differences of.
func (w *way) strains() float64 {
	size, depth := 0.0, 0.0
	for k := range w.concretes {
		if c := &w.concretes[k]; c.there {
			depth = math.Max(depth, c.Top-c.Bottom)
			size = math.Max(size, math.Abs(c.freeStrain)+math.Abs(w.at(c.arm))+(math.Abs(c.freeCurvature)+math.Abs(w.curvature))*depth)
		}
	}
	return size
}

// relax lets every tendon relax for the days of the step, from the mean of its stress without relaxation, and gives the greatest
// change against the round before, MPa.
func (w *way) relax(days float64) (moved float64) {
	for k := range w.steel {
		p := &w.steel[k]
		if !p.there || p.Relaxation == nil {
			continue
		}
		initial := (p.elastic + w.unrelaxed(p)) / 2
		equivalent := p.Relaxation.Days(initial, p.begun)
		lost := p.Relaxation.Loss(initial, equivalent+days)
		if lost < p.begun {
			lost = p.begun
		}
		if change := math.Abs(lost - p.relaxed); !(change <= moved) {
			moved = change
		}
		p.relaxed = lost
	}
	return moved
}

// sums are those of the forces, N, and of their moments about the level, N·mm, and the same without signs; gaining says that
// the stress that the step or event brings is not in the concretes yet.
func (w *way) sums(gaining bool) (force, moment, gross, turning float64) {
	for k := range w.concretes {
		c := &w.concretes[k]
		if !c.there {
			continue
		}
		mean, slope := c.mean, c.slope
		if gaining {
			m, s := w.more(c)
			mean, slope = mean+m, slope+s
		}
		n, m := c.Area*mean, c.Inertia*slope
		force += n
		moment += m - n*c.arm
		gross += math.Abs(n)
		turning += math.Abs(m) + math.Abs(n)*(math.Abs(c.arm)+c.Top-c.Bottom)
	}
	for k := range w.steel {
		p := &w.steel[k]
		if !p.there {
			continue
		}
		n := p.Area * (w.unrelaxed(p) - p.relaxed)
		force += n
		moment -= n * p.arm
		gross += math.Abs(n)
		turning += math.Abs(n * p.arm)
	}
	return force, moment, gross, turning
}

// record writes down the state at time i.
func (w *way) record(i, event int) {
	n := len(w.steel)
	s := State{Time: w.line.times[i], Event: event, Stress: w.numbers[:n:n], Relaxed: w.numbers[n : 2*n : 2*n], Edges: w.edges[:len(w.concretes):len(w.concretes)]}
	w.numbers, w.edges = w.numbers[2*n:], w.edges[len(w.concretes):]
	s.Plane = Plane{w.strain + w.curvature*w.level, w.curvature}
	for k := range w.concretes {
		if c := &w.concretes[k]; c.there {
			s.Edges[k] = Edges{c.mean - c.slope*(c.Bottom-c.Centroid), c.mean - c.slope*(c.Top-c.Centroid)}
		}
	}
	for k := range w.steel {
		if p := &w.steel[k]; p.there {
			s.Stress[k], s.Relaxed[k] = w.unrelaxed(p)-p.relaxed, p.relaxed
		}
	}
	force, moment, _, _ := w.sums(false)
	s.Force = w.force - force
	s.Moment = w.moment - moment - s.Force*w.level
	w.states = append(w.states, s)
}

// check looks at what can be seen before the start.
func (l *Timeline) check(s Section, events []Event) error {
	for i, c := range s.Concretes {
		if !(c.Area > 0 && c.Inertia > 0 && c.Top > c.Bottom) || !finite(c.Area, c.Inertia, c.Top, c.Bottom, c.Centroid) || c.Ageing == nil || c.Ageing.line != l {
			return &Refusal{Reason: BadConcrete, Index: i}
		}
	}
	for i, p := range s.Steel {
		if !p.sound() {
			return &Refusal{Reason: BadSteel, Index: i}
		}
	}
	for i, e := range events {
		if !finite(e.Moment, e.Force, e.Height) || i == 0 && e.Time != l.times[0] || i > 0 && !(e.Time >= events[i-1].Time) {
			return &Refusal{Reason: BadEvent, Index: i, Have: e.Time}
		}
		if _, ok := slices.BinarySearch(l.times, e.Time); !ok {
			return &Refusal{Reason: OffTime, Index: i, Have: e.Time}
		}
	}
	if len(events) == 0 {
		return &Refusal{Reason: BadEvent}
	}
	return nil
}
