package sliprung.rulebook.resistor;

import java.util.ArrayList;
import java.util.List;
import sliprung.protection.SectionElement;
import sliprung.runup.Stage;
import sliprung.runup.StartHistory;
import sliprung.runup.Trace;
import sliprung.starter.ResistorBank;

/**
 * One section over equal starts for ever: groups of starts in a row, one group each period, in the
 * air of the enclosure.
 *
 * <p>Two bodies in series. The element warms above the air around it, the air above the room. With
 * the air's share f of the whole rise at the limit, {@code θ = (1 − f) E + f A}, the element {@code
 * dE/dt = ((I/I_ref)² − E)/((1 − f) τ)}, so that its first rise from cold stays that of its
 * ratings, and the air {@code dA/dt = (drive − A)/τ_air}. Both are linear: the state at the
 * beginning of a period that repeats is {@code x/(1 − exp(−P/τ))}, with x what one period leaves
 * from cold. Nobody gives f: 0 and the greatest are both taken, and the worse counts. The air is
 * driven by the section's own heat or by the whole bank's, each over what it may give off for good,
 * whichever is more.
 */
final class RepeatedStarts {
  private final SectionElement element;
  private final double airSeconds;
  private final List<Piece> pieces;

  /** A piece of a start: the drives are squares of current over what is borne for good. */
  private record Piece(double seconds, double own, double bank) {}

  private RepeatedStarts(SectionElement element, double airSeconds, List<Piece> pieces) {
    this.element = element;
    this.airSeconds = airSeconds;
    this.pieces = pieces;
  }

  /**
   * Of one section in one permitted start.
   *
   * @param elements of every section, in their order
   * @param number of the section, from 1
   */
  static RepeatedStarts of(
      ResistorBank bank, List<SectionElement> elements, int number, StartHistory history) {
    double share = bank.sectionShare() * bank.sectionShare();
    double whole = 0.0;
    for (int k = 1; k <= elements.size(); k++) {
      double reference = elements.get(k - 1).referenceAmps();
      whole += bank.sections().get(k - 1).ohms() * reference * reference;
    }
    double reference = elements.get(number - 1).referenceAmps();
    List<Piece> pieces = new ArrayList<>();
    for (Stage stage : history.stages()) {
      double ohmsIn = 0.0;
      for (int k : stage.sectionsIn()) {
        ohmsIn += bank.sections().get(k - 1).ohms();
      }
      boolean in = stage.sectionsIn().contains(number);
      Trace trace = stage.trace();
      double[] t = trace.seconds();
      double[] i = trace.ringAmps();
      for (int k = 0; k + 2 < t.length; k += 2) {
        double square =
            share * (i[k] * i[k] + 4.0 * i[k + 1] * i[k + 1] + i[k + 2] * i[k + 2]) / 6.0;
        pieces.add(
            new Piece(
                t[k + 2] - t[k],
                in ? square / (reference * reference) : 0.0,
                square * ohmsIn / whole));
      }
    }
    return new RepeatedStarts(elements.get(number - 1), bank.enclosureSeconds(), pieces);
  }

  /**
   * Greatest level of the section in the steady cycle, 1 at its limit.
   *
   * @param inARow starts in a group
   * @param periodSeconds from one group to the next; at least as long as the group
   * @param greatestAirShare f
   */
  double peak(int inARow, double periodSeconds, double greatestAirShare) {
    double none = peak(inARow, periodSeconds, 0.0, false);
    double own = peak(inARow, periodSeconds, greatestAirShare, false);
    double bank = peak(inARow, periodSeconds, greatestAirShare, true);
    return Math.max(none, Math.max(own, bank));
  }

  private double peak(int inARow, double periodSeconds, double airShare, boolean byBank) {
    double length = inARow * pieces.stream().mapToDouble(Piece::seconds).sum();
    double period = Math.max(periodSeconds, length);
    double tau = (1.0 - airShare) * element.timeConstantSeconds();
    State cold = new State(0.0, 0.0, tau, airShare, byBank);
    cold.run(inARow);
    cold.rest(period - length);
    State steady =
        new State(
            cold.body / (1.0 - Math.exp(-period / tau)),
            cold.air / (1.0 - Math.exp(-period / airSeconds)),
            tau,
            airShare,
            byBank);
    steady.run(inARow);
    return steady.peak;
  }

  private final class State {
    private final double tau;
    private final double airShare;
    private final boolean byBank;
    private double body;
    private double air;
    private double peak;

    State(double body, double air, double tau, double airShare, boolean byBank) {
      this.body = body;
      this.air = air;
      this.tau = tau;
      this.airShare = airShare;
      this.byBank = byBank;
      this.peak = level();
    }

    private double level() {
      return (1.0 - airShare) * body + airShare * air;
    }

    void run(int starts) {
      for (int n = 0; n < starts; n++) {
        for (Piece piece : pieces) {
          advance(piece.seconds(), piece.own(), byBank ? piece.bank() : piece.own());
        }
      }
    }

    void rest(double seconds) {
      advance(seconds, 0.0, 0.0);
    }

    private void advance(double seconds, double own, double drive) {
      body = own + (body - own) * Math.exp(-seconds / tau);
      air = drive + (air - drive) * Math.exp(-seconds / airSeconds);
      peak = Math.max(peak, level());
    }
  }
}
