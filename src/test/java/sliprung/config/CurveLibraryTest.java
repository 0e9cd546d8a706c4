package sliprung.config;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.stream.DoubleStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import sliprung.curve.AmGates;
import sliprung.curve.CurveLibrary;
import sliprung.curve.FuseGates;
import sliprung.curve.TripClass;
import sliprung.outside.OutsideTable;

/** The shipped laws and gates against the published figures. */
class CurveLibraryTest {
  private static final CurveLibrary LIBRARY = CurveLibraryReader.builtIn();
  private static final GgTables GG = CurveLibraryReader.ggTables();

  @TestFactory
  @Tag("outside")
  Stream<DynamicTest> the_library_holds_the_published_figures() {
    return OutsideTable.read("curve-library")
        .tests(
            row -> {
              double[] expected =
                  Arrays.stream(row.text("expected").split(" "))
                      .mapToDouble(Double::parseDouble)
                      .toArray();
              assertThat(shipped(row.text("quantity"), row.text("inputs")))
                  .as(row.text("source"))
                  .containsExactly(expected, within(row.number("tolerance")));
            });
  }

  /** Row 72 of the collection: every rating's upper 0.1 s gate is the lower one two ratings up. */
  @TestFactory
  @Tag("outside")
  Stream<DynamicTest> the_gates_make_a_ladder_two_ratings_up() {
    List<FuseGates> gates = new ArrayList<>(LIBRARY.gg().values());
    assertThat(gates).hasSize(20);
    return Stream.iterate(0, i -> i + 1)
        .limit(18)
        .map(
            i ->
                DynamicTest.dynamicTest(
                    "72: IEC 60269-1 table 3, from memory: " + gates.get(i).ratingAmps() + " A",
                    () ->
                        assertThat(gates.get(i).within100msAmps())
                            .isEqualTo(gates.get(i + 2).notIn100msAmps())));
  }

  private static double[] shipped(String quantity, String input) {
    return switch (quantity) {
      case "reset seconds" ->
          new double[] {
            LIBRARY.inverseLaw(input).orElseThrow().fullResetSeconds(0.0, 1.0).getAsDouble()
          };
      case "trip range" -> {
        TripClass tripClass = LIBRARY.tripClass(input).orElseThrow();
        assertThat(tripClass.multiple()).isEqualTo(7.2);
        yield new double[] {tripClass.shortestSeconds().getAsDouble(), tripClass.longestSeconds()};
      }
      case "warm limit" ->
          new double[] {LIBRARY.tripClass(input).orElseThrow().warmLimitSeconds().getAsDouble()};
      case "longest at multiple" -> {
        TripClass tripClass = LIBRARY.tripClass(input).orElseThrow();
        yield new double[] {tripClass.multiple(), tripClass.longestSeconds()};
      }
      case "pre-arcing" -> {
        FuseGates gates = LIBRARY.ggGates(Double.parseDouble(input)).orElseThrow();
        yield new double[] {gates.leastPreArcing(), gates.greatestPreArcing()};
      }
      case "gates" -> {
        GgTables.Gates gates = GG.gates().get(Double.parseDouble(input));
        yield new double[] {gates.notIn10s(), gates.in5s(), gates.notIn100ms(), gates.in100ms()};
      }
      case "conventional" -> {
        GgTables.Conventional row = GG.conventionalOf(Double.parseDouble(input)).orElseThrow();
        yield new double[] {row.nonFusing(), row.fusing(), row.seconds()};
      }
      case "conventional amperes" -> {
        FuseGates gates = LIBRARY.ggGates(Double.parseDouble(input)).orElseThrow();
        yield new double[] {gates.nonFusingAmps(), gates.fusingAmps(), gates.conventionalSeconds()};
      }
      case "am not before" -> flat(LIBRARY.am().notBefore(), Double.parseDouble(input));
      case "am cleared" -> flat(LIBRARY.am().cleared(), Double.parseDouble(input));
      default -> throw new IllegalArgumentException(quantity);
    };
  }

  private static double[] flat(List<AmGates.Gate> gates, double rating) {
    return gates.stream()
        .flatMapToDouble(g -> DoubleStream.of(g.multiple() * rating, g.seconds()))
        .toArray();
  }

