package sliprung.record;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import sliprung.chart.FaultRow;
import sliprung.chart.FirstLimitChart;
import sliprung.protection.DeviceResponse;
import sliprung.protection.PartResponse;
import sliprung.quantity.Show;
import sliprung.review.PartText;
import sliprung.review.Review;
import sliprung.rulebook.ComputedStart;

/** Devices and parts over the permitted starts, and every fault. */
final class ProtectionPart {
  private ProtectionPart() {}

  static void write(Html page, Review review, FirstLimitChart firstLimit, ReviewPictures pictures) {
    page.section("devices", "Devices and parts");
    ReviewLayout.figure(page, pictures.timeCurrent());
    pictures.use().ifPresent(p -> ReviewLayout.figure(page, p));
    pictures.sections().ifPresent(p -> ReviewLayout.figure(page, p));
    List<ComputedStart> starts =
        Stream.of("cold", "hot").flatMap(id -> review.start(id).stream()).toList();
    starts.forEach(s -> devices(page, s));
    if (!starts.isEmpty()) {
      parts(page, starts);
    }
    faults(page, firstLimit);
    page.end();
  }

  private static void devices(Html page, ComputedStart start) {
    String words = start.words();
    Cells devices =
        new Cells(page)
            .open(
                "Devices over the nominal "
                    + words
                    + " and 30 min of running after it; a use of 1.00 or more operates",
                List.of(
                    "device",
                    "edge",
                    "#use",
                    "#use by run-up",
                    "#operates",
                    "#clears",
                    "#current margin",
                    "#stretch margin",
                    "remark"),
                "class",
                "dense");
    for (DeviceResponse device : start.devices()) {
      devices.row(cells(device));
    }
    devices.close();
  }

  /** Every start has the same parts in the same order. */
  private static void parts(Html page, List<ComputedStart> starts) {
    List<String> heads = new ArrayList<>(List.of("part"));
    for (ComputedStart start : starts) {
      heads.add("#use, " + start.words());
      heads.add("#limit reached");
    }
    heads.add("remark");
    Cells cells =
        new Cells(page)
            .open(
                "Parts over the nominal starts; a use of 1.00 or more is past the limit",
                heads,
                "class",
                "dense");
    List<PartResponse> first = starts.get(0).parts();
    for (int i = 0; i < first.size(); i++) {
      List<String> row = new ArrayList<>(List.of(PartText.words(first.get(i).part())));
      for (ComputedStart start : starts) {
        PartResponse part = start.parts().get(i);
        boolean known = part.missing().isEmpty();
        row.add(known ? use(part.use()) : "–");
        row.add(known ? Show.seconds(part.limitAtSeconds()) : "–");
      }
      row.add(first.get(i).missing().map(path -> "not judged: give " + path).orElse(""));
      cells.row(row.toArray(String[]::new));
    }
    cells.close();
  }

  private static String[] cells(DeviceResponse device) {
    boolean known = device.notJudged().isEmpty();
    List<String> remarks = new ArrayList<>();
    device.notJudged().ifPresent(why -> remarks.add("not judged: " + why));
    device.bound().ifPresent(why -> remarks.add("a bound, not proven: " + why));
    return new String[] {
      device.device(),
      device.edge().word(),
      known ? use(device.use()) : "–",
      known ? use(device.useAtRunUp()) : "–",
      known ? Show.seconds(device.operatesAtSeconds()) : "–",
      known ? Show.seconds(device.clearsAtSeconds()) : "–",
      device.currentMargin().isPresent() ? Show.ratio(device.currentMargin().getAsDouble()) : "",
      device.stretchMargin().isPresent() ? Show.ratio(device.stretchMargin().getAsDouble()) : "",
      String.join("; ", remarks)
    };
  }

  /** A use never rounds to 1: below is below, above is above. */
  static String use(double use) {
    String shown = Show.ratio(use);
    if (!shown.equals("1.00") || use == 1.0) {
      return Double.isInfinite(use) ? "∞" : shown;
    }
    return use < 1.0 ? "0.999" : "1.001";
  }

  private static void faults(Html page, FirstLimitChart chart) {
    if (chart.rows().isEmpty()) {
      return;
    }
    Cells cells =
        new Cells(page)
            .open(
                "Faults, each at the corner and from the state where clearing and first limit lie"
                    + " closest; device slow edge, times from line closing",
                List.of(
                    "fault",
                    "decided at",
                    "cleared by",
                    "#at",
                    "first part at its limit",
                    "#at",
                    "#clearing ratio",
                    "finding"),
                "class",
                "faults");
    for (FaultRow row : chart.rows()) {
      Optional<FaultRow.Limit> limit = row.limit();
      cells.row(
          row.start().words(),
          row.start().corner().words(),
          row.clearings().isEmpty() ? "nothing" : row.clearings().get(0).device(),
          Show.seconds(row.clearingSeconds()),
          limit.map(l -> PartText.words(l.part())).orElse("none within 30 min"),
          row.limitSeconds() > 0.0 ? Show.seconds(row.limitSeconds()) : "before it",
          limit.isEmpty() ? "–" : Show.ratio(row.ratio()),
          row.open().map(why -> "not judged: " + why).orElse(row.finding()));
    }
    cells.close();
  }
}
