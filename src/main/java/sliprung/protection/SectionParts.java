package sliprung.protection;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import sliprung.starter.ResistorBank;

/**
 * The sections of a bank, heated while they are in circuit, cooling with the same time constant.
 */
final class SectionParts {
  private final ResistorBank bank;

  SectionParts(ResistorBank bank) {
    this.bank = bank;
  }

  List<Part> parts() {
    List<Part> parts = new ArrayList<>();
    for (int number = 1; number <= bank.sections().size(); number++) {
      parts.add(part(number));
    }
    return parts;
  }

  private Part part(int number) {
    String name = "section-" + number;
    Optional<SectionElement> found = SectionElement.of(bank, number);
    if (found.isEmpty()) {
      return Part.missing(name, SectionElement.missing(bank, number).orElseThrow());
    }
    SectionElement element = found.get();
    double ohms = bank.sections().get(number - 1).ohms();
    return Part.of(
            name,
            channel(bank, number),
            preload ->
                new FirstOrderMeter(
                    element.referenceAmps(),
                    element.timeConstantSeconds(),
                    preload.sectionLevel(number)))
        .withOhms(history -> 3.0 * ohms * history.conditions().bankFactor());
  }

  /** Current in a section's own conductor while it is in circuit. */
  static Channel channel(ResistorBank bank, int number) {
    double share = bank.sectionShare();
    return Channel.ring(stage -> stage.sectionsIn().contains(number) ? share : 0.0);
  }

  /** Levels of all sections after some starts in a row; a section without data counts as 0. */
  List<Double> levelsAfter(Currents currents, PartPreload preload, int starts) {
    List<Double> levels = new ArrayList<>();
    for (Part part : parts()) {
      if (part.missing().isPresent()) {
        levels.add(0.0);
        continue;
      }
      Meter meter = part.meter().apply(preload);
      Waveform waveform = currents.of(part.channel());
      for (int n = 0; n < starts; n++) {
        Passage.throughStart(meter, waveform);
      }
      levels.add(meter.level());
    }
    return levels;
  }
}
