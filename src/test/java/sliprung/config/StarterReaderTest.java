package sliprung.config;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import sliprung.starter.Assumption;
import sliprung.starter.Breaker;
import sliprung.starter.Conductor;
import sliprung.starter.Contactor;
import sliprung.starter.Device;
import sliprung.starter.Duty;
import sliprung.starter.EvidenceGrade;
import sliprung.starter.Interlocks;
import sliprung.starter.Limits;
import sliprung.starter.Motor;
import sliprung.starter.ResistorBank;
import sliprung.starter.ShortTime;
import sliprung.starter.Starter;
import sliprung.starter.Step;
import sliprung.starter.Supply;
import sliprung.starter.TorqueCurve;

/** The whole example of the file format, field by field. */
class StarterReaderTest {
  private static final Path EXAMPLE = Path.of("src/test/resources/starters/jaw-crusher.yaml");
  private static final StarterReading.Described READ =
      StarterFiles.READER.read(EXAMPLE).described().orElseThrow();
  private static final Starter STARTER = READ.starter();

  static Stream<Path> soundFiles() throws IOException {
    try (Stream<Path> ours = Files.list(Path.of("src/test/resources/starters"));
        Stream<Path> reference = Files.list(Path.of("src/test/resources/reference-starters"));
        Stream<Path> configs = Files.list(Path.of("configs"))) {
      return Stream.of(ours, reference, configs)
          .flatMap(s -> s)
          .filter(p -> p.toString().endsWith(".yaml"))
          .sorted()
          .toList()
          .stream();
    }
  }

  @ParameterizedTest
  @MethodSource("soundFiles")
  void sound_files_are_read_without_a_mistake(Path file) {
    assertThat(StarterFiles.READER.read(file).diagnostics()).isEmpty();
  }

  @Test
  void the_supply_is_read() {
    assertThat(STARTER.name()).isEqualTo("JC-1 primary jaw crusher");
    assertThat(STARTER.practice()).isEqualTo(Starter.Practice.IEC);
    assertThat(STARTER.supply())
        .isEqualTo(
            new Supply(690, 50, -0.1, 0.1, OptionalDouble.of(18_000), OptionalDouble.of(9_000)));
  }

  @Test
  void the_plate_is_read() {
    assertThat(STARTER.motor())
        .isEqualTo(
            new Motor(
                690,
                50,
                200_000,
                208,
                1478,
                OptionalDouble.of(0.86),
                OptionalDouble.of(0.945),
                OptionalDouble.of(1.0),
                OptionalDouble.of(420),
                OptionalDouble.of(285),
                OptionalDouble.of(2.8),
                OptionalDouble.empty(),
                6,
                OptionalDouble.of(20),
                OptionalDouble.of(14),
                OptionalDouble.of(1800),
                OptionalDouble.of(5400),
                Optional.of(new ShortTime(600, 15)),
                Optional.empty()));
  }

  @Test
  void the_load_is_read() {
    assertThat(STARTER.load().inertia()).isEqualTo(70);
    assertThat(STARTER.load().breakawayTorque()).hasValue(700);
    assertThat(STARTER.load().torque())
        .isEqualTo(new TorqueCurve.Table(new double[] {0, 0.3, 1}, new double[] {250, 300, 450}));
    assertThat(STARTER.load().runningShare()).isEqualTo(0.7);
    assertThat(STARTER.load().spreadLow()).isEqualTo(-0.2);
    assertThat(STARTER.load().spreadHigh()).isEqualTo(0.2);
    assertThat(STARTER.load().active()).isFalse();
    assertThat(STARTER.load().brakeSeconds()).isZero();
  }

