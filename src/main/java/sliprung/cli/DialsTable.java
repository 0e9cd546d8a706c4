package sliprung.cli;

import java.io.PrintWriter;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.SortedSet;
import java.util.stream.Collectors;
import sliprung.dial.Dial;
import sliprung.dial.DialReport;
import sliprung.dial.DialSurvey;
import sliprung.dial.DialText;
import sliprung.dial.Judgement.Question;
import sliprung.dial.Window;
import sliprung.starter.Starter;

/** The windows of all dials as a technician reads them: one line a dial, below it its ends. */
final class DialsTable {
  private static final String ROW = "%-8s %-22s %-10s %-24s %s";
  private static final String INDENT = " ".repeat(9);

  private final PrintWriter out;
  private final Terminal terminal;

  DialsTable(PrintWriter out, Terminal terminal) {
    this.out = out;
    this.terminal = terminal;
  }

  void print(Starter starter, DialSurvey survey, double seconds) {
    wrapped(
        "",
        Printable.of(starter.name())
            + String.format(
                Locale.ROOT,
                " · %d dials, %d settings judged in %.0f s",
                survey.reports().size(),
                survey.evaluations(),
                seconds));
    wrapped(
        "",
        "Window: the range in which no rule is broken that this dial can move, the others as they"
            + " are. Breaches it cannot move are listed apart.");
    out.println();
    out.println(
        terminal.strong(
            String.format(ROW, "device", "dial", "set to", "window", "recommended").strip()));
    survey.reports().forEach(this::report);
    apart(survey.reports());
    if (survey.reports().stream().anyMatch(r -> !r.dial().scale().hasRange())) {
      out.println();
      wrapped(
          "",
          "A dial without a declared range was searched from an eighth to eight times its value;"
              + " give its scale beside the setting as dial-range, dial-step, dial-error.");
    }
  }

  /** Breaches that were not counted, once for all dials that cannot move the same ones. */
  private void apart(List<DialReport> reports) {
    Map<SortedSet<Question>, List<String>> dials = new LinkedHashMap<>();
    reports.stream()
        .filter(r -> !r.apart().isEmpty())
        .forEach(
            r ->
                dials
                    .computeIfAbsent(r.apart(), a -> new ArrayList<>())
                    .add(r.dial().device() + " " + r.dial().setting()));
    dials.forEach(
        (questions, names) -> {
          out.println();
          boolean every = names.size() == reports.size();
          wrapped(
              "",
              "Broken today, not moved by "
                  + (every ? "any of these dials" : Printable.of(String.join(", ", names)))
                  + " and not counted there:");
          wrapped(
              "   ",
              Printable.of(
                  questions.stream().map(DialText::words).collect(Collectors.joining("; "))));
        });
  }

  private void report(DialReport report) {
    Dial dial = report.dial();
    String windows =
        report.windows().isEmpty()
            ? report.looked() == 0 ? "not searched" : "none"
            : report.windows().stream()
                .map(w -> DialText.range(dial, w))
                .collect(Collectors.joining(", "));
    String recommended = report.recommended().map(r -> DialText.setting(dial, r)).orElse("none");
    boolean kept = report.recommended().isPresent() && report.recommended().get() == dial.value();
    out.println(
        plain(
            String.format(
                ROW,
                Printable.of(dial.device()),
                dial.setting(),
                DialText.setting(dial, dial.value()),
                windows,
                kept ? recommended + " (as set)" : recommended)));
    if (!report.windows().isEmpty() && !report.isSetInside()) {
      wrapped(INDENT, "Today's setting lies outside.");
    }
    for (Window window : report.windows()) {
      ends(dial, window);
    }
    if (report.recommended().isEmpty()) {
      wrapped(INDENT, "Nothing recommended: " + report.noneBecause() + ".");
    }
    report
        .best()
        .ifPresent(
            best ->
                wrapped(
                    INDENT,
                    "Least is broken at "
                        + DialText.low(dial, best)
                        + ": "
                        + Printable.of(some(report.left()))
                        + "."));
    report
        .pair()
        .ifPresent(
            pair ->
                wrapped(
                    INDENT,
                    "With "
                        + Printable.of(pair.other().device())
                        + " "
                        + pair.other().setting()
                        + " at "
                        + DialText.setting(pair.other(), pair.value())
                        + " nothing is broken from "
                        + DialText.range(dial, pair.window())
                        + ": both must move."));
    for (Window window : report.noFurther()) {
      wrapped(INDENT, "No further breach from " + DialText.range(dial, window) + ":");
      ends(dial, window);
    }
  }

  private void ends(Dial dial, Window window) {
    wrapped(INDENT + "below  ", Printable.of(DialText.bound(dial, window.below())));
    wrapped(INDENT + "above  ", Printable.of(DialText.bound(dial, window.above())));
  }

  private static String some(SortedSet<Question> questions) {
    String first =
        questions.stream().limit(4).map(DialText::words).collect(Collectors.joining("; "));
    return questions.size() > 4 ? first + "; and " + (questions.size() - 4) + " more" : first;
  }

  private void wrapped(String first, String text) {
    String next = " ".repeat(first.length());
    List<String> lines = Summary.wrap(text, terminal.columns() - first.length());
    for (int i = 0; i < lines.size(); i++) {
      out.println((i == 0 ? first : next) + lines.get(i));
    }
  }

  private static String plain(String text) {
    return text.replace('\u00a0', ' ').stripTrailing();
  }
}
