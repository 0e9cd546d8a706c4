package sliprung.rulebook.contactor;

import java.util.List;
import java.util.Optional;
import sliprung.quantity.Show;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.FindingBuilder;
import sliprung.runup.Stage;
import sliprung.starter.Contactor;
import sliprung.starter.Device;

/** What a step contactor must break when a device opens it. */
final class RotorContactorOpened {
  private RotorContactorOpened() {}

  private record Greatest(double ringAmps, ComputedStart start) {}

  static Finding finding(Facts facts, FindingBuilder builder, Device device, Contactor contactor) {
    Optional<Category> slipRing =
        Category.of(contactor, facts.practice()).stream().filter(Category::isSlipRing).findFirst();
    if (contactor.rotorRatingAmps().isEmpty() && slipRing.isEmpty()) {
      return builder.notJudged(
          List.of("contactors." + contactor.tag() + ".rotor-rating"),
          device.tag()
              + " opens step contactor "
              + contactor.tag()
              + ", and nothing proves what that breaks in a rotor circuit.");
    }
    double multiple = facts.practice().figure("rotor.breaking").value();
    double rated = contactor.rotorRatingAmps().orElseGet(() -> slipRing.orElseThrow().ratedAmps());
    Greatest greatest = greatest(facts);
    if (greatest == null) {
      return builder.notJudged(List.of(), "No start was computed.");
    }
    double amps = PoleCurrent.forVerdict(contactor, greatest.ringAmps(), facts.practice());
    return builder
        .at(greatest.start())
        .margin(multiple * rated / amps)
        .figures(amps, multiple * rated, "A")
        .says(
            device.tag()
                + " opens step contactor "
                + contactor.tag()
                + " at up to "
                + Show.amps(amps)
                + " a pole ("
                + greatest.start().words()
                + "). It is proven to break "
                + Show.amps(multiple * rated)
                + " ("
                + Show.three(multiple)
                + " × "
                + Show.amps(rated)
                + ") at supply frequency; near running speed the rotor has 1 to 3 Hz, which no test"
                + " covers, and the stator stays on.")
        .mend("Let " + device.tag() + " open the line contactor.")
        .byMarginAtBestTight();
  }

  private static Greatest greatest(Facts facts) {
    Greatest greatest = null;
    for (ComputedStart start : facts.starts()) {
      for (Stage stage : start.history().everything()) {
        for (double speed : stage.trace().speed()) {
          // an RMS figure: without the offset that samples of a transient hold
          double amps =
              facts
                  .machine()
                  .at(
                      start.history().conditions().source(),
                      stage.externalOhms(),
                      facts.machine().slip(speed))
                  .ringAmps();
          if (greatest == null || amps > greatest.ringAmps()) {
            greatest = new Greatest(amps, start);
          }
        }
      }
    }
    return greatest;
  }
}