  @Test
  void the_bank_and_its_steps_are_read() {
    ResistorBank bank = STARTER.resistors();
    assertThat(bank.connection()).isEqualTo(ResistorBank.Connection.STAR);
    assertThat(bank.cutOut()).isEqualTo(ResistorBank.CutOut.STAR_POINT);
    assertThat(bank.sections()).hasSize(5);
    assertThat(bank.sections().get(0))
        .isEqualTo(
            new ResistorBank.Section(
                0.1845,
                OptionalDouble.of(130),
                Optional.of(new ShortTime(600, 15)),
                OptionalDouble.empty(),
                OptionalDouble.empty()));
    assertThat(bank.sameLimit()).isTrue();
    assertThat(bank.tolerance()).isEqualTo(0.1);
    assertThat(bank.hotRise()).isEqualTo(0.2);
    assertThat(bank.enclosureSeconds()).isEqualTo(1200);
    assertThat(STARTER.steps())
        .containsExactly(
            new Step("K11", new Step.After(4.2), 0),
            new Step("K12", new Step.After(2.4), 0),
            new Step("K13", new Step.After(1.4), 0),
            new Step("K14", new Step.After(0.9), 0),
            new Step("K15", new Step.After(0.7), 0));
    assertThat(STARTER.sequence()).isEqualTo(Starter.Sequence.CHAINED);
    assertThat(STARTER.timerSpread()).isEqualTo(0.05);
    assertThat(STARTER.levelSpread()).isEqualTo(0.1);
  }

  @Test
  void the_switchgear_is_read() {
    assertThat(STARTER.contactors())
        .extracting(Contactor::tag)
        .containsExactly("K1", "K11", "K12", "K13", "K14", "K15");
    assertThat(STARTER.contactor("K1"))
        .contains(
            new Contactor(
                "K1",
                Contactor.Place.LINE,
                java.util.Map.of("AC-2", 315.0, "AC-3", 315.0),
                OptionalDouble.of(690),
                Optional.empty(),
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                Optional.empty(),
                0.06,
                0.06,
                Optional.empty()));
    assertThat(STARTER.contactor("K15"))
        .contains(
            new Contactor(
                "K15",
                Contactor.Place.ROTOR,
                java.util.Map.of(),
                OptionalDouble.of(690),
                Optional.of(Contactor.Poles.DELTA),
                OptionalDouble.of(315),
                OptionalDouble.of(315),
                Optional.of(new ShortTime(1300, 10)),
                0.06,
                0.06,
                Optional.empty()));
    assertThat(STARTER.breakers())
        .containsExactly(new Breaker("Q1", OptionalDouble.of(25_000), 0.05));
  }

  @Test
  void the_devices_are_read() {
    Device.Accuracy usual = new Device.Accuracy(0.05, 0.075);
    Optional<String> k1 = Optional.of("K1");
    Optional<String> q1 = Optional.of("Q1");
    Device.Fuse f1 = (Device.Fuse) STARTER.device("F1").orElseThrow();
    assertThat(f1.fitting()).isEqualTo(fitting("F1", Optional.empty(), Device.Measurement.DIRECT));
    assertThat(f1.fuseClass()).isEqualTo(Device.FuseClass.GG);
    assertThat(f1.ratingAmps()).isEqualTo(250);
    assertThat(f1.gates().orElseThrow().within5sAmps()).isEqualTo(1650);
    assertThat(f1.amGates()).isEmpty();
    Device.Overload f2 = (Device.Overload) STARTER.device("F2").orElseThrow();
    assertThat(f2.fitting()).isEqualTo(fitting("F2", k1, Device.Measurement.DIRECT));
    assertThat(f2.tripClass().name()).isEqualTo("10");
    assertThat(f2.dialAmps()).isEqualTo(208);
    assertThat(f2.dialMeans()).isEqualTo(Device.DialMeans.FULL_LOAD);
    assertThat(f2.memoryKept()).isFalse();
    assertThat(f2.compensated()).isTrue();
    Device.InverseTime f3 = (Device.InverseTime) STARTER.device("F3").orElseThrow();
    assertThat(f3)
        .isEqualTo(
            new Device.InverseTime(
                fitting("F3", q1, Device.Measurement.CT),
                CurveLibraryReader.builtIn().inverseLaw("iec-very-inverse").orElseThrow(),
                265,
                0.25,
                Optional.of(new Device.CurrentTransformer(300, 5)),
                usual,
                Device.Reset.BY_EDGE,
                OptionalDouble.empty()));
    assertThat(STARTER.device("F4"))
        .contains(
            new Device.Instantaneous(
                fitting("F4", q1, Device.Measurement.CT),
                2600,
                Device.Measures.PEAK,
                0.1,
                usual,
                OptionalDouble.empty()));
    assertThat(STARTER.device("F5"))
        .contains(
            new Device.SequenceTimer(
                fitting("F5", k1, Device.Measurement.DIRECT), 13, OptionalDouble.empty()));
  }

