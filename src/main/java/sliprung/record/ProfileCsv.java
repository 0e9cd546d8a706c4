package sliprung.record;

import sliprung.review.Review;
import sliprung.rulebook.ComputedStart;
import sliprung.runup.Stage;
import sliprung.runup.Trace;

/**
 * Writes {@code profile.csv}: the nominal cold start over time, a comma between cells, a point in
 * numbers, CR LF at the end of lines (RFC 4180).
 */
public final class ProfileCsv {
  private static final double RPM = 30.0 / Math.PI;
  private static final String HEAD =
      "time_s,step,closed_by,speed_rpm,stator_a,ring_a,torque_nm,load_torque_nm,terminal_v,rotor_hz";

  private ProfileCsv() {}

  /** The whole file; the heading alone where the nominal cold start was not computed. */
  public static String text(Review review) {
    StringBuilder out = new StringBuilder(HEAD).append("\r\n");
    review.start("cold").ifPresent(cold -> rows(out, review, cold));
    return out.toString();
  }

  private static void rows(StringBuilder out, Review review, ComputedStart cold) {
    double hertz = review.starter().supply().frequency();
    for (Stage stage : cold.history().everything()) {
      Trace trace = stage.trace();
      for (int i = 0; i < trace.size(); i++) {
        double speed = trace.speed()[i];
        out.append(trace.seconds()[i]).append(',');
        out.append(stage.step()).append(',').append(cell(stage.closedBy())).append(',');
        out.append(speed * RPM).append(',');
        out.append(trace.statorAmps()[i]).append(',');
        out.append(trace.ringAmps()[i]).append(',');
        out.append(trace.torque()[i]).append(',');
        out.append(trace.loadTorque()[i]).append(',');
        out.append(trace.terminalVolts()[i]).append(',');
        out.append(Math.abs(review.machine().slip(speed)) * hertz).append("\r\n");
      }
    }
  }

  /**
   * A user's text as a cell: quoted where it must be, and led by an apostrophe where a spreadsheet
   * would take it for a formula.
   */
  static String cell(String text) {
    String safe = text.isEmpty() || "=+-@\t\r\n".indexOf(text.charAt(0)) < 0 ? text : "'" + text;
    boolean quoted =
        safe.indexOf(',') >= 0
            || safe.indexOf('"') >= 0
            || safe.indexOf('\r') >= 0
            || safe.indexOf('\n') >= 0;
    return quoted ? "\"" + safe.replace("\"", "\"\"") + "\"" : safe;
  }
}
