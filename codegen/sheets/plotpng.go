package sheets

import (
	"bytes"
	"image"
	"image/color"
	"image/png"
	"math"
	"strconv"
	"sync"

	"golang.org/x/image/font"
	"golang.org/x/image/font/gofont/goregular"
	"golang.org/x/image/font/opentype"
	"golang.org/x/image/math/fixed"
	"golang.org/x/image/vector"
)

// pixels are those of a PNG for one unit of the drawing.
const pixels = 2.0

// PNG draws the plot as a picture of pixels.
func (p Plot) PNG() ([]byte, error) {
	c, err := newRaster()
	if err != nil {
		return nil, err
	}
	p.draw(c)
	var b bytes.Buffer
	err = png.Encode(&b, c.picture)
	return b.Bytes(), err
}

// raster is a canvas of pixels.
type raster struct {
	picture *image.RGBA
	pen     *vector.Rasterizer
	faces   map[float64]font.Face
	letters *opentype.Font
}

// letters are read once; they stand in the program.
var letters = sync.OnceValues(func() (*opentype.Font, error) { return opentype.Parse(goregular.TTF) })

func newRaster() (*raster, error) {
	f, err := letters()
	if err != nil {
		return nil, err
	}
	size := image.Rect(0, 0, int(plotWidth*pixels), int(plotHeight*pixels))
	return &raster{picture: image.NewRGBA(size), pen: vector.NewRasterizer(size.Dx(), size.Dy()), faces: map[float64]font.Face{}, letters: f}, nil
}

func (c *raster) rect(x, y, width, height float64, colour string) {
	c.fill([]point{{x, y}, {x + width, y}, {x + width, y + height}, {x, y + height}}, colour)
}

// fill fills a polygon.
func (c *raster) fill(corners []point, colour string) {
	c.pen.Reset(c.picture.Rect.Dx(), c.picture.Rect.Dy())
	c.outline(corners)
	c.paint(colour)
}

func (c *raster) outline(corners []point) {
	for i, p := range corners {
		x, y := float32(p.x*pixels), float32(p.y*pixels)
		if i == 0 {
			c.pen.MoveTo(x, y)
		} else {
			c.pen.LineTo(x, y)
		}
	}
	c.pen.ClosePath()
}

func (c *raster) paint(colour string) {
	c.pen.Draw(c.picture, c.picture.Rect, image.NewUniform(hex(colour)), image.Point{})
}

// line draws each straight piece as a bar of the line's width; a dash cuts it
// into shorter ones.
func (c *raster) line(points []point, colour string, width float64, dash []float64) {
	c.pen.Reset(c.picture.Rect.Dx(), c.picture.Rect.Dy())
	at, on, left := 0, true, math.Inf(1)
	if len(dash) > 0 {
		left = dash[0]
	}
	for i := 1; i < len(points); i++ {
		a, b := points[i-1], points[i]
		length := math.Hypot(b.x-a.x, b.y-a.y)
		for done := 0.0; done < length; {
			step := math.Min(left, length-done)
			if on {
				c.bar(between(a, b, done/length), between(a, b, (done+step)/length), width)
			}
			done += step
			if left -= step; left <= 0 {
				at, on = (at+1)%len(dash), !on
				left = dash[at]
			}
		}
	}
	c.paint(colour)
}

func between(a, b point, share float64) point {
	return point{a.x + share*(b.x-a.x), a.y + share*(b.y-a.y)}
}

// bar adds a straight piece of a line, always drawn the same way round, so that
// bars that overlap do not cancel.
func (c *raster) bar(a, b point, width float64) {
	length := math.Hypot(b.x-a.x, b.y-a.y)
	if length == 0 {
		return
	}
	dx, dy := (b.x-a.x)/length*width/2, (b.y-a.y)/length*width/2
	c.outline([]point{{a.x - dy, a.y + dx}, {b.x - dy, b.y + dx}, {b.x + dy, b.y - dx}, {a.x + dy, a.y - dx}})
}

func (c *raster) text(x, y, size float64, side anchor, s string) {
	face := c.face(size)
	if face == nil {
		return
	}
	s = Visible(s)
	d := font.Drawer{Dst: c.picture, Src: image.NewUniform(hex(ink)), Face: face}
	width := float64(d.MeasureString(s)) / 64
	px := x * pixels
	switch side {
	case middle:
		px -= width / 2
	case end:
		px -= width
	}
	d.Dot = fixed.Point26_6{X: fixed.Int26_6(math.Round(px * 64)), Y: fixed.Int26_6(math.Round(y * pixels * 64))}
	d.DrawString(s)
}

// face is the font at a size; nil where it cannot be had.
func (c *raster) face(size float64) font.Face {
	if f, ok := c.faces[size]; ok {
		return f
	}
	f, err := opentype.NewFace(c.letters, &opentype.FaceOptions{Size: size * pixels, DPI: 72, Hinting: font.HintingFull})
	if err != nil {
		f = nil
	}
	c.faces[size] = f
	return f
}

// hex reads a colour as SVG has it, #rrggbb.
func hex(colour string) color.RGBA {
	v, err := strconv.ParseUint(colour[1:], 16, 32)
	if err != nil {
		return color.RGBA{A: 255}
	}
	return color.RGBA{uint8(v >> 16), uint8(v >> 8), uint8(v), 255}
}