  private static Device.Fitting fitting(
      String tag, Optional<String> trips, Device.Measurement measuresBy) {
    return new Device.Fitting(tag, Device.Place.STATOR, trips, measuresBy);
  }

  @Test
  void the_rest_of_the_plant_is_read() {
    assertThat(STARTER.statorConductor())
        .contains(new Conductor(120, Conductor.Metal.COPPER, "XLPE", OptionalDouble.of(280)));
    assertThat(STARTER.rotorConductor())
        .contains(new Conductor(150, Conductor.Metal.COPPER, "XLPE", OptionalDouble.of(340)));
    assertThat(STARTER.duty())
        .isEqualTo(new Duty(2, 1, OptionalDouble.of(4), 0, Optional.empty(), Optional.empty()));
    assertThat(STARTER.limits())
        .isEqualTo(
            new Limits(OptionalDouble.of(650), OptionalDouble.empty(), OptionalDouble.empty()));
    assertThat(STARTER.interlocks()).isEqualTo(new Interlocks(true, true));
    assertThat(STARTER.ambient().motorCelsius()).isEqualTo(40);
    assertThat(STARTER.ambient().panelCelsius()).isEqualTo(35);
    assertThat(STARTER.evidence())
        .containsExactly(java.util.Map.entry("load.inertia", EvidenceGrade.ESTIMATED));
    assertThat(STARTER.margins()).isEmpty();
    assertThat(STARTER.fuseWear()).isEqualTo(0.65, within(0.0));
    assertThat(STARTER.accepted()).isEmpty();
  }

  @Test
  void keys_whose_rules_come_later_are_named() {
    assertThat(STARTER.notYetJudged()).isEmpty();
  }

  @Test
  void only_what_the_example_leaves_out_is_assumed() {
    assertThat(STARTER.assumptions())
        .contains(
            new Assumption("resistors.enclosure", "20 min"),
            new Assumption("fuse-wear", "0.65"),
            new Assumption("protection.F2.dial-means", "full-load"),
            new Assumption("protection.F2.memory", "lost"),
            new Assumption("protection.F2.ambient", "compensated"),
            new Assumption("protection.F3.reset", "held or instant by edge"),
            new Assumption("protection.F3.accuracy.time", "7.5 %"))
        .extracting(Assumption::path)
        .doesNotContain(
            "supply.band",
            "supply.fault-current.min",
            "load.breakaway",
            "load.running",
            "load.spread",
            "resistors.tolerance",
            "resistors.hot-rise",
            "timer-spread",
            "level-spread",
            "sequence",
            "protection.F4.measures",
            "duty.starts.cold",
            "ambient.motor");
  }

  @Test
  void every_value_keeps_its_place() {
    List<String> lines = StarterFiles.text("starters/jaw-crusher.yaml").lines().toList();
    for (String path :
        List.of(
            "supply.voltage",
            "motor.rotor-voltage",
            "resistors.sections[2].resistance",
            "steps[3].after",
            "contactors.K12.thermal",
            "protection.F3.pick-up",
            "evidence.load.inertia")) {
      Place place = READ.place(path).orElseThrow();
      String key =
          path.equals("evidence.load.inertia") ? "load.inertia" : path.replaceAll(".*\\.", "");
      assertThat(lines.get(place.line() - 1).substring(0, place.column() - 1))
          .as(path)
          .endsWith(key + ": ");
      assertThat(place.file()).isEqualTo(EXAMPLE.toString());
    }
  }

  @Test
  void the_input_is_kept_byte_for_byte() throws IOException {
    InputFile input = READ.inputs().get(0);

    assertThat(READ.inputs()).hasSize(1);
    assertThat(input.bytes()).isEqualTo(Files.readAllBytes(EXAMPLE));
    assertThat(input.text()).isEqualTo(Files.readString(EXAMPLE));
    // SHA-256 of "abc": FIPS 180-4, example
    assertThat(new InputFile("a", "abc".getBytes(StandardCharsets.UTF_8), "abc").sha256())
        .isEqualTo("ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad");
  }
}
