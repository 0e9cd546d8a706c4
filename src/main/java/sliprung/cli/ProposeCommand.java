package sliprung.cli;

import java.io.IOException;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.time.LocalDate;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import sliprung.config.CurveFiles;
import sliprung.config.CurveLibraryReader;
import sliprung.config.SettingEditor;
import sliprung.config.StarterReader;
import sliprung.config.StarterReading;
import sliprung.dial.BankGrading;
import sliprung.dial.Dial;
import sliprung.dial.Dials;
import sliprung.dial.Proposal;
import sliprung.dial.ProposalSearch;
import sliprung.dial.ReviewEvaluation;
import sliprung.record.BankJson;
import sliprung.record.ProposalJson;
import sliprung.review.Reviewer;
import sliprung.rulebook.catalogue.Catalogue;
import sliprung.starter.Starter;

/** Settings of all dials together. */
@Command(
    name = "propose",
    mixinStandardHelpOptions = true,
    description =
        "Proposes settings of all dials together that make the thinnest margin thickest; the exit"
            + " status is that of a review of the proposed settings.")
final class ProposeCommand implements Callable<Integer> {
  private final PrintWriter out;
  private final PrintWriter err;
  private final Terminal terminal;

  @Parameters(paramLabel = "FILE", description = "A starter description, YAML; never written to.")
  private Path file;

  @Option(names = "--json", description = "Print JSON: SI, unrounded.")
  private boolean json;

  @Option(
      names = "--write",
      paramLabel = "NEW",
      description = "Write the description with the proposed settings to a new file.")
  private Path target;

  @Option(
      names = "--sections",
      description = "Grade the resistor bank for even closing currents instead.")
  private boolean sections;

  @Option(
      names = "--on",
      paramLabel = "DATE",
      description = "Judge accepted deviations at this date; today if absent.")
  private LocalDate date;

  ProposeCommand(PrintWriter out, PrintWriter err, Terminal terminal) {
    this.out = out;
    this.err = err;
    this.terminal = terminal;
  }

  @Override
  public Integer call() {
    if (sections && target != null) {
      return wrong("--write is for dials: a bank is changed by its maker, not by a setting");
    }
    if (target != null && Files.exists(target)) {
      return wrong(target + " exists: name a new file");
    }
    Optional<StarterReading.Described> described = DialsCommand.read(file, err);
    if (described.isEmpty()) {
      return ExitStatus.WRONG_INPUT;
    }
    LocalDate on = date == null ? LocalDate.now() : date;
    Starter starter = described.get().starter();
    if (sections) {
      BankGrading.Graded graded = BankGrading.of(starter);
      if (json) {
        out.println(BankJson.of(graded));
      } else {
        new BankTable(out, terminal).print(starter, graded);
      }
      return Reviewer.review(starter, on).exitStatus();
    }
    long from = System.nanoTime();
    Proposal proposal = ProposalSearch.of(starter, new ReviewEvaluation(on, starter));
    double seconds = (System.nanoTime() - from) / 1e9;
    Optional<String> text = Optional.empty();
    if (target != null) {
      SettingEditor.Edited edited = new SettingEditor(described.get()).with(values(proposal));
      if (edited instanceof SettingEditor.Refusal refusal) {
        return wrong(
            target
                + " is not written: "
                + refusal.path()
                + " cannot be changed in place, "
                + refusal.reason());
      }
      text = Optional.of(((SettingEditor.Text) edited).text());
      if (!readsAs(text.get(), described.get(), proposal.proposed())) {
        return wrong(target + " is not written: it would not read as what is proposed");
      }
    }
    if (text.isPresent() && !write(text.get())) {
      return ExitStatus.WRONG_INPUT;
    }
    if (json) {
      out.println(ProposalJson.of(proposal));
    } else {
      new ProposalTable(out, terminal).print(starter, proposal, seconds);
      if (target != null) {
        out.println("Written: " + Printable.of(target.toString()));
      }
    }
    return Reviewer.review(proposal.proposed(), on).exitStatus();
  }

  private int wrong(String message) {
    err.println("sliprung: " + Printable.of(message));
    return ExitStatus.WRONG_INPUT;
  }

  private boolean write(String text) {
    try {
      Files.writeString(target, text, StandardCharsets.UTF_8, StandardOpenOption.CREATE_NEW);
      return true;
    } catch (FileAlreadyExistsException e) {
      wrong(target + " exists: name a new file");
    } catch (IOException e) {
      wrong(target + " cannot be written: " + e.getMessage());
    }
    return false;
  }

  /** Paths as the reader names them: it counts steps where a dial names the contactor. */
  private static Map<String, Double> values(Proposal proposal) {
    Map<String, Double> values = new LinkedHashMap<>();
    for (Proposal.Change change : proposal.changes()) {
      values.put(pathInFile(proposal.proposed(), change.dial()), change.to());
    }
    return values;
  }

  private static String pathInFile(Starter starter, Dial dial) {
    for (int i = 0; i < starter.steps().size(); i++) {
      String tag = starter.steps().get(i).contactor();
      if (dial.path().equals("steps." + tag + "." + dial.setting())) {
        return "steps[" + (i + 1) + "]." + dial.setting();
      }
    }
    return dial.path();
  }

  /** What is written must say what was judged: every dial, to the figures that are written. */
  private boolean readsAs(String text, StarterReading.Described source, Starter proposed) {
    Map<String, byte[]> curves = new LinkedHashMap<>();
    source.inputs().stream().skip(1).forEach(f -> curves.put(f.name(), f.bytes()));
    Optional<StarterReading.Described> again =
        new StarterReader(CurveLibraryReader.builtIn(), Catalogue.names())
            .read(file.toString(), text, CurveFiles.stored(curves))
            .described();
    if (again.isEmpty()) {
      return false;
    }
    Starter set = again.get().starter();
    for (Dial dial : Dials.of(proposed)) {
      Optional<Dial> read =
          Dials.of(set).stream().filter(d -> d.path().equals(dial.path())).findFirst();
      if (read.isEmpty()
          || Math.abs(read.get().value() - dial.value()) > 1e-5 * Math.abs(dial.value())) {
        return false;
      }
      set = dial.turned(set, dial.value());
    }
    return set.equals(proposed);
  }
}
