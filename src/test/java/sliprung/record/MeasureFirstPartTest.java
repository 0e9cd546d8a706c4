package sliprung.record;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import sliprung.review.CrusherReview;
import sliprung.review.Review;
import sliprung.rulebook.Finding;
import sliprung.sensitivity.MeasureFirst;
import sliprung.sensitivity.Sensitivity;
import sliprung.sensitivity.ThinMargin;
import sliprung.starter.EvidenceGrade;

class MeasureFirstPartTest {
  private static final Review REVIEW = CrusherReview.plain();

  private static Finding finding(String subject) {
    Finding like =
        REVIEW.findings().stream().filter(f -> f.margin().isPresent()).findFirst().orElseThrow();
    return new Finding(
        like.rule(),
        like.verdict(),
        subject,
        like.start(),
        like.edge(),
        like.margin(),
        like.wanted(),
        like.limit(),
        like.value(),
        like.unit(),
        like.says(),
        like.mend(),
        like.reference(),
        like.missing(),
        like.weakestInput(),
        Optional.empty(),
        Optional.empty());
  }

  private static Dossier dossier(String subject, String words) {
    Finding finding = finding(subject);
    Sensitivity moves =
        new Sensitivity(
            finding.rule(),
            subject,
            1.07,
            1.1,
            "load.inertia",
            words,
            EvidenceGrade.ESTIMATED,
            0.75,
            1.25,
            OptionalDouble.of(1.3),
            OptionalDouble.empty());
    return new Dossier(
        REVIEW,
        List.of(),
        List.of(),
        List.of(),
        "0.1.0",
        new MeasureFirst(
            List.of(new ThinMargin(finding, List.of(moves)), new ThinMargin(finding, List.of())),
            List.of(words)));
  }

  @Test
  void it_stands_right_behind_the_findings() {
    String page = ReviewHtml.text(dossier("F3", "the load's inertia"));

    assertThat(page.indexOf("id=\"measure-first\""))
        .isGreaterThan(page.indexOf("Never judged here"))
        .isLessThan(page.indexOf("id=\"margins\""));
    String text = Parsed.xml(page).getDocumentElement().getTextContent();
    assertThat(text)
        .contains("Measure the load's inertia first (estimated, ±25\u00a0%)")
        .contains("none given")
        .contains("none moves it");
  }

  @Test
  void text_of_the_user_is_escaped_in_it() {
    String page = ReviewHtml.text(dossier(Dossiers.HOSTILE, Dossiers.HOSTILE));

    Parsed.xml(page);
    assertThat(page.split("<script", -1)).hasSize(2);
    assertThat(page).doesNotContain("<img").doesNotContain("\u202E");
  }

  @Test
  void a_record_without_it_has_no_such_part() {
    assertThat(ReviewHtml.text(Dossiers.plain())).doesNotContain("id=\"measure-first\"");
    assertThat(ReviewJson.text(REVIEW, List.of(), "0.1.0")).contains("\"measure_first\" : [ ]");
  }

  @Test
  void the_json_file_holds_every_input_unrounded() {
    Dossier dossier = dossier("F3", "the load's inertia");
    String json = ReviewJson.text(REVIEW, List.of(), "0.1.0", dossier.measureFirst());

    assertThat(json)
        .contains("\"input\" : \"load.inertia\"")
        .contains("\"evidence\" : \"estimated\"")
        .contains("\"low_factor\" : 0.75")
        .contains("\"margin_at_low\" : 1.3")
        .contains("\"margin_at_high\" : null");
  }
}
