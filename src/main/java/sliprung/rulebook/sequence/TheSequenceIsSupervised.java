package sliprung.rulebook.sequence;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import sliprung.protection.DeviceResponse;
import sliprung.protection.Edge;
import sliprung.quantity.Show;
import sliprung.rulebook.BreakingCapacity;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Exposure;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.FindingBuilder;
import sliprung.rulebook.Rule;
import sliprung.rulebook.Verdict;
import sliprung.runup.Scenario;
import sliprung.starter.Device;

/**
 * {@code sequence/supervision}: a sequence timer exists wherever a step can be held unseen; its own
 * stop event in the slowest permitted start precedes its shortest time; its longest time with trip
 * and opening precedes the earliest limit of the faults that it is the one to clear.
 */
public final class TheSequenceIsSupervised implements Rule {
  private static final Info INFO =
      new Info(
          "sequence/supervision",
          "Is every held step supervised, by a timer that lets every good start pass and clears every"
              + " failed one that nothing else clears?",
          "common practice (device function 48)",
          List.of(
              "supply.band",
              "motor",
              "load",
              "resistors.connection",
              "resistors.cut-out",
              "resistors.sections",
              "resistors.same-limit",
              "resistors.permanent",
              "resistors.leads",
              "resistors.tolerance",
              "resistors.hot-rise",
              "steps",
              "timer-spread",
              "protection"));

  private static final Comparator<Exposure> EARLIEST =
      Comparator.comparingDouble(Exposure::clearingRatio)
          .thenComparingDouble(Exposure::limitAtSeconds);

  @Override
  public Info info() {
    return INFO;
  }

  @Override
  public Answer judge(Facts facts) {
    List<Device.SequenceTimer> timers = new ArrayList<>();
    for (Device device : facts.starter().protection()) {
      if (device instanceof Device.SequenceTimer timer) {
        timers.add(timer);
      }
    }
    if (timers.isEmpty()) {
      return new Answer.Findings(List.of(withoutTimer(facts)));
    }
    return new Answer.Findings(timers.stream().map(t -> judge(facts, t)).toList());
  }

  private static List<ComputedStart> failed(Facts facts) {
    return facts.starts().stream()
        .filter(
            s ->
                s.scenario().kind() == Scenario.Kind.HELD
                    || s.scenario().kind() == Scenario.Kind.LOCKED
                    || s.scenario().kind() == Scenario.Kind.LOCKED_STEP)
        .toList();
  }

  private static Finding withoutTimer(Facts facts) {
    FindingBuilder builder = FindingBuilder.of(facts, INFO, "sequence timer");
    double wanted = facts.wanted("held/exposure");
    Exposure worst = null;
    for (ComputedStart start : facts.faults(Scenario.Kind.HELD).toList()) {
      Exposure exposure = Exposure.of(facts, start);
      if (!exposure.missing().isEmpty()) {
        return builder
            .at(start)
            .notJudged(
                exposure.missing(),
                "No sequence timer is fitted, and what a held step heats is not known.");
      }
      if (worst == null || EARLIEST.compare(exposure, worst) < 0) {
        worst = exposure;
      }
    }
    builder.at(worst.start()).figures(worst.clearedAtSeconds(), worst.limitAtSeconds(), "s");
    String start = "No sequence timer is fitted. " + sentence(worst);
    if (worst.clearingRatio() < wanted) {
      return builder
          .says(start)
          .mend(
              "Fit one that waits for the last step and opens the line contactor before "
                  + Show.seconds(worst.limitAtSeconds())
                  + ".")
          .build(worst.clearingRatio() < 1.0 ? Verdict.BREACH : Verdict.TIGHT);
    }
    boolean unseen =
        facts.faults(Scenario.Kind.HELD).anyMatch(s -> Exposure.of(facts, s).clearing().isEmpty());
    return builder
        .says(
            unseen
                ? "No sequence timer is fitted: a held step goes unseen, though no part reaches its"
                    + " limit within 30 min."
                : start + " Other devices clear every held step in time.")
        .mend(unseen ? "Fit one that waits for the last step." : "")
        .build(unseen ? Verdict.TIGHT : Verdict.CLEAR);
  }

  private static String sentence(Exposure exposure) {
    String words = exposure.start().scenario().words();
    return Character.toUpperCase(words.charAt(0))
        + words.substring(1)
        + ": "
        + exposure.clause()
        + ".";
  }

