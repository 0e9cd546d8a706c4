package sliprung.protection;

import sliprung.runup.Stage;
import sliprung.runup.Trace;

/** Which current of a history a device or part has, stage by stage. */
interface Channel {

  /** Its current over the quantity's, in one stage; 0: none. */
  double share(Stage stage);

  /** The quantity, one value for each sample. */
  double[] quantity(Trace trace);

  /** Whether it is measured at all at that sample. */
  default boolean reads(Trace trace, int sample) {
    return true;
  }

  /** Stator line current. */
  static Channel stator() {
    return of(stage -> 1.0, Trace::statorAmps);
  }

  /** Ring current times a share that depends on the stage. */
  static Channel ring(Share share) {
    return of(share, Trace::ringAmps);
  }

  /** A quantity times a share that depends on the stage. */
  static Channel of(Share share, Quantity quantity) {
    return new Channel() {
      @Override
      public double share(Stage stage) {
        return share.in(stage);
      }

      @Override
      public double[] quantity(Trace trace) {
        return quantity.of(trace);
      }
    };
  }

  /** Likewise, but where the rotor's frequency is below a limit nothing is read. */
  static Channel aboveFrequency(
      Channel channel, double synchronousSpeed, double frequency, double leastHertz) {
    double widest = leastHertz / frequency * synchronousSpeed;
    return new Channel() {
      @Override
      public double share(Stage stage) {
        return channel.share(stage);
      }

      @Override
      public double[] quantity(Trace trace) {
        return channel.quantity(trace);
      }

      @Override
      public boolean reads(Trace trace, int sample) {
        return Math.abs(synchronousSpeed - trace.speed()[sample]) >= widest;
      }
    };
  }

  /** A share in one stage. */
  interface Share {
    double in(Stage stage);
  }

  /** A sampled quantity. */
  interface Quantity {
    double[] of(Trace trace);
  }
}
