package sliprung.outside;

import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import java.util.function.Consumer;
import org.junit.platform.engine.TestExecutionResult;
import org.junit.platform.engine.TestExecutionResult.Status;
import org.junit.platform.engine.TestTag;
import org.junit.platform.launcher.TestExecutionListener;
import org.junit.platform.launcher.TestIdentifier;
import org.junit.platform.launcher.TestPlan;

/**
 * Counts the tests tagged {@code outside}, whose expected figure comes from outside the project,
 * and prints one line when the run ends: {@code Outside checks: 87 passed, 0 failed}.
 *
 * <p>Every leaf counts: each row of a parameterised test, each dynamic test. A tagged container
 * that fails before its leaves ran counts as one failure, so that lost checks do not go unseen.
 */
public final class OutsideCheckCounter implements TestExecutionListener {
  private static final TestTag OUTSIDE = TestTag.create("outside");

  private final Map<Status, Integer> counts = new ConcurrentHashMap<>();
  private final Consumer<String> printer;
  private int skipped;
  private TestPlan plan;

  /** As the launcher makes it: prints on the console. */
  public OutsideCheckCounter() {
    this(System.out::println);
  }

  OutsideCheckCounter(Consumer<String> printer) {
    this.printer = printer;
  }

  @Override
  public void testPlanExecutionStarted(TestPlan testPlan) {
    plan = testPlan;
    counts.clear();
    skipped = 0;
  }

  @Override
  public void executionSkipped(TestIdentifier identifier, String reason) {
    if (isOutside(identifier)) {
      skipped++;
    }
  }

  @Override
  public void executionFinished(TestIdentifier identifier, TestExecutionResult result) {
    boolean counted = identifier.isTest() || result.getStatus() == Status.FAILED;
    if (counted && isOutside(identifier)) {
      counts.merge(result.getStatus(), 1, Integer::sum);
    }
  }

  @Override
  public void testPlanExecutionFinished(TestPlan testPlan) {
    String line = summary();
    if (!line.isEmpty()) {
      printer.accept(line);
    }
  }

  private String summary() {
    int passed = counts.getOrDefault(Status.SUCCESSFUL, 0);
    int failed = counts.getOrDefault(Status.FAILED, 0);
    int notRun = counts.getOrDefault(Status.ABORTED, 0) + skipped;
    if (passed + failed + notRun == 0) {
      return "";
    }
    String line = "Outside checks: " + passed + " passed, " + failed + " failed";
    return notRun == 0 ? line : line + ", " + notRun + " not run";
  }

  /** A dynamic test need not repeat the tag of the method that made it: its parents are asked. */
  private boolean isOutside(TestIdentifier identifier) {
    TestIdentifier at = identifier;
    while (at != null) {
      if (at.getTags().contains(OUTSIDE)) {
        return true;
      }
      at = plan.getParent(at).orElse(null);
    }
    return false;
  }
}