  private static Finding judge(Facts facts, Device.SequenceTimer timer) {
    FindingBuilder builder = FindingBuilder.of(facts, INFO, timer.tag());
    Optional<ComputedStart> hangs =
        facts.permitted().filter(s -> !stops(facts, s, timer)).findFirst();
    if (hangs.isPresent()) {
      return neverStopped(builder, timer, hangs.get());
    }
    double spread = facts.starter().timerSpread();
    ComputedStart slowest =
        facts.permitted().max(Comparator.comparingDouble(s -> share(s, timer))).orElseThrow();
    double stop = share(slowest, timer) * timer.seconds() * (1.0 - spread);
    double low = 1.0 / share(slowest, timer);
    double wanted = facts.wanted(INFO.name());
    double shortest = stop * wanted / (1.0 - spread);

    Optional<Exposure> earliest = earliestOwn(facts, timer);
    for (ComputedStart start : failed(facts)) {
      List<String> missing = Exposure.of(facts, start).missing();
      if (!missing.isEmpty()) {
        return builder
            .at(start)
            .notJudged(
                missing,
                "What a failed start heats is not known, so "
                    + timer.tag()
                    + " has no latest time.");
      }
    }
    if (earliest.isEmpty()) {
      return builder
          .at(slowest)
          .edge(Edge.FAST)
          .margin(low)
          .figures(stop, timer.seconds() * (1.0 - spread), "s")
          .says(
              stopSentence(timer, stop)
                  + " No failed start depends on it. Its window begins at "
                  + Show.seconds(shortest)
                  + " and has no end.")
          .mend(low < wanted ? "Set it to " + Show.seconds(shortest) + " or more." : "")
          .byMargin();
    }
    Exposure own = earliest.get();
    Exposure alone = Exposure.of(facts, own.start(), allBut(facts, timer));
    if (alone.clearing().isEmpty()) {
      return clearsNothing(builder, facts, timer, own, alone);
    }
    double opening =
        timer.trips().map(t -> facts.starter().openingSeconds(t).orElse(0.0)).orElse(0.0);
    double clears = timer.seconds() * (1.0 + spread) + opening;
    double high = own.limitAtSeconds() / clears;
    double longest = (own.limitAtSeconds() / wanted - opening) / (1.0 + spread);
    String window =
        shortest <= longest
            ? "Its window is " + Show.seconds(shortest) + " to " + Show.seconds(longest) + "."
            : "It has no window: it may not be set under "
                + Show.seconds(shortest)
                + " nor over "
                + Show.seconds(longest)
                + ".";
    boolean lowDecides = low <= high;
    return builder
        .at(lowDecides ? slowest : own.start())
        .edge(lowDecides ? Edge.FAST : Edge.SLOW)
        .margin(Math.min(low, high))
        .figures(
            lowDecides ? stop : clears,
            lowDecides ? timer.seconds() * (1.0 - spread) : own.limitAtSeconds(),
            "s")
        .says(
            stopSentence(timer, stop)
                + " "
                + sentence(own)
                + " "
                + timer.tag()
                + " alone opens at "
                + Show.seconds(clears)
                + " at the latest. "
                + window)
        .mend(
            Math.min(low, high) < wanted
                ? shortest <= longest
                    ? "Set it inside its window."
                    : "Shorten the start or strengthen the part that reaches its limit first."
                : "")
        .byMargin();
  }

  private static List<String> allBut(Facts facts, Device.SequenceTimer timer) {
    return facts.starter().protection().stream()
        .map(Device::tag)
        .filter(tag -> !tag.equals(timer.tag()))
        .toList();
  }

  /**
   * The timer elapses, but what it opens does not end the start, or nothing proves that it does.
   */
  private static Finding clearsNothing(
      FindingBuilder builder,
      Facts facts,
      Device.SequenceTimer timer,
      Exposure own,
      Exposure alone) {
    builder.at(own.start()).edge(Edge.SLOW);
    String opens = timer.trips().orElse("nothing");
    if (alone.unproven().isPresent()) {
      return builder
          .mend("Give what " + opens + " is proven to break.")
          .notJudged(
              List.of(BreakingCapacity.missingPath(facts, opens)),
              sentence(own) + " Nothing proves that " + opens + " breaks this current.");
    }
    return builder
        .margin(0.0)
        .says(sentence(own) + " " + timer.tag() + " opens " + opens + ", which clears nothing.")
        .mend("Let it open the line contactor or a breaker that breaks this current.")
        .byMargin();
  }

  /** A permitted start that never meets what the timer waits for: no time is long enough. */
  private static Finding neverStopped(
      FindingBuilder builder, Device.SequenceTimer timer, ComputedStart start) {
    return builder
        .at(start)
        .edge(Edge.FAST)
        .margin(0.0)
        .says(
            "The stop event of "
                + timer.tag()
                + " never comes in a "
                + start.words()
                + ": "
                + (timer.untilSpeedShare().isPresent()
                    ? "the motor does not reach "
                        + Show.percent(timer.untilSpeedShare().getAsDouble())
                        + " of synchronous speed"
                    : "the last step never closes")
                + ". "
                + timer.tag()
                + " trips after its "
                + Show.seconds(timer.seconds())
                + ", and no longer time helps.")
        .mend("Mend the start first: sequence/pull-through says where it hangs.")
        .byMargin();
  }

  /** Whether a permitted start ever meets what a timer waits for. */
  private static boolean stops(Facts facts, ComputedStart start, Device.SequenceTimer timer) {
    if (timer.untilSpeedShare().isEmpty()) {
      return start.history().lastClosingSeconds().isPresent();
    }
    double speed = timer.untilSpeedShare().getAsDouble() * facts.machine().synchronousSpeed();
    return start.history().everything().stream()
        .anyMatch(s -> Arrays.stream(s.trace().speed()).anyMatch(w -> w >= speed));
  }

  private static String stopSentence(Device.SequenceTimer timer, double stop) {
    return "The slowest permitted start stops "
        + timer.tag()
        + " after "
        + Show.seconds(stop)
        + "; it is set to "
        + Show.seconds(timer.seconds())
        + ".";
  }

  /** Elapsed over set, shortest time, in a permitted start. */
  private static double share(ComputedStart start, Device.SequenceTimer timer) {
    DeviceResponse response = start.device(timer.tag(), Edge.FAST).orElseThrow();
    return response.use();
  }

  /** The earliest limit among the failed starts that nothing but this timer clears in time. */
  private static Optional<Exposure> earliestOwn(Facts facts, Device.SequenceTimer timer) {
    return failed(facts).stream()
        .filter(s -> s.device(timer.tag(), Edge.SLOW).map(DeviceResponse::operates).orElse(false))
        .map(s -> Exposure.of(facts, s, List.of(timer.tag())))
        .filter(e -> Double.isFinite(e.limitAtSeconds()) && e.clearingRatio() < 1.0)
        .min(Comparator.comparingDouble(Exposure::limitAtSeconds));
  }
}
