package sliprung.dial;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import sliprung.config.CurveLibraryReader;
import sliprung.config.StarterReader;
import sliprung.rulebook.catalogue.Catalogue;
import sliprung.starter.Starter;

class DialsTest {

  private static Starter demo(String name) {
    return new StarterReader(CurveLibraryReader.builtIn(), Catalogue.names())
        .read(Path.of("configs", name))
        .described()
        .orElseThrow()
        .starter();
  }

  @Test
  void should_list_every_dial_in_the_order_of_the_file_and_no_fuse() {
    assertThat(Dials.of(demo("crusher.yaml")).stream().map(Dial::path))
        .containsExactly(
            "steps.K11.after",
            "steps.K12.after",
            "steps.K13.after",
            "steps.K14.after",
            "steps.K15.after",
            "protection.F2.dial",
            "protection.F3.pick-up",
            "protection.F3.time-multiplier",
            "protection.F4.pick-up",
            "protection.F5.time");
    assertThat(Dials.of(demo("hoist.yaml")).stream().map(Dial::path))
        .contains("steps.K21.rotor-frequency-below", "steps.K21.at-least", "protection.F3.time");
  }

  @Test
  void should_turn_one_dial_and_leave_all_others() {
    for (String demo : List.of("crusher.yaml", "hoist.yaml", "conveyor.yaml")) {
      Starter starter = demo(demo);
      for (Dial dial : Dials.of(starter)) {
        List<Dial> turned = Dials.of(dial.turned(starter, dial.value() * 1.5));
        for (Dial other : turned) {
          double before =
              Dials.of(starter).stream()
                  .filter(d -> d.path().equals(other.path()))
                  .findFirst()
                  .orElseThrow()
                  .value();
          assertThat(other.value())
              .as(dial.path() + " and " + other.path())
              .isEqualTo(other.path().equals(dial.path()) ? before * 1.5 : before);
        }
        assertThat(dial.turned(starter, dial.value())).isEqualTo(starter);
      }
    }
  }

  @Test
  void should_set_a_dial_by_its_steps_or_by_three_figures() {
    Dial free = Synthetic.first();
    Dial stepped = Synthetic.first(0.3, 10.0, 0.25, 0.0);

    assertThat(free.onScale(2.34567)).isEqualTo(2.35);
    assertThat(free.neighbour(2.35, -1)).isEqualTo(2.34);
    assertThat(stepped.onScale(2.34567)).isEqualTo(2.3);
    assertThat(stepped.onScale(0.0)).isEqualTo(0.3);
    assertThat(stepped.onScale(99.0)).isEqualTo(9.8);
    assertThat(stepped.neighbour(2.3, 1)).isEqualTo(2.55);
    assertThat(stepped.neighbour(0.3, -1)).isEqualTo(0.3);
  }
}
