package sliprung.dial;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import sliprung.config.CurveFiles;
import sliprung.config.CurveLibraryReader;
import sliprung.config.StarterReader;
import sliprung.fixture.StarterText;
import sliprung.review.Review;
import sliprung.review.Reviewer;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Verdict;
import sliprung.rulebook.catalogue.Catalogue;
import sliprung.starter.DialScale;
import sliprung.starter.Starter;

/** The windows of the demo crusher, held against reviews of their own. */
class DemoWindowTest {
  private static final Starter CRUSHER =
      new StarterReader(CurveLibraryReader.builtIn(), Catalogue.names())
          .read("crusher.yaml", StarterText.crusher().yaml(), CurveFiles.NONE)
          .described()
          .orElseThrow()
          .starter();

  private static Review at(Dial dial, double value) {
    return Reviewer.review(dial.turned(CRUSHER, value), StarterText.DAY);
  }

  private static void breaks(Dial dial, Window.Bound bound) {
    Judgement.Question named = bound.breaks().orElseThrow();
    Finding finding =
        at(dial, bound.outside()).findings().stream()
            .filter(f -> f.rule().equals(named.rule()) && f.subject().equals(named.subject()))
            .findFirst()
            .orElseThrow();
    assertThat(finding.verdict()).isEqualTo(Verdict.BREACH);
  }

  @Test
  void nothing_is_broken_at_either_end_and_the_named_rule_just_beyond() {
    Dial bare =
        Dials.of(CRUSHER).stream()
            .filter(d -> d.path().equals("protection.F3.time-multiplier"))
            .findFirst()
            .orElseThrow();
    Dial dial =
        new Dial(
            bare.path(),
            bare.device(),
            bare.setting(),
            bare.dimension(),
            bare.value(),
            new DialScale(
                OptionalDouble.of(0.1), OptionalDouble.of(0.4), OptionalDouble.of(0.01), 0.02),
            bare.setter());

    DialReport report =
        new WindowSearch(new ReviewEvaluation(StarterText.DAY, CRUSHER)).of(CRUSHER, dial);

    assertThat(report.windows()).hasSize(1);
    Window window = report.windows().get(0);
    assertThat(at(dial, window.low()).exitStatus()).isZero();
    assertThat(at(dial, window.high()).exitStatus()).isZero();
    breaks(dial, window.below());
    breaks(dial, window.above());
    assertThat(window.below().outside()).isBetween(window.low() - 0.0021, window.low());
    assertThat(window.above().outside()).isBetween(window.high(), window.high() + 0.0021);
    double setting = report.recommended().orElseThrow();
    assertThat(window.contains(setting - 0.008)).isTrue();
    assertThat(window.contains(setting + 0.008)).isTrue();
    assertThat(report.looked()).isLessThanOrEqualTo(25);
  }
}
