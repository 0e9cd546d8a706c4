package sliprung.chart;

import java.util.ArrayList;
import java.util.List;
import sliprung.machine.OperatingPoint;
import sliprung.quantity.Show;
import sliprung.review.Review;
import sliprung.rulebook.ComputedStart;
import sliprung.runup.Stage;
import sliprung.runup.Trace;
import sliprung.starter.Device;
import sliprung.tolerance.Corner;
import sliprung.tolerance.Corners;

/**
 * Scales beside the stator's: ring amperes, and secondary amperes of current transformers.
 *
 * @param ringPerStator ring amperes for a stator ampere at rest with the rings shorted
 * @param leastRingPerStator the least ratio in the nominal cold start, where the magnetizing
 *     current counts most; not a number where it was not computed
 * @param transformers each ratio once
 */
public record SheetScales(
    double ringPerStator, double leastRingPerStator, List<Transformer> transformers) {

  /**
   * A transformer's scale.
   *
   * @param devices tags of the devices on it
   * @param ratio as written, such as {@code 300/5}
   * @param secondaryPerPrimary amperes
   */
  public record Transformer(String devices, String ratio, double secondaryPerPrimary) {}

  /** Copies the list. */
  public SheetScales {
    transformers = List.copyOf(transformers);
  }

  /** Of a review. */
  static SheetScales of(Review review) {
    OperatingPoint rest =
        review
            .machine()
            .at(Corners.conditions(review.starter(), Corner.NOMINAL).source(), 0.0, 1.0);
    double least = review.start("cold").map(SheetScales::least).orElse(Double.NaN);
    return new SheetScales(rest.ringAmps() / rest.statorAmps(), least, transformers(review));
  }

  private static double least(ComputedStart cold) {
    double least = Double.POSITIVE_INFINITY;
    for (Stage stage : cold.history().stages()) {
      Trace trace = stage.trace();
      // as it stands before the next closing: just after one, currents are not yet settled
      int end = trace.last();
      least = Math.min(least, trace.ringAmps()[end] / trace.statorAmps()[end]);
    }
    return least;
  }

  private static List<Transformer> transformers(Review review) {
    List<Transformer> scales = new ArrayList<>();
    for (Device device : review.starter().protection()) {
      if (device instanceof Device.InverseTime relay
          && relay.ct().isPresent()
          && device.fitting().place() == Device.Place.STATOR) {
        Device.CurrentTransformer ct = relay.ct().get();
        String ratio = Show.three(ct.primary()) + "/" + Show.three(ct.secondary());
        Transformer scale = new Transformer(device.tag(), ratio, ct.secondary() / ct.primary());
        int same = -1;
        for (int i = 0; i < scales.size(); i++) {
          same = scales.get(i).ratio().equals(ratio) ? i : same;
        }
        if (same < 0) {
          scales.add(scale);
        } else {
          String devices = scales.get(same).devices() + ", " + device.tag();
          scales.set(same, new Transformer(devices, ratio, scale.secondaryPerPrimary()));
        }
      }
    }
    return scales;
  }

  /** What the ring scale stands for, as a sentence. */
  String sentence() {
    String rest =
        "The ring scale holds at rest: "
            + Show.ratio(ringPerStator)
            + " ring amperes for a stator ampere";
    return Double.isFinite(leastRingPerStator)
        ? rest + "; over the start the ratio falls to " + Show.ratio(leastRingPerStator) + "."
        : rest + ".";
  }
}
