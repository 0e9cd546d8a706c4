package sliprung.rulebook.shortcircuit;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import sliprung.protection.DeviceResponse;
import sliprung.protection.Edge;
import sliprung.quantity.Show;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.FindingBuilder;
import sliprung.rulebook.MotorTable;
import sliprung.rulebook.Rule;
import sliprung.rulebook.contactor.ShortCircuitDevices;
import sliprung.starter.Contactor;
import sliprung.starter.Device;
import sliprung.starter.Starter;

/**
 * {@code short-circuit/rating}: the short-circuit device rides through the start and is no greater
 * than allowed.
 *
 * <p>Under {@code nec} the limit is the wound-rotor row of NFPA 70 430.52. Margin: the most that
 * Exception 2 allows over the rating or setting, wanted the same over what the table and Exception
 * 1 allow: in between it is tight. Under {@code iec} the rating is that of the declared
 * coordination. Margin: current margin in the permitted starts; without a declaration at best
 * tight.
 */
public final class TheShortCircuitDeviceIsRatedAsAllowed implements Rule {
  private static final Info INFO =
      new Info(
          "short-circuit/rating",
          "Is the short-circuit device rated as allowed?",
          "NFPA 70 430.52, wound rotor; IEC 60947-4-1 8.2.5 for the declared coordination",
          List.of("motor", "contactors", "protection.{subject}"));

  @Override
  public Info info() {
    return INFO;
  }

  @Override
  public Answer judge(Facts facts) {
    boolean nec = facts.starter().practice() == Starter.Practice.NEC;
    List<Finding> findings = new ArrayList<>();
    for (Device device : ShortCircuitDevices.of(facts.starter()).devices()) {
      FindingBuilder builder = FindingBuilder.of(facts, INFO, device.tag());
      findings.add(nec ? nec(facts, builder, device) : iec(facts, builder, device));
    }
    return Answer.of(findings, "no short-circuit device is described in the stator line");
  }

  private static Finding nec(Facts facts, FindingBuilder builder, Device device) {
    double greatest = facts.practice().figure("nec.greatest-voltage").value();
    if (facts.starter().supply().voltage() > greatest) {
      return builder.notJudged(
          List.of(),
          "Above "
              + Show.volts(greatest)
              + " NFPA 70 430.52 does not apply; 430.227 gives no percentage.");
    }
    MotorTable table = MotorTable.of(facts);
    Optional<CodeLimit> limit = CodeLimit.of(device, table.amps(), facts.practice());
    if (limit.isEmpty()) {
      return builder.notJudged(List.of(), "NFPA 70 430.52 has no row for such a device.");
    }
    CodeLimit code = limit.get();
    double setting = setting(device);
    double margin = code.exceptionAmps() / setting;
    double wanted = code.exceptionAmps() / code.allowedAmps();
    boolean within = setting <= code.allowedAmps() * (1.0 + 1e-9);
    return builder
        .margin(within ? Math.max(margin, wanted) : margin)
        .wanted(wanted)
        .figures(setting, margin < 1.0 ? code.exceptionAmps() : code.allowedAmps(), "A")
        .reference("NFPA 70 430.52(C)(1), wound rotor, and 240.6(A)")
        .says(
            device.tag()
                + " is rated or set "
                + Show.amps(setting)
                + ". For a wound-rotor motor of "
                + Show.amps(table.amps())
                + " ("
                + table.words()
                + ") "
                + Show.percent(code.share())
                + " is allowed as "
                + code.kind()
                + ", "
                + Show.amps(code.allowedAmps())
                + (code.kind().startsWith("instantaneous") ? "" : " with the next standard size")
                + "; where it will not start otherwise up to "
                + Show.amps(code.exceptionAmps())
                + ".")
        .mend(
            within
                ? ""
                : "Take "
                    + Show.amps(code.allowedAmps())
                    + " or less, or keep the proof that it does not start otherwise.")
        .byMargin();
  }

  /** Rated current of a fuse or breaker, pick-up of a relay that opens one, A. */
  private static double setting(Device device) {
    return device.fold(new SettingAmps());
  }

  private static Finding iec(Facts facts, FindingBuilder builder, Device device) {
    Optional<ComputedStart> nearest = ComputedStart.nearest(facts.permitted(), device.tag());
    if (nearest.isEmpty()) {
      return builder.notJudged(
          List.of(), "How near a permitted start comes to operating it is not known.");
    }
    double margin = margin(nearest.get(), device.tag()).getAsDouble();
    Optional<Contactor> declared =
        facts.starter().lineContactors().stream()
            .filter(
                c ->
                    c.coordination()
                        .filter(
                            d ->
                                d.with().equals(device.tag())
                                    || device.trips().filter(d.with()::equals).isPresent())
                        .isPresent())
            .findFirst();
    String rides =
        device.tag()
            + " rides through the permitted starts at up to "
            + Show.ratio(margin)
            + " times their current ("
            + nearest.get().words()
            + ").";
    builder
        .at(nearest.get())
        .edge(Edge.FAST)
        .margin(margin)
        .reference("IEC 60947-4-1 8.2.5, declared coordination");
    boolean thin = margin < facts.wanted(INFO.name());
    if (declared.isPresent() || inOtherCombination(facts, device)) {
      return builder
          .says(
              rides
                  + (declared.isPresent()
                      ? " It is the device of the coordination declared for "
                          + declared.get().tag()
                          + "."
                      : " The declared coordination is with another device in series."))
          .mend(thin ? "Take a greater rating of the same declared table, or a slower one." : "")
          .byMargin();
    }
    return builder
        .says(
            rides
                + " No coordination is declared, so that nothing says up to which rating it"
                + " protects the contactor.")
        .mend(
            "Declare the tested combination: "
                + facts.starter().lineContactors().stream()
                    .map(c -> "contactors." + c.tag() + ".coordination")
                    .reduce((a, b) -> a + ", " + b)
                    .orElse("contactors")
                + ".")
        .byMarginAtBestTight();
  }

  /** Whether every line contactor is declared with some other short-circuit device in series. */
  private static boolean inOtherCombination(Facts facts, Device device) {
    ShortCircuitDevices devices = ShortCircuitDevices.of(facts.starter());
    return !facts.starter().lineContactors().isEmpty()
        && facts.starter().lineContactors().stream()
            .allMatch(
                c ->
                    c.coordination()
                        .filter(d -> devices.has(d.with()) && !d.with().equals(device.tag()))
                        .isPresent());
  }

  private static OptionalDouble margin(ComputedStart start, String tag) {
    return start
        .device(tag, Edge.FAST)
        .map(DeviceResponse::currentMargin)
        .orElse(OptionalDouble.empty());
  }
}
