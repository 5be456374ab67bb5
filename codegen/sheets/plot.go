package sheets

import (
	"cmp"
	"fmt"
	"html"
	"math"
	"slices"
	"strconv"
	"strings"
	"unicode/utf8"
)

// Curve is a line in a plot: Y over X, in the plot's units.
type Curve struct {
	Name string
	X, Y []float64
}

// Level is a horizontal line with a label: a threshold.
type Level struct {
	Name string
	At   float64
}

// Band is a stretch of X that is marked at the foot of the plot: a load that
// is on.
type Band struct{ From, To float64 }

// Plot is curves over a common axis. Names and labels may come from a sheet;
// they are escaped here.
type Plot struct {
	Title, About   string // About says in a sentence what is to be seen, for those who cannot see it
	XLabel, YLabel string
	Curves         []Curve
	Levels         []Level
	Bands          []Band
	BandName       string
}

// Size of a plot in units of the drawing, and the room round its field.
const (
	plotWidth, plotHeight                   = 800.0, 420.0
	plotLeft, plotRight, plotTop, plotFloor = 70.0, 150.0, 46.0, 76.0
)

// plotColours are dark enough on white (contrast above 4.5) and told apart by
// people with the common kinds of colour blindness (after the palette of M.
// Okabe and K. Ito, 2008, darkened); every curve has a dash of its own besides.
var plotColours = [...]string{"#00558b", "#a23e00", "#00694b", "#6b2d6b"}

var plotDashes = [...][]float64{nil, {7, 4}, {2, 3}, {9, 3, 2, 3}}

// scale maps a range of values to the drawing.
type scale struct{ low, high, from, to float64 }

func (s scale) at(v float64) float64 { return s.from + (v-s.low)/(s.high-s.low)*(s.to-s.from) }

// scales of both axes: everything that is drawn lies within.
func (p Plot) scales() (x, y scale) {
	x = scale{math.Inf(1), math.Inf(-1), plotLeft, plotWidth - plotRight}
	y = scale{math.Inf(1), math.Inf(-1), plotHeight - plotFloor, plotTop}
	wide := func(s *scale, v float64) { s.low, s.high = math.Min(s.low, v), math.Max(s.high, v) }
	for _, c := range p.Curves {
		for i := range c.X {
			wide(&x, c.X[i])
			wide(&y, c.Y[i])
		}
	}
	for _, l := range p.Levels {
		wide(&y, l.At)
	}
	for _, s := range []*scale{&x, &y} {
		if !(s.high > s.low) {
			if math.IsInf(s.low, 0) {
				s.low, s.high = 0, 0
			}
			s.low, s.high = s.low-1, s.high+1
		}
	}
	room := 0.06 * (y.high - y.low)
	y.low, y.high = y.low-room, y.high+room
	return x, y
}

// ticks are about n round numbers in a range.
func ticks(low, high float64, n int) []float64 {
	raw := (high - low) / float64(n)
	step := math.Pow(10, math.Floor(math.Log10(raw)))
	for _, f := range []float64{1, 2, 5, 10} {
		if f*step >= raw {
			step *= f
			break
		}
	}
	var ts []float64
	for k := math.Ceil(low/step - 1e-9); k*step <= high+1e-9*step; k++ {
		ts = append(ts, k*step+0) // no minus before a 0
	}
	return ts
}

// apart moves labels that would lie on each other apart, keeping their order.
func apart(at []float64, least float64) []float64 {
	out, order := slices.Clone(at), make([]int, len(at))
	for i := range order {
		order[i] = i
	}
	slices.SortStableFunc(order, func(a, b int) int { return cmp.Compare(at[a], at[b]) })
	for range 40 * len(at) { // each pass halves what is left to do
		for i := 1; i < len(order); i++ {
			upper, lower := &out[order[i-1]], &out[order[i]]
			if short := least - (*lower - *upper); short > 0 {
				*upper, *lower = *upper-short/2, *lower+short/2
			}
		}
	}
	return out
}

// A canvas is what a plot is drawn on, in units of the drawing from its upper
// left corner.
type canvas interface {
	line(points []point, colour string, width float64, dash []float64)
	rect(x, y, width, height float64, colour string)
	text(x, y, size float64, side anchor, s string) // y is the foot of the letters
}

type point struct{ x, y float64 }

// anchor is which part of a text stands at its place.
type anchor string

const (
	start  anchor = "start"
	middle anchor = "middle"
	end    anchor = "end"
)

const (
	ink, grey, pale = "#1a1a1a", "#767676", "#dddddd"
	plain, small    = 13.0, 12.0
)

