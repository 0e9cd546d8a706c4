package sliprung.rulebook.overload;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;
import sliprung.fixture.CrusherFacts;
import sliprung.outside.OutsideTable;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Verdict;

/** Overload dials against NFPA 70 and against common practice. */
@Tag("outside")
class DialOutsideTest {

  private static Finding nec(double amps, double serviceFactor, String relay) {
    return CrusherFacts.finding(
        new TheDialFitsTheMotor(),
        CrusherFacts.bare(
            "practice: iec",
            "practice: nec",
            "  current: 208 A",
            "  current: " + amps + " A",
            "service-factor: 1.0",
            "service-factor: " + serviceFactor,
            "class: 10, dial: 208 A",
            relay),
        "F2");
  }

  @TestFactory
  Stream<DynamicTest> limit_and_cap_of_nfpa_70() {
    return OutsideTable.read("overload-nec")
        .tests(
            row -> {
              double amps = row.number("full_load_amps");
              double factor = row.number("service_factor");
              String trips = "class: 10, dial-means: ultimate-trip, dial: ";
              // between the two it is held against the normal limit, beyond both against the cap
              Finding between = nec(amps, factor, trips + (row.number("normal_amps") + 5.0) + " A");
              Finding beyond = nec(amps, factor, trips + (row.number("cap_amps") + 5.0) + " A");

              assertThat(between.verdict()).isEqualTo(Verdict.TIGHT);
              assertThat(between.limit().getAsDouble())
                  .isCloseTo(row.number("normal_amps"), within(row.number("tolerance")));
              assertThat(beyond.verdict()).isEqualTo(Verdict.BREACH);
              assertThat(beyond.limit().getAsDouble())
                  .isCloseTo(row.number("cap_amps"), within(row.number("tolerance")));
            });
  }

  /** Common practice: a dial with 25 % built in is set to about 90 % where no service factor is. */
  @Test
  void ninety_per_cent_on_such_a_dial_stays_within_115_per_cent() {
    Finding ninety = nec(118, 1.0, "class: nema-20, dial: " + 0.90 * 118 + " A");
    Finding full = nec(118, 1.0, "class: nema-20, dial: 118 A");

    assertThat(ninety.margin().getAsDouble()).isGreaterThan(ninety.wanted().getAsDouble());
    assertThat(full.margin().getAsDouble()).isLessThan(full.wanted().getAsDouble());
  }

  /** Common practice: entering 125 % on a dial that adds 25 % itself trips at 156 %. */
  @Test
  void a_quarter_on_top_of_a_quarter_is_over_every_cap() {
    Finding finding = nec(118, 1.15, "class: nema-20, dial: " + 1.25 * 118 + " A");

    assertThat(finding.value().getAsDouble() / 118).isCloseTo(1.5625, within(1e-9));
    assertThat(finding.verdict()).isEqualTo(Verdict.BREACH);
  }
}
