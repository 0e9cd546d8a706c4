package sliprung.cli;

import java.io.PrintWriter;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;
import sliprung.config.StarterReading;
import sliprung.machine.Machine;
import sliprung.machine.NameplateIdentification;
import sliprung.quantity.Show;
import sliprung.record.SampledJson;
import sliprung.review.Reviewer;
import sliprung.sampling.Sampled;
import sliprung.sampling.StartSampling;
import sliprung.starter.Distribution;
import sliprung.starter.Starter;
import sliprung.starter.Varying;

/** How often a permitted start would trip something, by random starts over the spreads. */
@Command(
    name = "sample",
    mixinStandardHelpOptions = true,
    description =
        "Draws permitted starts at random over the declared spreads: share of starts in which each"
            + " device operates, and percentiles of run-up time, closing currents and uses. No"
            + " verdict rests on it: status 0 says that it was printed, no more.")
final class SampleCommand implements Callable<Integer> {
  private static final int MOST = 1_000_000;

  private final PrintWriter out;
  private final PrintWriter err;

  @Spec private CommandSpec spec;

  @Parameters(paramLabel = "FILE", description = "A starter description, YAML.")
  private Path file;

  @Option(
      names = "--starts",
      paramLabel = "N",
      defaultValue = "10000",
      description = "How many starts; ${DEFAULT-VALUE} if absent.")
  private int starts;

  @Option(
      names = "--seed",
      paramLabel = "N",
      defaultValue = "1",
      description = "The same seed draws the same starts; ${DEFAULT-VALUE} if absent.")
  private long seed;

  @Option(names = "--json", description = "Print JSON: SI, unrounded.")
  private boolean json;

  SampleCommand(PrintWriter out, PrintWriter err) {
    this.out = out;
    this.err = err;
  }

  @Override
  public Integer call() {
    if (starts < 1 || starts > MOST) {
      throw new ParameterException(
          spec.commandLine(), "expected 1 to " + MOST + " starts but found " + starts);
    }
    Optional<StarterReading.Described> described = DialsCommand.read(file, err);
    if (described.isEmpty()) {
      return ExitStatus.WRONG_INPUT;
    }
    Starter starter = described.get().starter();
    List<Machine> machines =
        NameplateIdentification.identify(starter.motor()).stream()
            .map(i -> Reviewer.machine(starter, i))
            .toList();
    Sampled sampled = StartSampling.of(starter, machines, starts, seed);
    if (json) {
      out.println(SampledJson.of(sampled));
    } else {
      print(starter, sampled);
    }
    return ExitStatus.CLEAR;
  }

  private void print(Starter starter, Sampled sampled) {
    out.printf(
        Locale.ROOT,
        "%s%n%,d permitted starts drawn at random, seed %d. %s%n%n",
        Printable.of(starter.name()),
        sampled.starts(),
        sampled.seed(),
        distributions(starter));
    out.println(
        sampled.notRunUp() == 0
            ? "Every start ran up."
            : String.format(
                Locale.ROOT,
                "%,d of them never ran up: no percentile counts them.",
                sampled.notRunUp()));
    out.printf(
        "%nUses are those of the last start of a series: cold, %d in a row from cold; hot, %d from"
            + " running.%n",
        starter.duty().coldStarts(), starter.duty().hotStarts());
    out.printf(
        "%n%-8s %-6s %-22s %s%n", "device", "series", "relay", "operates in (95 % sure: between)");
    for (Sampled.Trips trips : sampled.trips()) {
      out.printf(
          "%-8s %-6s %-22s %s%n",
          Printable.of(trips.device()),
          trips.series(),
          trips.relay(),
          trips.notJudged()
              ? "not judged"
              : Show.percent(trips.share())
                  + (" of the starts ("
                      + Show.percent(trips.bounds().low())
                      + " and "
                      + Show.percent(trips.bounds().high())
                      + ")"));
    }
    out.printf("%n%-46s %10s %10s %10s %10s %10s%n", "", "1 %", "5 %", "50 %", "95 %", "99 %");
    for (Sampled.Quantity quantity : sampled.quantities()) {
      out.printf("%-46s", Printable.of(quantity.name()));
      for (double value : quantity.percentiles()) {
        out.printf(" %10s", shown(value, quantity.unit()));
      }
      out.println();
    }
    out.printf(
        "%nA rare trip is still a trip: verdicts are taken at the corners, by 'review'. Whether the"
            + " spreads and their distributions are true is not known here.%n");
  }

  private static String shown(double value, String unit) {
    return switch (unit) {
      case "s" -> Show.seconds(value);
      case "A" -> Show.amps(value);
      default -> Show.percent(value);
    };
  }

  private static String distributions(Starter starter) {
    StringBuilder words = new StringBuilder();
    for (Varying varying : Varying.values()) {
      words
          .append(words.isEmpty() ? "" : ", ")
          .append(varying.word())
          .append(' ')
          .append(starter.distributions().getOrDefault(varying, Distribution.UNIFORM).word());
    }
    return "Over their spreads: " + words + ".";
  }
}
