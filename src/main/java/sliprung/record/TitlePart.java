package sliprung.record;

import java.util.Locale;
import sliprung.quantity.Show;
import sliprung.review.Review;
import sliprung.starter.Motor;
import sliprung.starter.Starter;

/** The title block: what was reviewed, held against what, when, by which version, from what. */
final class TitlePart {
  private TitlePart() {}

  static void write(Html page, Dossier dossier) {
    Review review = dossier.review();
    Starter starter = review.starter();
    page.open("header");
    page.element("h1", starter.name());
    page.element("p", "Review of protection and contactors", "class", "quiet");
    page.open("dl", "class", "title").markup("\n");
    pair(page, "Starter", starter(starter));
    pair(page, "Motor", motor(starter.motor()));
    pair(page, "Practice", starter.practice().name().toLowerCase(Locale.ROOT));
    pair(page, "Date", review.date().toString());
    pair(page, "Program", "Sliprung " + dossier.program());
    pair(page, "Record", dossier.fingerprint());
    pair(page, "Computed", review.starts().size() + " starts");
    page.end();
    page.end();
  }

  private static void pair(Html page, String term, String text) {
    page.open("div").element("dt", term).element("dd", text).end();
  }

  private static String starter(Starter starter) {
    int sections = starter.sectionCount();
    return Show.volts(starter.supply().voltage())
        + " "
        + Show.three(starter.supply().frequency())
        + "\u00a0Hz, "
        + sections
        + (sections == 1 ? " section" : " sections");
  }

  private static String motor(Motor motor) {
    return Show.three(motor.powerWatts() / 1000.0)
        + "\u00a0kW, "
        + Show.amps(motor.current())
        + ", "
        + Math.round(motor.speedRpm())
        + "\u00a0rpm"
        + (motor.rotorVoltage().isPresent() && motor.rotorCurrent().isPresent()
            ? "; rotor "
                + Show.volts(motor.rotorVoltage().getAsDouble())
                + " "
                + Show.amps(motor.rotorCurrent().getAsDouble())
            : "");
  }
}
