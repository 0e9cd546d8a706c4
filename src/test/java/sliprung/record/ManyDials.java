package sliprung.record;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import sliprung.review.CrusherReview;
import sliprung.review.Review;
import sliprung.starter.Device;
import sliprung.starter.Starter;

/** The hand-made review with more relays than anyone fits. */
final class ManyDials {
  private ManyDials() {}

  static Review review() {
    Review plain = CrusherReview.plain();
    Starter s = plain.starter();
    List<Device> devices = new ArrayList<>(s.protection());
    for (int i = 10; i < 18; i++) {
      devices.add(
          new Device.DefiniteTime(
              new Device.Fitting(
                  "F" + i, Device.Place.STATOR, Optional.of("Q1"), Device.Measurement.CT),
              700 + i,
              2.5,
              new Device.Accuracy(0.05, 0.075),
              OptionalDouble.empty()));
    }
    Starter many =
        new Starter(
            s.name(),
            s.practice(),
            s.supply(),
            s.motor(),
            s.load(),
            s.resistors(),
            s.steps(),
            s.sequence(),
            s.timerSpread(),
            s.levelSpread(),
            s.contactors(),
            s.breakers(),
            devices,
            s.statorConductor(),
            s.rotorConductor(),
            s.duty(),
            s.limits(),
            s.margins(),
            s.fuseWear(),
            s.interlocks(),
            s.ambient(),
            s.evidence(),
            s.accepted(),
            s.assumptions(),
            s.notYetJudged());
    return new Review(
        many,
        plain.date(),
        plain.machine(),
        plain.identification(),
        plain.starts(),
        plain.findings(),
        plain.notApplicable(),
        plain.notBuilt(),
        plain.mustJudgeMissing());
  }
}