  /** Constants as published; their times at constant current are checked with the law itself. */
  @ParameterizedTest
  @CsvSource({
    "iec-standard-inverse, 0.14, 0.02, 0",
    "iec-very-inverse, 13.5, 1, 0",
    "iec-extremely-inverse, 80, 2, 0",
    "iec-long-time-inverse, 120, 1, 0",
    "iec-short-time-inverse, 0.05, 0.04, 0",
    "ieee-moderately-inverse, 0.0515, 0.02, 0.114",
    "ieee-very-inverse, 19.61, 2, 0.491",
    "ieee-extremely-inverse, 28.2, 2, 0.1217"
  })
  void inverse_laws_have_the_constants_of_their_standard(
      String name, double k, double alpha, double c) {
    var law = LIBRARY.inverseLaw(name).orElseThrow();
    assertThat(law.k()).isEqualTo(k);
    assertThat(law.alpha()).isEqualTo(alpha);
    assertThat(law.c()).isEqualTo(c);
    assertThat(law.mark()).isEqualTo("verified");
    assertThat(law.resetSeconds().isPresent()).isEqualTo(name.startsWith("ieee-"));
  }

  @Test
  void all_names_of_the_file_format_are_there() {
    assertThat(LIBRARY.inverse()).hasSize(8);
    assertThat(LIBRARY.tripClasses())
        .containsOnlyKeys(
            "2", "3", "5", "10A", "10", "20", "30", "40", "5E", "10E", "20E", "30E", "nema-10",
            "nema-20", "nema-30");
  }

  @Test
  void classes_without_a_shortest_time_have_none() {
    for (String name : List.of("2", "3", "nema-10", "nema-20", "nema-30")) {
      assertThat(LIBRARY.tripClass(name).orElseThrow().shortestSeconds()).as(name).isEmpty();
    }
    assertThat(LIBRARY.tripClass("nema-30").orElseThrow().warmLimitSeconds()).isEmpty();
    assertThat(LIBRARY.tripClass("10E").orElseThrow().shortestSeconds()).hasValue(5);
    assertThat(LIBRARY.tripClass("5E").orElseThrow().warmLimitSeconds()).hasValue(120);
  }

  @Test
  void a_rating_that_one_table_lacks_is_not_offered() {
    assertThat(LIBRARY.ggGates(10)).isEmpty();
    assertThat(LIBRARY.ggGates(35)).isEmpty();
    assertThat(LIBRARY.ggGates(16)).isPresent();
  }

  @Test
  void the_weaker_mark_holds_and_the_reference_tells_them_apart() {
    FuseGates gates = LIBRARY.ggGates(100).orElseThrow();
    assertThat(gates.mark()).isEqualTo("from memory");
    assertThat(gates.reference())
        .isEqualTo(
            "IEC 60269-1 table 3 (from memory); IEC 60269-1 table 2 (from memory);"
                + " IEC 60269-1 table 7 (verified)");
    TripClass ten = LIBRARY.tripClass("10").orElseThrow();
    assertThat(ten.mark()).isEqualTo("from memory");
    assertThat(ten.reference()).contains("cold times (verified); warm limit (from memory)");
    assertThat(LIBRARY.tripClass("nema-20").orElseThrow().mark()).isEqualTo("verified");
  }

  @Test
  void the_list_of_files_is_the_folder() throws IOException {
    try (Stream<Path> files = Files.list(Path.of("curves"))) {
      assertThat(
              files.map(p -> p.getFileName().toString()).filter(n -> n.endsWith(".yaml")).sorted())
          .isEqualTo(CurveLibraryReader.fileNames());
    }
  }

  @Test
  void a_broken_shipped_file_is_a_defect() {
    SourceText broken =
        SourceText.of(
            "curves/x.yaml",
            "curves: 1\nstandard: S\nlaws:\n  - {name: n, title: t, k: 1 A, alpha: 1, c: 0 s,"
                + " clause: c, mark: verified}\n");
    assertThatThrownBy(() -> CurveLibraryReader.inverseLaws(broken))
        .isInstanceOf(IllegalStateException.class)
        .hasMessageContaining("curves/x.yaml:4:28")
        .hasMessageContaining("expected a time but found a current");
  }
}
