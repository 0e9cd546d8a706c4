package sliprung.record;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import sliprung.review.FindingText;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Verdict;

/** The findings of one question: by subject, the worst first; then what is clear; then defaults. */
final class FindingPart {
  private FindingPart() {}

  static void write(Html page, List<Finding> findings) {
    Map<String, List<Finding>> bySubject = new LinkedHashMap<>();
    List<Finding> clear = new ArrayList<>();
    List<Finding> defaults = new ArrayList<>();
    for (Finding finding : findings) {
      if (finding.rule().equals("data/assumed") && finding.verdict() != Verdict.BREACH) {
        defaults.add(finding);
      } else if (finding.verdict() == Verdict.CLEAR) {
        clear.add(finding);
      } else {
        bySubject.computeIfAbsent(finding.subject(), k -> new ArrayList<>()).add(finding);
      }
    }
    bySubject.forEach((subject, list) -> subject(page, subject, list));
    if (!clear.isEmpty()) {
      clears(page, clear);
    }
    if (!defaults.isEmpty()) {
      defaults(page, defaults);
    }
  }

  private static void subject(Html page, String subject, List<Finding> findings) {
    page.open("article", "class", "subject");
    page.element("h3", subject);
    findings.forEach(f -> block(page, f));
    page.end();
  }

  private static void block(Html page, Finding finding) {
    String style = AnswerPart.style(finding.verdict());
    page.open("div", "class", "finding is-" + style);
    page.open("p", "class", "verdict");
    page.open("span", "class", style).text(finding.verdict().word()).close();
    margin(page, finding);
    page.end();
    page.element("p", finding.says());
    if (!finding.missing().isEmpty()) {
      page.element("p", "Missing: " + String.join(", ", finding.missing()) + ".");
    }
    if (!finding.mend().isEmpty()) {
      page.open("p").open("b").text("Next: ").close().text(finding.mend()).end();
    }
    finding
        .by()
        .ifPresent(
            by ->
                page.element(
                    "p",
                    "Accepted by "
                        + by
                        + finding.until().map(d -> " until " + d).orElse("")
                        + "."));
    page.open("p", "class", "quiet");
    page.text(evidence(finding)).text(" ");
    page.open("code").text(finding.rule()).close();
    page.end();
    page.end();
  }

  private static void margin(Html page, Finding finding) {
    String margin = FindingText.marginOfWanted(finding);
    if (margin.isEmpty()) {
      return;
    }
    page.text(" margin " + margin + (finding.wanted().isPresent() ? " wanted " : " "));
    if (finding.wanted().isPresent()) {
      page.figures().bar(page, FindingText.share(finding));
    }
  }

  private static void defaults(Html page, List<Finding> findings) {
    Cells cells =
        new Cells(page)
            .open(
                "Defaults, taken because the file is silent, that decided a verdict; tight: it"
                    + " decided a breach or a tight margin",
                List.of("input", "verdict", "what was taken, and what it decided", "next"),
                "class",
                "defaults");
    findings.forEach(f -> cells.row(f.subject(), f.verdict().word(), f.says(), f.mend()));
    cells.close();
  }

  private static String evidence(Finding finding) {
    List<String> parts = new ArrayList<>();
    parts.add(FindingText.valueAgainstLimit(finding));
    parts.add(FindingText.decidedBy(finding));
    parts.add(finding.reference());
    parts.add(finding.weakestInput().isEmpty() ? "" : "rests on " + finding.weakestInput());
    return parts.stream().filter(p -> !p.isEmpty()).collect(Collectors.joining(" · "));
  }

  private static void clears(Html page, List<Finding> findings) {
    page.open("div", "class", "wide").open("table", "class", "clears").markup("\n");
    page.element("caption", "Clear, the thinnest margin first");
    page.open("thead").open("tr");
    for (String head : List.of("subject, rule", "margin", "what happens, and what decided it")) {
      page.element("th", head, "scope", "col");
    }
    page.end().end();
    page.open("tbody").markup("\n");
    for (Finding finding : findings) {
      page.open("tr");
      page.open("th", "scope", "row").text(finding.subject()).empty("br");
      page.open("code").text(finding.rule()).close().end();
      page.open("td").text(FindingText.marginOfWanted(finding));
      if (finding.margin().isPresent() && finding.wanted().isPresent()) {
        page.empty("br");
        page.figures().bar(page, FindingText.share(finding));
      }
      page.end();
      page.open("td").text(finding.says() + " ");
      page.open("span", "class", "quiet").text(evidence(finding)).close();
      page.end();
      page.end();
    }
    page.end().end().end();
  }
}
