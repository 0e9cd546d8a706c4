package sliprung.record;

import java.util.Optional;
import java.util.OptionalDouble;
import sliprung.protection.Bands;
import sliprung.protection.Edge;
import sliprung.quantity.Show;
import sliprung.starter.Device;
import sliprung.starter.Starter;

/**
 * The test of one device's trip.
 *
 * @param test what to do
 * @param expect what must be seen
 */
record TripTest(String test, String expect) {
  private static final double MULTIPLE = 3.0;

  /** The test of a device; a fuse has none. */
  static Optional<TripTest> of(Starter starter, Device device) {
    if (device instanceof Device.Fuse) {
      return Optional.empty();
    }
    String opens = device.trips().map(t -> t + " opens").orElse("it opens nothing: find out why");
    if (device instanceof Device.Instantaneous quick) {
      return Optional.of(
          new TripTest(
              "Raise the current in " + device.tag() + " from below, briefly each time.",
              opens
                  + " at "
                  + Show.amps(quick.pickUpAmps())
                  + " ± "
                  + Show.percent(quick.accuracy().pickUp())
                  + (quick.measures() == Device.Measures.PEAK ? " of a sine wave." : ".")));
    }
    Optional<Double> pickUp = device.fold(new PickUps());
    if (pickUp.isEmpty()) {
      return Optional.of(
          new TripTest("Let " + device.tag() + " run out or operate it.", opens + "."));
    }
    double amps = MULTIPLE * pickUp.get();
    Bands bands = new Bands(starter);
    OptionalDouble fast = bands.operatingSeconds(device, Edge.FAST, amps);
    OptionalDouble slow = bands.operatingSeconds(device, Edge.SLOW, amps);
    String time =
        fast.isEmpty() || slow.isEmpty() || Double.isInfinite(fast.getAsDouble())
            ? "at the time of its own curve"
            : Double.isInfinite(slow.getAsDouble())
                ? "not before " + Show.seconds(fast.getAsDouble())
                : "after "
                    + Show.seconds(fast.getAsDouble())
                    + " to "
                    + Show.seconds(slow.getAsDouble());
    return Optional.of(
        new TripTest(
            "Inject " + injected(device, amps) + " into " + device.tag() + ", cold.",
            opens + " " + time + "."));
  }

  private static String injected(Device device, double amps) {
    if (device instanceof Device.InverseTime relay && relay.ct().isPresent()) {
      Device.CurrentTransformer ct = relay.ct().get();
      return Show.amps(amps)
          + " primary ("
          + Show.amps(amps / ct.primary() * ct.secondary())
          + " secondary)";
    }
    return Show.amps(amps);
  }

  /** What three times the setting is three times of; empty where no current operates it. */
  private record PickUps() implements Device.Cases<Optional<Double>> {
    @Override
    public Optional<Double> fuse(Device.Fuse device) {
      return Optional.empty();
    }

    @Override
    public Optional<Double> overload(Device.Overload device) {
      return Optional.of(device.dialAmps());
    }

    @Override
    public Optional<Double> inverseTime(Device.InverseTime device) {
      return Optional.of(device.pickUpAmps());
    }

    @Override
    public Optional<Double> instantaneous(Device.Instantaneous device) {
      return Optional.empty();
    }

    @Override
    public Optional<Double> sequenceTimer(Device.SequenceTimer device) {
      return Optional.empty();
    }

    @Override
    public Optional<Double> thermal(Device.Thermal device) {
      return Optional.of(device.baseAmps());
    }

    @Override
    public Optional<Double> definiteTime(Device.DefiniteTime device) {
      return Optional.of(device.pickUpAmps());
    }

    @Override
    public Optional<Double> points(Device.Points device) {
      return Optional.of(device.ratingAmps());
    }

    @Override
    public Optional<Double> standstill(Device.Standstill device) {
      return Optional.empty();
    }

    @Override
    public Optional<Double> stepProof(Device.StepProof device) {
      return Optional.empty();
    }

    @Override
    public Optional<Double> undervoltage(Device.Undervoltage device) {
      return Optional.empty();
    }

    @Override
    public Optional<Double> temperature(Device.Temperature device) {
      return Optional.empty();
    }
  }
}
