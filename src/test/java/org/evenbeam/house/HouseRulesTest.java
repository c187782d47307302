package org.evenbeam.house;

import static org.assertj.core.api.Assertions.assertThat;

import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class HouseRulesTest {
  private static final String HOUSE = "org.evenbeam";
  private static final String PLANTED = "org.evenbeam.planted";
  private static final JavaClasses HOUSE_CLASSES =
      new ClassFileImporter()
          .withImportOption(ImportOption.Predefined.DO_NOT_INCLUDE_TESTS)
          .importPackages(HOUSE);
  private static final JavaClasses PLANTED_CLASSES =
      new ClassFileImporter().importPackages(PLANTED);

  static Stream<String> rules() {
    return HouseRules.over(HOUSE).keySet().stream();
  }

  @ParameterizedTest
  @MethodSource("rules")
  void theHouseKeepsItsRule(String rule) {
    HouseRules.over(HOUSE).get(rule).check(HOUSE_CLASSES);
  }

  @ParameterizedTest
  @MethodSource("rules")
  void aPlantedViolationBreaksTheRule(String rule) {
    boolean broken = HouseRules.over(PLANTED).get(rule).evaluate(PLANTED_CLASSES).hasViolation();

    assertThat(broken).as(rule).isTrue();
  }
}
