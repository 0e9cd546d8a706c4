package sliprung.cli;

import java.io.PrintWriter;
import java.nio.file.Path;
import java.time.LocalDate;
import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import sliprung.config.CurveLibraryReader;
import sliprung.config.StarterReader;
import sliprung.config.StarterReading;
import sliprung.dial.DialSurvey;
import sliprung.dial.ReviewEvaluation;
import sliprung.record.DialsJson;
import sliprung.review.Review;
import sliprung.review.Reviewer;
import sliprung.rulebook.catalogue.Catalogue;

/** How far each dial may be turned. */
@Command(
    name = "dials",
    mixinStandardHelpOptions = true,
    description =
        "Prints every dial's window, what bounds each end, and a recommended setting; the exit"
            + " status is that of a review of the settings as they are.")
final class DialsCommand implements Callable<Integer> {
  private final PrintWriter out;
  private final PrintWriter err;
  private final Terminal terminal;

  @Parameters(paramLabel = "FILE", description = "A starter description, YAML.")
  private Path file;

  @Option(names = "--json", description = "Print JSON: SI, unrounded.")
  private boolean json;

  @Option(
      names = "--on",
      paramLabel = "DATE",
      description = "Judge accepted deviations at this date; today if absent.")
  private LocalDate date;

  DialsCommand(PrintWriter out, PrintWriter err, Terminal terminal) {
    this.out = out;
    this.err = err;
    this.terminal = terminal;
  }

  @Override
  public Integer call() {
    Optional<StarterReading.Described> described = read(file, err);
    if (described.isEmpty()) {
      return ExitStatus.WRONG_INPUT;
    }
    LocalDate on = date == null ? LocalDate.now() : date;
    long from = System.nanoTime();
    DialSurvey survey =
        DialSurvey.of(
            described.get().starter(), new ReviewEvaluation(on, described.get().starter()));
    if (json) {
      out.println(DialsJson.of(survey.reports()));
    } else {
      double seconds = (System.nanoTime() - from) / 1e9;
      new DialsTable(out, terminal).print(described.get().starter(), survey, seconds);
    }
    Review today = Reviewer.review(described.get().starter(), on);
    return today.exitStatus();
  }

  /** Reads a starter; every mistake of the file goes to standard error. */
  static Optional<StarterReading.Described> read(Path file, PrintWriter err) {
    StarterReading reading =
        new StarterReader(CurveLibraryReader.builtIn(), Catalogue.names()).read(file);
    reading.diagnostics().forEach(d -> err.print(d.render()));
    return reading.described();
  }
}