// draw lays the plot out.
func (p Plot) draw(c canvas) {
	x, y := p.scales()
	c.rect(0, 0, plotWidth, plotHeight, "#ffffff")
	c.text(plotLeft, 22, 16, start, p.Title)
	c.text(plotLeft, 40, small, start, p.YLabel)
	for _, t := range ticks(y.low, y.high, 6) {
		c.line([]point{{x.from, y.at(t)}, {x.to, y.at(t)}}, pale, 1, nil)
		c.text(x.from-8, y.at(t)+4, plain, end, tick(t))
	}
	for _, t := range ticks(x.low, x.high, 8) {
		c.line([]point{{x.at(t), y.from}, {x.at(t), y.from + 5}}, ink, 1, nil)
		c.text(x.at(t), y.from+19, plain, middle, tick(t))
	}
	for _, s := range p.Bands {
		c.rect(x.at(s.From), y.from-7, x.at(s.To)-x.at(s.From), 6, grey)
	}
	c.line([]point{{x.from, y.to}, {x.from, y.from}, {x.to, y.from}}, ink, 1, nil)
	c.text((x.from+x.to)/2, plotHeight-38, plain, middle, p.XLabel)

	at := make([]float64, len(p.Levels))
	for i, l := range p.Levels {
		at[i] = y.at(l.At)
		c.line([]point{{x.from, at[i]}, {x.to, at[i]}}, grey, 1, []float64{1, 3})
	}
	for i, labelled := range apart(at, 15) {
		c.text(x.to+6, labelled+4, small, start, p.Levels[i].Name)
	}
	for i, curve := range p.Curves {
		points := make([]point, len(curve.X))
		for j := range points {
			points[j] = point{x.at(curve.X[j]), y.at(curve.Y[j])}
		}
		c.line(points, plotColours[i%len(plotColours)], 1.8, plotDashes[i%len(plotDashes)])
	}
	p.legend(c, x.from)
}

func (p Plot) legend(c canvas, x float64) {
	const sample = 28.0
	foot := plotHeight - 12
	next := func(name string) {
		c.text(x+sample+6, foot, plain, start, name)
		x += sample + 32 + 7*float64(utf8.RuneCountInString(name))
	}
	for i, curve := range p.Curves {
		c.line([]point{{x, foot - 4}, {x + sample, foot - 4}}, plotColours[i%len(plotColours)], 1.8, plotDashes[i%len(plotDashes)])
		next(curve.Name)
	}
	if len(p.Bands) > 0 {
		c.rect(x, foot-7, sample, 6, grey)
		next(p.BandName)
	}
}

func tick(v float64) string { return strconv.FormatFloat(v, 'g', 6, 64) }

// SVG draws the plot as a picture that needs nothing else and carries its own
// title and description.
func (p Plot) SVG() []byte {
	var c svg
	fmt.Fprintf(&c, `<svg xmlns="http://www.w3.org/2000/svg" viewBox="0 0 %g %g" role="img" aria-labelledby="title about" font-family="sans-serif" fill="%s">`+"\n", plotWidth, plotHeight, ink)
	fmt.Fprintf(&c, "<title id=\"title\">%s</title>\n<desc id=\"about\">%s</desc>\n", xmlText(p.Title), xmlText(p.About))
	p.draw(&c)
	c.WriteString("</svg>\n")
	return []byte(c.String())
}

// svg is a canvas of SVG elements.
type svg struct{ strings.Builder }

func (c *svg) line(points []point, colour string, width float64, dash []float64) {
	fmt.Fprintf(c, `<path fill="none" stroke="%s" stroke-width="%g"`, colour, width)
	if len(dash) > 0 {
		fmt.Fprintf(c, ` stroke-dasharray="%s"`, strings.Trim(fmt.Sprint(dash), "[]"))
	}
	c.WriteString(` d="`)
	for i, p := range points {
		command := "L"
		if i == 0 {
			command = "M"
		}
		fmt.Fprintf(c, "%s%.2f %.2f", command, p.x, p.y)
	}
	c.WriteString("\"/>\n")
}

func (c *svg) rect(x, y, width, height float64, colour string) {
	fmt.Fprintf(c, `<rect x="%.2f" y="%.2f" width="%.2f" height="%.2f" fill="%s"/>`+"\n", x, y, width, height, colour)
}

func (c *svg) text(x, y, size float64, side anchor, s string) {
	fmt.Fprintf(c, `<text x="%.1f" y="%.1f" font-size="%g" text-anchor="%s">%s</text>`+"\n", x, y, size, side, xmlText(s))
}

// xmlText makes text stand for itself in a picture; hidden characters are shown.
func xmlText(s string) string { return html.EscapeString(Visible(s)) }
