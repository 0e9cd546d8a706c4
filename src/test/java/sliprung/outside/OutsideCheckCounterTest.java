package sliprung.outside;

import static org.assertj.core.api.Assertions.assertThat;
import static org.junit.platform.engine.discovery.DiscoverySelectors.selectClass;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.junit.platform.launcher.LauncherDiscoveryRequest;
import org.junit.platform.launcher.core.LauncherConfig;
import org.junit.platform.launcher.core.LauncherDiscoveryRequestBuilder;
import org.junit.platform.launcher.core.LauncherFactory;

/** The counter over small classes that the build itself does not run. */
class OutsideCheckCounterTest {

  @Test
  void should_count_leaves_of_every_kind_and_failures() {
    assertThat(printedBy(Sample.class)).containsExactly("Outside checks: 5 passed, 2 failed");
  }

  @Test
  void should_count_a_factory_that_fails_before_its_checks() {
    assertThat(printedBy(Broken.class)).containsExactly("Outside checks: 0 passed, 1 failed");
  }

  @Test
  void should_say_nothing_without_outside_checks() {
    assertThat(printedBy(Plain.class)).isEmpty();
  }

  private static List<String> printedBy(Class<?> type) {
    List<String> printed = new ArrayList<>();
    OutsideCheckCounter counter = new OutsideCheckCounter(printed::add);
    LauncherDiscoveryRequest request =
        LauncherDiscoveryRequestBuilder.request().selectors(selectClass(type)).build();
    LauncherConfig alone =
        LauncherConfig.builder().enableTestExecutionListenerAutoRegistration(false).build();
    LauncherFactory.create(alone).execute(request, counter);
    return printed;
  }

  static class Sample {
    @Test
    @Tag("outside")
    void single() {}

    @Test
    void not_tagged() {}

    @ParameterizedTest
    @ValueSource(ints = {1, 2, 3})
    @Tag("outside")
    void rows(int row) {
      assertThat(row).isNotEqualTo(2);
    }

    @TestFactory
    @Tag("outside")
    Stream<DynamicTest> dynamic() {
      return Stream.of(1, 2, 3)
          .map(n -> DynamicTest.dynamicTest("n" + n, () -> assertThat(n).isNotEqualTo(3)));
    }
  }

  static class Broken {
    @TestFactory
    @Tag("outside")
    Stream<DynamicTest> dynamic() {
      throw new IllegalStateException("no table");
    }
  }

  static class Plain {
    @Test
    void plain() {}
  }
}
