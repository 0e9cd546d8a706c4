package sliprung.cli;

import java.io.IOException;
import java.io.PrintWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import sliprung.chart.StatorBands;
import sliprung.config.CurveLibraryReader;
import sliprung.config.StarterReader;
import sliprung.config.StarterReading;
import sliprung.record.AsRead;
import sliprung.record.Dossier;
import sliprung.record.InputFile;
import sliprung.record.Paper;
import sliprung.record.RecordWriter;
import sliprung.review.Review;
import sliprung.review.Reviewer;
import sliprung.rulebook.catalogue.Catalogue;
import sliprung.sensitivity.MeasureFirst;

/** The main job. */
@Command(
    name = "review",
    mixinStandardHelpOptions = true,
    description = "Reviews starters: findings on standard output, records with --out.")
final class ReviewCommand implements Callable<Integer> {
  private final PrintWriter out;
  private final PrintWriter err;
  private final Terminal terminal;

  @Parameters(arity = "1..*", paramLabel = "FILE", description = "Starter descriptions, YAML.")
  private List<Path> files;

  @Option(
      names = "--out",
      paramLabel = "DIR",
      description = "Write each record into DIR/(the file's stem).")
  private Path directory;

  @Option(
      names = "--on",
      paramLabel = "DATE",
      description = "Judge accepted deviations at this date, such as 2027-01-31; today if absent.")
  private LocalDate date;

  @Option(
      names = "--pdf",
      description =
          "Write review.pdf too, for signing and filing; it takes longer than all the rest.")
  private boolean withPdf;

  @Option(
      names = "--paper",
      paramLabel = "SIZE",
      converter = PaperName.class,
      description = "Paper of review.pdf: a4 (default) or letter. Asks for --pdf by itself.")
  private Paper paper;

  @Option(
      names = "--measure-first",
      description =
          "Print which uncertain input moves the thinnest margin most; a record always says it.")
  private boolean measureFirst;

  @Option(names = "--all", description = "Print every clear finding.")
  private boolean everything;

  ReviewCommand(PrintWriter out, PrintWriter err, Terminal terminal) {
    this.out = out;
    this.err = err;
    this.terminal = terminal;
  }

  private record Done(
      Path file,
      Review review,
      StarterReading.Described described,
      double seconds,
      MeasureFirst measureFirst) {
    Dossier dossier() {
      return new Dossier(
          review,
          described.inputs().stream()
              .map(f -> new InputFile(base(f.name()), f.sha256(), f.text()))
              .toList(),
          described.values().stream()
              .map(v -> new AsRead(v.path(), v.text(), v.value(), v.unit()))
              .toList(),
          StatorBands.of(review.starter()),
          ProgramVersion.text(),
          measureFirst);
    }
  }

  @Override
  public Integer call() {
    if (directory == null && paperAsked().isPresent()) {
      err.println("sliprung: a PDF is part of a record: give --out DIR");
      return ExitStatus.WRONG_INPUT;
    }
    List<StarterReading.Described> read = new ArrayList<>();
    if (!readAll(read)) {
      return ExitStatus.WRONG_INPUT;
    }
    LocalDate on = date == null ? LocalDate.now() : date;
    List<Done> done = new ArrayList<>();
    for (int i = 0; i < files.size(); i++) {
      long from = System.nanoTime();
      Review review = Reviewer.review(read.get(i).starter(), on);
      double seconds = (System.nanoTime() - from) / 1e9;
      MeasureFirst first =
          measureFirst || directory != null ? MeasureFirst.of(review) : MeasureFirst.NONE;
      done.add(new Done(files.get(i), review, read.get(i), seconds, first));
    }
    Optional<String> failure = directory == null ? Optional.empty() : write(done);
    Summary summary = new Summary(out, terminal, everything);
    int status = ExitStatus.CLEAR;
    for (Done one : done) {
      summary.print(
          one.review(), one.seconds(), measureFirst ? one.measureFirst() : MeasureFirst.NONE);
      if (directory != null && failure.isEmpty()) {
        Path place = place(one);
        summary.written(place.resolve("review.html").toString(), sheets(place));
      }
      status = ExitStatus.worse(status, one.review().exitStatus());
    }
    if (failure.isPresent()) {
      out.flush();
      err.println(
          "sliprung: "
              + (done.size() == 1 ? "the record cannot" : "the records cannot, none of them,")
              + " be written to "
              + Printable.of(failure.get()));
      return ExitStatus.WRONG_INPUT;
    }
    return status;
  }

  private Path place(Done one) {
    return directory.resolve(stem(one.file()));
  }

  /** Writes every record or none; where and why it failed, if it did. */
  private Optional<String> write(List<Done> done) {
    Map<Path, Map<String, byte[]>> records = new LinkedHashMap<>();
    for (Done one : done) {
      records.put(place(one), RecordWriter.files(one.dossier(), paperAsked()));
    }
    try {
      RecordWriter.write(records);
      return Optional.empty();
    } catch (IOException e) {
      Path where = done.size() == 1 ? place(done.get(0)) : directory;
      return Optional.of(where + ": " + e.getMessage());
    }
  }

  /** Paper of the PDF; empty where nobody asked for one. */
  private Optional<Paper> paperAsked() {
    return Optional.ofNullable(paper).or(() -> withPdf ? Optional.of(Paper.A4) : Optional.empty());
  }

  /** What to say of the sheets for paper; an older one must not be taken for this record's. */
  private String sheets(Path place) {
    if (paperAsked().isPresent()) {
      return "and review.pdf beside it";
    }
    return Files.exists(place.resolve("review.pdf"))
        ? "the review.pdf beside it is of an earlier review: --pdf makes it anew"
        : "--pdf makes it on paper too, to sign and file";
  }

  /** Reads every file before anything is computed or written; false after a mistake in any. */
  private boolean readAll(List<StarterReading.Described> into) {
    StarterReader reader = new StarterReader(CurveLibraryReader.builtIn(), Catalogue.names());
    boolean good = true;
    Set<String> stems = new HashSet<>();
    for (Path file : files) {
      StarterReading reading = reader.read(file);
      reading.diagnostics().forEach(d -> err.print(d.render()));
      reading.described().ifPresent(into::add);
      good &= reading.described().isPresent();
      if (directory != null && !stems.add(stem(file))) {
        err.println(
            "sliprung: two files are named "
                + Printable.of(stem(file))
                + ": their records would overwrite each other in "
                + Printable.of(directory.toString()));
        good = false;
      }
    }
    return good;
  }

  /** A record names its inputs without the folders of the machine it was made on. */
  private static String base(String name) {
    return String.valueOf(Path.of(name).getFileName());
  }

  /** The name without its ending; a name of dots alone would lead out of the directory. */
  private static String stem(Path file) {
    String name = String.valueOf(file.getFileName());
    int dot = name.lastIndexOf('.');
    String stem = dot > 0 ? name.substring(0, dot) : name;
    return stem.matches("\\.+") ? name : stem;
  }
}
