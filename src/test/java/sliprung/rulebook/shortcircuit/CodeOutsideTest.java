package sliprung.rulebook.shortcircuit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;
import sliprung.fixture.CrusherFacts;
import sliprung.outside.OutsideTable;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.MotorTable;
import sliprung.rulebook.Practice;
import sliprung.rulebook.Verdict;
import sliprung.starter.Device;

/** Motor circuits of NFPA 70, and two fuses in series by IEC 60269-1. */
@Tag("outside")
class CodeOutsideTest {
  private static final Practice NEC = Practice.named("nec");

  @TestFactory
  Stream<DynamicTest> figures_of_nfpa_70() {
    return OutsideTable.read("motor-circuits-nec")
        .tests(
            row ->
                assertThat(value(row))
                    .isCloseTo(row.number("expected"), within(row.number("tolerance"))));
  }

  private static double value(OutsideTable.Row row) {
    return switch (row.text("quantity")) {
      case "table" -> MotorTable.of(motor(row.number("horsepower"), row.number("volts"))).amps();
      case "conductor" -> NEC.figure("430.22.continuous").value() * row.number("amps");
      case "fuse-share" ->
          limit(row, "  F1: {kind: fuse, class: gG, rating: 250 A}\n").share() * row.number("amps");
      case "fuse" -> limit(row, "  F1: {kind: fuse, class: gG, rating: 250 A}\n").allowedAmps();
      case "fuse-exception" ->
          limit(row, "  F1: {kind: fuse, class: gG, rating: 250 A}\n").exceptionAmps();
      case "breaker-exception" ->
          limit(row, "  F1: {kind: definite-time, pick-up: 300 A, time: 1 s, trips: Q1}\n")
              .exceptionAmps();
      case "instantaneous" ->
          limit(row, "  F1: {kind: instantaneous, pick-up: 900 A, trips: Q1}\n").allowedAmps();
      default ->
          NEC.figure("430.23." + row.text("quantity").replace(' ', '-')).value()
              * row.number("amps");
    };
  }

  private static CodeLimit limit(OutsideTable.Row row, String device) {
    Device f1 =
        CrusherFacts.starter("  F1: {kind: fuse, class: gG, rating: 250 A}\n", device)
            .device("F1")
            .orElseThrow();
    return CodeLimit.of(f1, row.number("amps"), NEC).orElseThrow();
  }

  /** A four-pole motor of that power; its other figures play no part. */
  private static Facts motor(double horsepower, double volts) {
    return CrusherFacts.bare(
        "practice: iec",
        "practice: nec",
        "690 V\n  frequency: 50 Hz",
        volts + " V\n  frequency: 50 Hz",
        "power: 200 kW",
        "power: " + horsepower + " hp");
  }

  /** IEC 60269-1: gG 100 A over gG 63 A, two steps of the series apart, is selective. */
  @Test
  void a_hundred_over_sixty_three_is_selective() {
    Finding finding =
        CrusherFacts.finding(
            new TheUpstreamFuseStaysWhole(),
            CrusherFacts.bare(
                "  F1: {kind: fuse, class: gG, rating: 250 A}\n",
                "  F0: {kind: fuse, class: gG, rating: 100 A}\n"
                    + "  F1: {kind: fuse, class: gG, rating: 63 A}\n"),
            "F0");

    assertThat(finding.verdict()).isEqualTo(Verdict.CLEAR);
  }

  /** NFPA 70 430.6: a motor built for less than 1200 rpm goes by its plate. */
  @Test
  void a_slow_motor_goes_by_its_plate() {
    Facts slow =
        CrusherFacts.bare("practice: iec", "practice: nec", "speed: 1478 rpm", "speed: 735 rpm");

    assertThat(MotorTable.of(slow).amps()).isEqualTo(208);
    assertThat(MotorTable.of(slow).words()).contains("1\u00a0200 rpm");
  }
}
