package sliprung.cli;

import java.io.PrintWriter;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import sliprung.config.CurveLibraryReader;
import sliprung.curve.CurveLibrary;
import sliprung.quantity.Show;

/** The curve library, read and checked. */
@Command(
    name = "curves",
    mixinStandardHelpOptions = true,
    description = "Lists the curve library with the source of each entry.")
final class CurvesCommand implements Callable<Integer> {
  private final PrintWriter out;

  CurvesCommand(PrintWriter out) {
    this.out = out;
  }

  @Override
  public Integer call() {
    CurveLibrary library = CurveLibraryReader.builtIn();
    out.println("Inverse-time laws, seconds at 2, 5 and 10 times the pick-up, multiplier 1:");
    library
        .inverse()
        .values()
        .forEach(
            law ->
                row(
                    law.name(),
                    Show.three(law.seconds(2.0, 1.0))
                        + " · "
                        + Show.three(law.seconds(5.0, 1.0))
                        + " · "
                        + Show.three(law.seconds(10.0, 1.0)),
                    law.reference(),
                    law.mark()));
    out.println();
    out.println("Overload trip classes, cold trip time at a multiple of the dial:");
    library
        .tripClasses()
        .values()
        .forEach(
            c ->
                row(
                    c.name(),
                    (c.shortestSeconds().isPresent()
                            ? Show.three(c.shortestSeconds().getAsDouble()) + " to "
                            : "up to ")
                        + Show.seconds(c.longestSeconds())
                        + " at "
                        + Show.three(c.multiple()),
                    c.reference(),
                    c.mark()));
    out.println();
    out.println(
        "gG fuse-links, A: not within 10 s · within 5 s · not within 0.1 s · within 0.1 s:");
    library
        .gg()
        .values()
        .forEach(
            g ->
                row(
                    Show.amps(g.ratingAmps()).replace('\u00a0', ' '),
                    Show.three(g.notIn10sAmps())
                        + " · "
                        + Show.three(g.within5sAmps())
                        + " · "
                        + Show.three(g.notIn100msAmps())
                        + " · "
                        + Show.three(g.within100msAmps()),
                    g.reference(),
                    g.mark()));
    return ExitStatus.CLEAR;
  }

  private void row(String name, String figures, String reference, String mark) {
    String plain = figures.replace('\u00a0', ' ');
    out.println(String.format("  %-26s%-32s%s (%s)", name, plain, reference, mark));
  }
}
