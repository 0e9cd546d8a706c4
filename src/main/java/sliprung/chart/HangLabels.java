package sliprung.chart;

import java.awt.Graphics2D;
import java.awt.geom.Line2D;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/**
 * The speeds at which a start hangs, in a column on the right and led to their marks: there they
 * never meet a curve. Starting and running load each have a block.
 */
final class HangLabels {
  private static final double LINE = 16.0;
  private static final double GAP = 12.0;
  private static final double MARK = 6.0;
  private static final double ASIDE = 14.0;

  private HangLabels() {}

  /** Hangs under one heading, the fastest first: so no leader of a block crosses another. */
  private record Block(String head, List<TorqueSpeed.Hang> hangs, double wantedTop) {
    double height() {
      return LINE * (hangs.size() + 1);
    }
  }

  static void draw(Graphics2D g, Frame frame, TorqueSpeed chart) {
    List<Block> blocks = new ArrayList<>();
    add(blocks, frame, "hangs, starting", chart.hangs());
    add(blocks, frame, "hangs, running", chart.runningHangs());
    blocks.sort(Comparator.comparingDouble(Block::wantedTop));
    double[] top = new double[blocks.size()];
    double free = frame.area().getY();
    for (int i = 0; i < top.length; i++) {
      top[i] = Math.max(blocks.get(i).wantedTop(), free);
      free = top[i] + blocks.get(i).height() + GAP;
    }
    double foot = frame.area().getMaxY() - 4;
    for (int i = top.length - 1; i >= 0; i--) {
      top[i] = Math.min(top[i], foot - blocks.get(i).height());
      foot = top[i] - GAP;
    }
    for (int i = 0; i < top.length; i++) {
      draw(g, frame, blocks.get(i), top[i]);
    }
  }

  private static void add(
      List<Block> blocks, Frame frame, String head, List<TorqueSpeed.Hang> hangs) {
    if (hangs.isEmpty()) {
      return;
    }
    double middle = hangs.stream().mapToDouble(h -> frame.y(h.torque())).average().orElse(0.0);
    blocks.add(
        new Block(
            head,
            hangs.stream().sorted(Comparator.comparingDouble(h -> -h.rpm())).toList(),
            middle - LINE * (hangs.size() + 1) / 2.0));
  }

  private static void draw(Graphics2D g, Frame frame, Block block, double top) {
    Words words = new Words(g);
    double x = frame.area().getMaxX() + ASIDE;
    double y = top + LINE - 4;
    words.left(block.head(), Ink.SMALL, Ink.QUIET, x, y);
    for (TorqueSpeed.Hang hang : block.hangs()) {
      y += LINE;
      g.setColor(Ink.QUIET);
      g.setStroke(Ink.EDGE);
      g.draw(new Line2D.Double(frame.x(hang.rpm()) + MARK, frame.y(hang.torque()), x - 3, y - 4));
      words.left(hang.step() + ": " + TorqueSpeed.rpm(hang), Ink.SMALL_STRONG, Ink.DEVICE, x, y);
    }
  }
}
