package sliprung.protection;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import sliprung.starter.Device;
import sliprung.starter.Starter;

/**
 * Devices on a time-current sheet: how long a constant current from cold takes to operate each
 * edge, in amperes at the place where the device measures.
 */
public final class Bands {
  private static final int STEPS_PER_DECADE = 200;
  private static final double PRECISION = 1e-9;

  private final Starter starter;

  /** Bands of a starter's devices. */
  public Bands(Starter starter) {
    this.starter = starter;
  }

  /**
   * A point of a band.
   *
   * @param amps RMS
   * @param seconds finite
   */
  public record Point(double amps, double seconds) {}

  /** The models of every edge of a device, fast to slow. */
  static Map<Edge, EdgeModel> models(Device device, Starter starter) {
    Map<Edge, EdgeModel> models = new EnumMap<>(Edge.class);
    for (Edge edge : Edge.values()) {
      models.put(edge, model(device, edge, starter));
    }
    return models;
  }

  private static EdgeModel model(Device device, Edge edge, Starter starter) {
    return device.fold(new EdgeModels(edge, starter));
  }

  /** Empty, or why that edge of a device cannot be computed at all. */
  public Optional<String> unknown(Device device, Edge edge) {
    return model(device, edge, starter).unknown();
  }

  /**
   * Operating time in s at a constant current from cold; infinite: never; empty where it cannot be
   * told (outside a curve's points, an edge without data) or does not depend on the current.
   */
  public OptionalDouble operatingSeconds(Device device, Edge edge, double amps) {
    return model(device, edge, starter).seconds(amps);
  }

  /** The same after a preload. */
  public OptionalDouble operatingSeconds(
      Device device, Edge edge, double amps, DevicePreload preload) {
    return model(device, edge, starter).seconds(amps, preload);
  }

  /**
   * The least constant current in A that ever operates an edge, to 1e-9; empty where there is none
   * up to a hundred thousand amperes or it cannot be told. What measures something else, such as a
   * rotation sensor or a sequence timer, has no level in amperes.
   */
  public OptionalDouble pickUpAmps(Device device, Edge edge) {
    return device.measuresCurrent()
        ? pickUpAmps(model(device, edge, starter))
        : OptionalDouble.empty();
  }

  /** The same of a model. */
  static OptionalDouble pickUpAmps(EdgeModel model) {
    double low = 0.0;
    for (double amps : grid(0.01, 1e5)) {
      if (operates(model, amps)) {
        return OptionalDouble.of(bisect(low, amps, i -> operates(model, i)));
      }
      low = amps;
    }
    return OptionalDouble.empty();
  }

  private static boolean operates(EdgeModel model, double amps) {
    OptionalDouble seconds = model.seconds(amps);
    return seconds.isPresent() && seconds.getAsDouble() < Double.POSITIVE_INFINITY;
  }

  /** Points of an edge where it operates, over currents in equal steps of their logarithm. */
  public List<Point> points(Device device, Edge edge, double fromAmps, double toAmps) {
    EdgeModel model = model(device, edge, starter);
    List<Point> points = new ArrayList<>();
    for (double amps : grid(fromAmps, toAmps)) {
      if (operates(model, amps)) {
        points.add(new Point(amps, model.seconds(amps).getAsDouble()));
      }
    }
    return points;
  }

  /**
   * The greatest current in A, within a range, at which one device at one edge operates before
   * another at another edge; the upper end of the range if it still does there, empty if it never
   * does. Both must measure the same current.
   */
  public OptionalDouble greatestFasterAmps(
      Device device, Edge edge, Device other, Edge otherEdge, double fromAmps, double toAmps) {
    EdgeModel one = model(device, edge, starter);
    EdgeModel two = model(other, otherEdge, starter);
    double[] grid = grid(fromAmps, toAmps);
    for (int k = grid.length - 1; k >= 0; k--) {
      if (faster(one, two, grid[k])) {
        return OptionalDouble.of(
            k == grid.length - 1
                ? grid[k]
                : bisect(grid[k + 1], grid[k], i -> faster(one, two, i)));
      }
    }
    return OptionalDouble.empty();
  }

  private static boolean faster(EdgeModel one, EdgeModel two, double amps) {
    OptionalDouble first = one.seconds(amps);
    OptionalDouble second = two.seconds(amps);
    return first.isPresent()
        && first.getAsDouble() < Double.POSITIVE_INFINITY
        && (second.isEmpty() || first.getAsDouble() < second.getAsDouble());
  }

  private interface OfAmps {
    boolean holds(double amps);
  }

  /** The limit between a current where something does not hold and one where it does. */
  private static double bisect(double without, double with, OfAmps condition) {
    double off = without;
    double on = with;
    while (Math.abs(on - off) > PRECISION * Math.max(on, off)) {
      double middle = 0.5 * (on + off);
      if (condition.holds(middle)) {
        on = middle;
      } else {
        off = middle;
      }
    }
    return on;
  }

  private static double[] grid(double from, double to) {
    int count = (int) Math.ceil(STEPS_PER_DECADE * Math.log10(to / from)) + 1;
    double[] grid = new double[Math.max(2, count)];
    for (int k = 0; k < grid.length; k++) {
      grid[k] = from * Math.pow(to / from, k / (grid.length - 1.0));
    }
    grid[grid.length - 1] = to;
    return grid;
  }
}
