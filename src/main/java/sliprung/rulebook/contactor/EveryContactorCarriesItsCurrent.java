package sliprung.rulebook.contactor;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import sliprung.protection.PartResponse;
import sliprung.quantity.Show;
import sliprung.rulebook.Check;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.DutyCurrent;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.FindingBuilder;
import sliprung.rulebook.Rule;
import sliprung.starter.Contactor;
import sliprung.starter.ResistorBank;
import sliprung.starter.ShortTime;
import sliprung.starter.Starter;

/**
 * {@code contactor/carrying}: every contactor stands what its poles carry: for good where the
 * topology leaves it in circuit, RMS over the duty, and in a start against its short-time rating.
 *
 * <p>Margin: the least of thermal current over running current, thermal current over RMS current,
 * and short-time I²t over that of the permitted starts.
 */
public final class EveryContactorCarriesItsCurrent implements Rule {
  private static final Info INFO =
      new Info(
          "contactor/carrying",
          "Does every contactor stand what it carries, for good, over the duty and in a start?",
          "IEC 60947-4-1 4.3.2 (thermal current) and 9.3.5 (ten seconds), from memory",
          List.of("supply.band", "motor", "load", "resistors", "duty", "contactors.{subject}"));

  @Override
  public Info info() {
    return INFO;
  }

  @Override
  public Answer judge(Facts facts) {
    List<Finding> findings = new ArrayList<>();
    for (Contactor contactor : facts.starter().contactors()) {
      boolean line = contactor.place() == Contactor.Place.LINE;
      boolean step =
          facts.starter().steps().stream().anyMatch(s -> s.contactor().equals(contactor.tag()));
      if (line || step) {
        findings.add(judge(facts, contactor, line));
      }
    }
    return Answer.of(findings, "no contactor is described in the line or in a step");
  }

  private static Finding judge(Facts facts, Contactor contactor, boolean line) {
    FindingBuilder builder = FindingBuilder.of(facts, INFO, contactor.tag());
    Rated rated = rated(contactor);
    if (rated == null) {
      return builder.notJudged(
          List.of("contactors." + contactor.tag() + ".thermal"),
          contactor.tag() + " has no rated current of any kind.");
    }
    Starter starter = facts.starter();
    double share = line ? 1.0 : PoleCurrent.forVerdict(contactor, 1.0, facts.practice());
    DutyCurrent duty =
        new DutyCurrent(
            facts,
            !line,
            in -> line ? 1.0 : starter.carriesRingCurrent(contactor.tag(), in) ? share : 0.0);
    Optional<DutyCurrent.Found> greatest = duty.greatest();
    Optional<DutyCurrent.Found> running = duty.forGood();
    if (greatest.isEmpty() || running.isEmpty()) {
      return builder.notJudged(List.of(), "No permitted start and no running point was computed.");
    }
    List<Check> checks = new ArrayList<>();
    List<String> missing = new ArrayList<>();
    checks.add(forGood(facts, contactor, line, rated, running.get()));
    overTheDuty(facts, contactor, rated, duty, checks, missing);
    inAStart(facts, contactor, rated, greatest.get(), checks, missing);
    Check.into(builder, checks);
    double margin = Check.thinnest(checks).margin();
    if (!missing.isEmpty() && margin >= 1.0) {
      return builder.notJudged(
          missing,
          contactor.tag()
              + " carries up to "
              + Show.amps(greatest.get().amps())
              + " a pole in a start and is rated "
              + rated.words()
              + ".");
    }
    return builder
        .mend(
            margin < facts.wanted(INFO.name())
                ? "Take a contactor with more thermal and short-time current"
                    + (line ? "." : ", or join its poles in delta.")
                : "")
        .byMargin();
  }

  private record Rated(double amps, String basis) {
    String words() {
      return Show.amps(amps) + " (" + basis + ")";
    }
  }

  private static Rated rated(Contactor contactor) {
    if (contactor.thermalAmps().isPresent()) {
      return new Rated(contactor.thermalAmps().getAsDouble(), "thermal");
    }
    OptionalDouble rotor = contactor.rotorRatingAmps();
    if (rotor.isPresent()) {
      return new Rated(rotor.getAsDouble(), "rotor rating");
    }
    return contactor.ratings().entrySet().stream()
        .max(Map.Entry.comparingByValue(Comparator.naturalOrder()))
        .map(e -> new Rated(e.getValue(), e.getKey()))
        .orElse(null);
  }

  private static Check forGood(
      Facts facts, Contactor contactor, boolean line, Rated rated, DutyCurrent.Found running) {
    String tag = contactor.tag();
    if (running.amps() == 0.0) {
      return new Check(
          Double.POSITIVE_INFINITY,
          0.0,
          rated.amps(),
          "A",
          tag + " carries nothing for good: the last step's contactor has taken over.",
          Optional.empty());
    }
    String pole = line ? "" : ", " + PoleCurrent.words(contactor);
    String why =
        line
            ? ""
            : facts.starter().resistors().cutOut() == ResistorBank.CutOut.BRIDGING
                ? " Each contactor of a bridging bank stays in circuit."
                : " It is the last one and makes the star point while running.";
    Check check =
        Check.ofAmps(
            running.amps(),
            rated.amps(),
            tag
                + " carries up to "
                + Show.amps(running.amps())
                + " for good"
                + pole
                + "; it is rated "
                + rated.words()
                + "."
                + why);
    return running.start().map(check::at).orElse(check);
  }

  private static void overTheDuty(
      Facts facts,
      Contactor contactor,
      Rated rated,
      DutyCurrent duty,
      List<Check> checks,
      List<String> missing) {
    DutyCurrent.Found rms = duty.rms().orElseThrow();
    boolean known = facts.starter().duty().startsPerHour().isPresent();
    if (!known && rated.amps() < rms.amps()) {
      missing.add("duty.starts.per-hour");
      return;
    }
    checks.add(
        Check.ofAmps(
                rms.amps(),
                rated.amps(),
                "RMS "
                    + duty.words()
                    + " "
                    + contactor.tag()
                    + " carries "
                    + Show.amps(rms.amps())
                    + " of "
                    + rated.words()
                    + ".")
            .at(rms.start().orElseThrow()));
  }

  private static void inAStart(
      Facts facts,
      Contactor contactor,
      Rated rated,
      DutyCurrent.Found greatest,
      List<Check> checks,
      List<String> missing) {
    if (greatest.amps() <= rated.amps()) {
      return;
    }
    Optional<ShortTime> withstand = TenSecondWithstand.of(contactor, facts.practice());
    if (withstand.isEmpty()) {
      missing.add("contactors." + contactor.tag() + ".short-time");
      return;
    }
    ComputedStart worst = null;
    double use = 0.0;
    for (ComputedStart start : facts.permitted().toList()) {
      PartResponse part = start.part(contactor.tag()).orElseThrow();
      if (part.missing().isPresent()) {
        missing.add(part.missing().get());
        return;
      }
      double there = part.use();
      if (worst == null || there > use) {
        use = there;
        worst = start;
      }
    }
    Check check =
        new Check(
            1.0 / use,
            use * withstand.get().jouleIntegral(),
            withstand.get().jouleIntegral(),
            "A²s",
            "With up to "
                + Show.amps(greatest.amps())
                + " a pole it comes to "
                + Show.percent(use)
                + " of its withstand of "
                + TenSecondWithstand.words(withstand.get())
                + " ("
                + worst.words()
                + ").",
            Optional.of(worst));
    checks.add(check);
  }
}
