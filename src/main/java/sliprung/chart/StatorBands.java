package sliprung.chart;

import java.util.ArrayList;
import java.util.List;
import sliprung.protection.Bands;
import sliprung.protection.Edge;
import sliprung.review.DeviceText;
import sliprung.starter.Device;
import sliprung.starter.Starter;

/** The bands of the devices that measure stator current, for the time-current sheet. */
public final class StatorBands {
  private static final double LEAST_SHARE = 0.5;
  private static final double GREATEST_SHARE = 30.0;
  private static final double STEPS_PER_DECADE = 60.0;

  private StatorBands() {}

  /**
   * A band for each device whose time depends on the stator current, from half to thirty times
   * rated current; an edge that cannot be told is left out of its band as never.
   */
  public static List<Band> of(Starter starter) {
    Bands bands = new Bands(starter);
    double from = LEAST_SHARE * starter.motor().current();
    double to = GREATEST_SHARE * starter.motor().current();
    int count = (int) Math.ceil(STEPS_PER_DECADE * Math.log10(to / from)) + 1;
    List<Band> out = new ArrayList<>();
    for (Device device : starter.protection()) {
      // timers and rotation sensors count time, whatever the current
      if (device.fitting().place() != Device.Place.STATOR || !device.measuresCurrent()) {
        continue;
      }
      double[] amps = new double[count];
      double[] fast = new double[count];
      double[] middle = new double[count];
      double[] slow = new double[count];
      boolean any = false;
      for (int i = 0; i < count; i++) {
        amps[i] = from * Math.pow(to / from, i / (count - 1.0));
        fast[i] = seconds(bands, device, Edge.FAST, amps[i]);
        middle[i] = seconds(bands, device, Edge.MIDDLE, amps[i]);
        slow[i] = seconds(bands, device, Edge.SLOW, amps[i]);
        any |= Double.isFinite(slow[i]) || Double.isFinite(fast[i]);
      }
      if (any) {
        out.add(new Band(DeviceText.words(device), amps, fast, middle, slow));
      }
    }
    return out;
  }

  private static double seconds(Bands bands, Device device, Edge edge, double amps) {
    return bands.operatingSeconds(device, edge, amps).orElse(Double.POSITIVE_INFINITY);
  }
}
