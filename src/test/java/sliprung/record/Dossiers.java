package sliprung.record;

import java.util.List;
import java.util.OptionalDouble;
import sliprung.review.CrusherReview;
import sliprung.review.Review;

/** Dossiers of the hand-made review, for tests of what is written about it. */
final class Dossiers {
  static final String HOSTILE =
      "<script>alert(1)</script> ]]> \" ' & \u0000\u0007\u009b\u001b[31m <!-- \uD800 --> \u202E"
          + "<img src=x onerror=y> javascript:z url(x) \\ } @page { size: 1mm } 漢字 🔥 \u0301"
          + "w".repeat(300);

  private Dossiers() {}

  static Dossier of(Review review) {
    return new Dossier(
        review,
        List.of(
            new InputFile(
                "crusher.yaml", "ab".repeat(32), "starter: <b>\n  <![CDATA[ x ]]>\n  a  b\n")),
        List.of(
            new AsRead("load.inertia", "70 kg·m²", OptionalDouble.of(70.0), "kg·m²"),
            new AsRead("motor.power", "200 kW", OptionalDouble.of(200e3), "W"),
            new AsRead("sequence", "chained", OptionalDouble.empty(), "")),
        List.of(),
        "0.1.0");
  }

  static Dossier plain() {
    return of(CrusherReview.plain());
  }

  static Dossier hostile() {
    return new Dossier(
        CrusherReview.of(HOSTILE, HOSTILE, true),
        List.of(new InputFile(HOSTILE, HOSTILE, HOSTILE)),
        List.of(new AsRead(HOSTILE, HOSTILE, OptionalDouble.empty(), HOSTILE)),
        List.of(),
        HOSTILE);
  }
}
