package sliprung.architecture;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static org.assertj.core.api.Assertions.assertThat;

import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;

/** Holds the import table of DEVELOPERS.md: packages depend one way only. */
class ImportTableTest {
  private static final JavaClasses CLASSES =
      new ClassFileImporter()
          .withImportOption(new ImportOption.DoNotIncludeTests())
          .importPackages("sliprung");

  private static final String RULES = "rulebook..";

  /** Package → what of ours it may import, then third-party prefixes. */
  private static final Map<String, List<String>> MAY_IMPORT =
      new TreeMap<>(
          Map.ofEntries(
              Map.entry("quantity", List.of()),
              Map.entry("numeric", List.of("org.apache.commons.math3..")),
              Map.entry("curve", List.of("quantity", "numeric")),
              Map.entry("starter", List.of("quantity", "curve")),
              Map.entry("config", List.of("quantity", "curve", "starter", "org.yaml.snakeyaml..")),
              Map.entry("machine", List.of("starter", "numeric", "quantity")),
              Map.entry("runup", List.of("starter", "machine", "numeric", "quantity")),
              Map.entry(
                  "protection",
                  List.of("starter", "machine", "runup", "curve", "numeric", "quantity")),
              Map.entry("tolerance", List.of("starter", "machine", "runup", "numeric", "quantity")),
              Map.entry(
                  RULES,
                  List.of(
                      RULES,
                      "quantity",
                      "starter",
                      "machine",
                      "runup",
                      "curve",
                      "protection",
                      "tolerance")),
              Map.entry(
                  "review",
                  List.of(
                      "quantity",
                      "curve",
                      "starter",
                      "numeric",
                      "machine",
                      "runup",
                      "protection",
                      "tolerance",
                      RULES)),
              Map.entry(
                  "sampling",
                  List.of(
                      "starter",
                      "machine",
                      "runup",
                      "protection",
                      "tolerance",
                      "review",
                      "org.apache.commons.math3..")),
              Map.entry(
                  "sensitivity",
                  List.of(
                      "quantity",
                      "numeric",
                      "starter",
                      "machine",
                      "runup",
                      "protection",
                      "tolerance",
                      RULES,
                      "review")),
              Map.entry(
                  "dial",
                  List.of(
                      "quantity",
                      "numeric",
                      "starter",
                      "machine",
                      "runup",
                      "tolerance",
                      RULES,
                      "review")),
              Map.entry(
                  "chart",
                  List.of(
                      "quantity",
                      "curve",
                      "starter",
                      "machine",
                      "runup",
                      "protection",
                      "tolerance",
                      RULES,
                      "review",
                      "org.jfree..",
                      "org.apache.batik..",
                      "java.awt..",
                      "org.w3c.dom..")),
              Map.entry(
                  "record",
                  List.of(
                      "quantity",
                      "curve",
                      "starter",
                      "machine",
                      "runup",
                      "protection",
                      "tolerance",
                      RULES,
                      "review",
                      "dial",
                      "sampling",
                      "sensitivity",
                      "chart",
                      "com.fasterxml.jackson..",
                      "com.openhtmltopdf..",
                      "org.apache.pdfbox..",
                      "de.rototor.pdfbox..",
                      "org.w3c.dom..",
                      "java.awt..")),
              Map.entry(
                  "cli",
                  List.of(
                      "quantity",
                      "curve",
                      "starter",
                      "config",
                      "machine",
                      "runup",
                      "protection",
                      "tolerance",
                      RULES,
                      "review",
                      "dial",
                      "sampling",
                      "sensitivity",
                      "chart",
                      "record",
                      "picocli.."))));

  private static final List<String> JDK =
      List.of("java.lang..", "java.util..", "java.time..", "java.math..", "java.text..");
  private static final Set<String> MAY_DO_IO = Set.of("config", "record", "chart", "cli", RULES);

  @TestFactory
  Stream<DynamicTest> each_package_imports_only_its_row() {
    return MAY_IMPORT.entrySet().stream()
        .map(
            row ->
                DynamicTest.dynamicTest(
                    row.getKey(),
                    () -> {
                      List<String> allowed = new ArrayList<>(JDK);
                      allowed.add("sliprung." + row.getKey());
                      if (MAY_DO_IO.contains(row.getKey())) {
                        allowed.add("java.io..");
                        allowed.add("java.nio..");
                        allowed.add("java.security..");
                      }
                      row.getValue()
                          .forEach(
                              p -> allowed.add(MAY_IMPORT.containsKey(p) ? "sliprung." + p : p));
                      classes()
                          .that()
                          .resideInAPackage("sliprung." + row.getKey())
                          .should()
                          .onlyDependOnClassesThat(
                              com.tngtech.archunit.core.domain.JavaClass.Predicates
                                  .resideInAnyPackage(allowed.toArray(String[]::new))
                                  .or(
                                      com.tngtech.archunit.base.DescribedPredicate.describe(
                                          "primitives and arrays of them",
                                          c -> c.getBaseComponentType().isPrimitive())))
                          .check(CLASSES);
                    }));
  }

  @Test
  void every_package_has_a_row_and_every_row_has_classes() {
    Set<String> found =
        CLASSES.stream()
            .map(JavaClass::getPackageName)
            .filter(p -> p.startsWith("sliprung."))
            .map(p -> p.substring("sliprung.".length()))
            .map(p -> p.startsWith("rulebook") ? RULES : p)
            .collect(Collectors.toSet());
    assertThat(found).containsExactlyInAnyOrderElementsOf(MAY_IMPORT.keySet());
  }

  @Test
  void only_the_command_line_prints_or_exits() {
    noClasses()
        .that()
        .resideOutsideOfPackage("sliprung.cli..")
        .should()
        .accessField(System.class, "out")
        .orShould()
        .accessField(System.class, "err")
        .orShould()
        .callMethod(System.class, "exit", int.class)
        .check(CLASSES);
  }
}
