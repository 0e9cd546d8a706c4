package sliprung.chart;

import java.awt.Color;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.geom.Point2D;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Direct labels of a time-current sheet, each where it covers no other and little else. */
final class SheetLabels {
  private static final int LABEL_LETTERS = 40;
  private static final int TAG_LETTERS = 8;
  private static final double HEIGHT = 17.0;
  private static final int STRIDE = 4;
  private final Frame frame;
  private final FreeSpace space;
  private final Words words;

  SheetLabels(Graphics2D g, Frame frame, FreeSpace space) {
    this.frame = frame;
    this.space = space;
    this.words = new Words(g);
  }

  /** Every label, the most needed first. */
  void draw(TimeCurrentSheet sheet) {
    for (DurationCurve curve : sheet.starts()) {
      start(curve);
    }
    for (TimeCurrentSheet.HeldCurrent held : sheet.held()) {
      if (!held.label().isEmpty()) {
        held(held);
      }
    }
    for (TimeCurrentSheet.Stall stall : sheet.stall()) {
      stall(stall);
    }
    for (TakeOverMark mark : sheet.takeOvers()) {
      double x = frame.x(mark.amps());
      double y = frame.y(mark.seconds());
      double left = x - words.width(mark.label(), Ink.SMALL) - 12;
      List<Point2D> places = new ArrayList<>();
      for (double beside : new double[] {x + 12, left}) {
        for (double up : new double[] {8, 14, 20, 2, -4}) {
          places.add(at(beside, y - up));
        }
      }
      put(mark.label(), Ink.SMALL, Ink.DEVICE, places);
    }
    for (Band band : sheet.bands()) {
      beside(Lines.cut(band.label(), LABEL_LETTERS), Ink.LABEL, Ink.DEVICE, slow(band), true);
    }
    for (Withstand line : sheet.withstand()) {
      beside(line.label(), Ink.SMALL, Ink.PART, new Curve(line.amps(), line.seconds()), true);
    }
    sheet.corners().ifPresent(this::corners);
    for (Band band : sheet.bands()) {
      String tag = Lines.cut(band.label().split(" ", 2)[0], TAG_LETTERS);
      Curve fast = new Curve(band.amps(), TimeCurrentDrawing.shown(band.fastSeconds()));
      beside(tag + " fast", Ink.FINE, Ink.QUIET, fast, false);
    }
  }

  private static Curve slow(Band band) {
    boolean never = true;
    for (double t : band.slowSeconds()) {
      never &= Double.isInfinite(t);
    }
    return new Curve(
        band.amps(), TimeCurrentDrawing.shown(never ? band.fastSeconds() : band.slowSeconds()));
  }

  private void start(DurationCurve curve) {
    double[] amps = curve.amps();
    double[] seconds = curve.seconds();
    List<Point2D> places = new ArrayList<>();
    for (int i = amps.length - 1; i >= 0; i -= STRIDE) {
      double y = Math.max(frame.y(seconds[i]), frame.area().getY() + 2);
      places.add(at(frame.x(amps[i]) + 6, y - HEIGHT - 3));
      places.add(at(frame.x(amps[i]) - words.width(curve.label(), Ink.STRONG) - 6, y + 4));
    }
    put(curve.label(), Ink.STRONG, Ink.STATOR, places);
  }

  private void held(TimeCurrentSheet.HeldCurrent held) {
    double x = frame.x(held.amps());
    List<Point2D> places = new ArrayList<>();
    for (double y = frame.area().getY() + 3; y < frame.area().getMaxY(); y += HEIGHT + 2) {
      places.add(at(x + 5, y));
    }
    put(held.label(), Ink.SMALL, Ink.STATOR, places);
  }

  /** At the ends of its own line, where two that run side by side cannot be confused. */
  private void stall(TimeCurrentSheet.Stall stall) {
    double span = TimeCurrentDrawing.STALL_SPAN;
    double right = frame.x(stall.amps() * span);
    double left = frame.x(stall.amps() / span);
    double foot = frame.y(stall.seconds() / span / span);
    double top = frame.y(stall.seconds() * span * span);
    double wide = words.width(stall.label(), Ink.SMALL);
    put(
        stall.label(),
        Ink.SMALL,
        Ink.PART,
        List.of(
            at(right + 10, foot - 10),
            at(left - wide - 6, top - 9),
            at(right + 10, foot - 2),
            at(left - wide - 6, top - 16)));
  }

  private void corners(CornerBand band) {
    double[] amps = band.amps();
    List<Point2D> places = new ArrayList<>();
    for (int i = amps.length - 1; i >= 0; i -= STRIDE) {
      double greatest = Math.max(band.greatestSeconds()[i], TimeCurrentDrawing.LEAST_SECONDS);
      places.add(at(frame.x(amps[i]) + 6, frame.y(greatest) - HEIGHT));
    }
    put("start at all " + band.corners() + " corners", Ink.FINE, Ink.STATOR, places);
  }

  /** Right or left of a line that falls to the right. */
  private void beside(String text, Font font, Color colour, Curve line, boolean right) {
    double[] amps = line.across();
    double[] seconds = line.up();
    double wide = words.width(text, font);
    List<Point2D> places = new ArrayList<>();
    for (int i = 0; i < amps.length; i++) {
      if (!Double.isFinite(seconds[i])) {
        continue;
      }
      double x = frame.x(amps[i]);
      double y = frame.y(seconds[i]);
      if (frame.area().contains(x, y)) {
        places.add(right ? at(x + 6, y - HEIGHT + 2) : at(x - wide - 5, y - 2));
      }
    }
    steepEdge(line, places, right ? 6.0 : -wide - 5.0);
    put(text, font, colour, places);
  }

  /** Where a line falls so steeply that its points stand far apart, places along the fall. */
  private void steepEdge(Curve line, List<Point2D> places, double offset) {
    double[] amps = line.across();
    double[] seconds = line.up();
    for (int i = 1; i < amps.length; i++) {
      if (!Double.isFinite(seconds[i]) || !Double.isFinite(seconds[i - 1])) {
        continue;
      }
      double top = Math.max(frame.y(seconds[i - 1]), frame.area().getY());
      double foot = Math.min(frame.y(seconds[i]), frame.area().getMaxY());
      for (double y = top + 4; y < foot - HEIGHT && foot - top > 40; y += HEIGHT) {
        places.add(at(frame.x(amps[i]) + offset, y));
      }
    }
  }

  private static Point2D at(double x, double y) {
    return new Point2D.Double(x, y);
  }

  private void put(String text, Font font, Color colour, List<Point2D> places) {
    Optional<Point2D> place = space.place(words.width(text, font), HEIGHT, places);
    place.ifPresent(p -> words.plate(text, font, colour, p.getX(), p.getY() + 13));
  }
}
