package sliprung.rulebook.conductor;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import sliprung.quantity.Show;
import sliprung.rulebook.Check;
import sliprung.rulebook.DutyCurrent;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.FindingBuilder;
import sliprung.rulebook.MotorTable;
import sliprung.rulebook.Rule;
import sliprung.starter.Starter;

/**
 * {@code conductor/ampacity}: the cables carry the running current for good and the RMS current of
 * the duty, and under {@code nec} what NFPA 70 430.22 and 430.23 ask.
 *
 * <p>Margin: ampacity over the greatest of these.
 */
public final class TheCablesCarryTheirCurrent implements Rule {
  private static final Info INFO =
      new Info(
          "conductor/ampacity",
          "Do the cables carry what they must for good?",
          "IEC 60364-5-52 (from memory); NFPA 70 430.22 and 430.23",
          List.of("supply.band", "motor", "load", "resistors", "duty", "conductors"));

  @Override
  public Info info() {
    return INFO;
  }

  @Override
  public Answer judge(Facts facts) {
    return new Answer.Findings(
        List.of(
            judge(facts, Cable.stator(facts.starter())),
            judge(facts, Cable.rotor(facts.starter()))));
  }

  private static Finding judge(Facts facts, Cable cable) {
    FindingBuilder builder = FindingBuilder.of(facts, INFO, cable.subject());
    OptionalDouble given = cable.conductor().map(c -> c.ampacity()).orElse(OptionalDouble.empty());
    if (given.isEmpty()) {
      return builder.notJudged(
          List.of(cable.path() + ".ampacity"),
          "What the " + cable.subject() + " carries for good is not given.");
    }
    double ampacity = given.getAsDouble();
    DutyCurrent duty = new DutyCurrent(facts, cable.ring(), in -> 1.0);
    Optional<DutyCurrent.Found> running = duty.forGood();
    Optional<DutyCurrent.Found> rms = duty.rms();
    if (running.isEmpty() || rms.isEmpty()) {
      return builder.notJudged(List.of(), "No permitted start and no running point was computed.");
    }
    List<Check> checks = new ArrayList<>();
    List<String> missing = new ArrayList<>();
    boolean nec = facts.starter().practice() == Starter.Practice.NEC;
    if (nec) {
      double greatest = facts.practice().figure("nec.greatest-voltage").value();
      if (facts.starter().supply().voltage() > greatest) {
        return builder.notJudged(
            List.of(),
            "Above "
                + Show.volts(greatest)
                + " part II of NFPA 70 article 430 does not apply, and 430.224 goes by the"
                + " overload's setting.");
      }
      byCode(facts, cable, ampacity, checks, missing);
    }
    checks.add(
        Check.ofAmps(
            running.get().amps(),
            ampacity,
            "The "
                + cable.subject()
                + " carries up to "
                + Show.amps(running.get().amps())
                + " for good, at the least voltage and greatest load; its ampacity is "
                + Show.amps(ampacity)
                + "."));
    boolean known = facts.starter().duty().startsPerHour().isPresent();
    if (known || rms.get().amps() <= ampacity) {
      checks.add(
          Check.ofAmps(
                  rms.get().amps(),
                  ampacity,
                  "RMS " + duty.words() + " it carries " + Show.amps(rms.get().amps()) + ".")
              .at(rms.get().start().orElseThrow()));
    } else {
      missing.add("duty.starts.per-hour");
    }
    Check.into(builder, checks);
    double margin = Check.thinnest(checks).margin();
    if (!missing.isEmpty() && margin >= 1.0) {
      return builder.notJudged(
          missing,
          "The "
              + cable.subject()
              + " carries up to "
              + Show.amps(running.get().amps())
              + " for good; what it must carry besides cannot be told.");
    }
    return builder
        .reference(nec ? "NFPA 70 430.22 and 430.23" : "IEC 60364-5-52 (from memory)")
        .mend(margin < facts.wanted(INFO.name()) ? "Take a greater cable." : "")
        .byMargin();
  }

  private static void byCode(
      Facts facts, Cable cable, double ampacity, List<Check> checks, List<String> missing) {
    double share = facts.practice().figure("430.22.continuous").value();
    if (!cable.ring()) {
      MotorTable table = MotorTable.of(facts);
      double asked = share * table.amps();
      checks.add(
          Check.ofAmps(
              asked,
              ampacity,
              "NFPA 70 430.22 asks "
                  + Show.amps(asked)
                  + ": "
                  + Show.percent(share)
                  + " of "
                  + Show.amps(table.amps())
                  + " ("
                  + table.words()
                  + "), for continuous duty, which is what a file that says nothing else means; "
                  + Show.amps(ampacity)
                  + " is there."));
      return;
    }
    OptionalDouble secondary = facts.starter().motor().rotorCurrent();
    if (secondary.isEmpty()) {
      missing.add("motor.rotor-current");
      return;
    }
    double asked = share * secondary.getAsDouble();
    checks.add(
        Check.ofAmps(
            asked,
            ampacity,
            "NFPA 70 430.23(A) asks "
                + Show.amps(asked)
                + ": "
                + Show.percent(share)
                + " of the secondary "
                + Show.amps(secondary.getAsDouble())
                + "; "
                + Show.amps(ampacity)
                + " is there."
                + leads(facts, secondary.getAsDouble())));
  }

  private static String leads(Facts facts, double secondaryAmps) {
    return ResistorLeads.nearest(facts)
        .map(
            row ->
                " To a separate bank 430.23(C) asks "
                    + Show.amps(row.share() * secondaryAmps)
                    + " ("
                    + Show.percent(row.share())
                    + ", "
                    + row.duty()
                    + ").")
        .orElse("");
  }
}
