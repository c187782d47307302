package org.evenbeam.house;

import static com.tngtech.archunit.core.domain.JavaClass.Predicates.resideInAPackage;
import static com.tngtech.archunit.core.domain.JavaClass.Predicates.resideInAnyPackage;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;

import com.tngtech.archunit.base.DescribedPredicate;
import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaCodeUnit;
import com.tngtech.archunit.lang.ArchCondition;
import com.tngtech.archunit.lang.ArchRule;
import com.tngtech.archunit.lang.ConditionEvents;
import com.tngtech.archunit.lang.SimpleConditionEvent;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;

/** The directions and manners of the house, over whichever root package they are asked of. */
final class HouseRules {
  /** Which packages each package may see, besides itself. */
  private static final Map<String, Sees> SEES = new LinkedHashMap<>();

  static {
    List<String> pure = List.of("verification", "metrology", "stats");
    List<String> logbook = List.of("logbook", "trail", "verification", "metrology", "stats");
    List<String> people =
        List.of("logbook", "trail", "picture", "wording", "verification", "metrology", "stats");
    SEES.put("stats", new Sees(List.of(), "numbers in, records out, for any purpose"));
    SEES.put("metrology", new Sees(List.of("stats"), "units and budgets decide nothing"));
    SEES.put(
        "verification",
        new Sees(
            List.of("metrology", "stats"), "decisions are pure: no store, no screen, no text"));
    SEES.put("picture", new Sees(pure, "a picture is described once, for screen and paper"));
    SEES.put(
        "wording",
        new Sees(
            List.of("picture", "verification", "metrology", "stats"),
            "sentences are made from codes, never from records kept"));
    SEES.put("trail", new Sees(List.of(), "the offline checker uses it without the rest"));
    SEES.put(
        "logbook",
        new Sees(
            List.of("trail", "verification", "metrology", "stats"),
            "use cases own the interfaces that they need, and see no edge"));
    SEES.put("store", new Sees(logbook, "the edges never see one another"));
    SEES.put("exchange", new Sees(logbook, "the edges never see one another"));
    SEES.put("certificate", new Sees(people, "the edges never see one another"));
    SEES.put("cli", new Sees(people, "commands work through use cases, and know no screen"));
    SEES.put("ui", new Sees(people, "screens work through use cases, and know no edge"));
  }

  private record Sees(List<String> packages, String because) {}

  private HouseRules() {}

  /** Every rule by its name. */
  static Map<String, ArchRule> over(String root) {
    Map<String, ArchRule> rules = new LinkedHashMap<>();
    SEES.forEach(
        (name, sees) -> rules.put(name + " sees only what lies below", layer(root, name, sees)));
    rules.put("packages have no cycles", noCycles(root));
    rules.put("view models know no toolkit", viewModels(root));
    rules.put("transactions are reached through the desk", desk(root));
    rules.put("time comes from the clock that was given", clock(root));
    rules.put("broad catches stand only at an edge", catches(root));
    return rules;
  }

  private static ArchRule layer(String root, String name, Sees sees) {
    String[] allowed =
        Stream.concat(Stream.of(name), sees.packages().stream())
            .map(p -> root + "." + p + "..")
            .toArray(String[]::new);
    DescribedPredicate<JavaClass> ours = resideInAPackage(root + "..");
    return noClasses()
        .that()
        .resideInAPackage(root + "." + name + "..")
        .should()
        .dependOnClassesThat(
            ours.and(DescribedPredicate.not(resideInAnyPackage(allowed)))
                .as("reside outside %s", List.of(allowed)))
        .because(sees.because())
        .allowEmptyShould(true);
  }

  private static ArchRule noCycles(String root) {
    return slices()
        .matching(root + ".(**)")
        .should()
        .beFreeOfCycles()
        .because("a knot of packages can only be understood whole")
        .allowEmptyShould(true);
  }

  private static ArchRule viewModels(String root) {
    return noClasses()
        .that()
        .resideInAPackage(root + ".ui..")
        .and()
        .haveSimpleNameEndingWith("ViewModel")
        .should()
        .dependOnClassesThat(
            resideInAPackage("javafx..")
                .and(
                    DescribedPredicate.not(
                        resideInAnyPackage("javafx.beans..", "javafx.collections..")))
                .as("belong to the toolkit"))
        .because("they are tested without a stage")
        .allowEmptyShould(true);
  }

  private static ArchRule desk(String root) {
    return noClasses()
        .that()
        .resideInAPackage(root + ".logbook..")
        .and()
        .doNotHaveSimpleName("Desk")
        .and()
        .doNotHaveSimpleName("Transactions")
        .and()
        .doNotHaveSimpleName("People")
        .and()
        .doNotHaveSimpleName("LaboratorySetUp")
        .should()
        .dependOnClassesThat()
        .haveSimpleName("Transactions")
        .because("no use case goes round its permission; only signing in has nobody to ask yet")
        .allowEmptyShould(true);
  }

  private static ArchRule clock(String root) {
    return classes()
        .that()
        .resideInAPackage(root + "..")
        .and()
        .resideOutsideOfPackage(root + ".app..")
        .should(notCallTheSystemClock())
        .because("a run must be the same whenever it is replayed")
        .allowEmptyShould(true);
  }

  private static ArchCondition<JavaClass> notCallTheSystemClock() {
    return new ArchCondition<>("not call the system clock") {
      @Override
      public void check(JavaClass type, ConditionEvents events) {
        type.getMethodCallsFromSelf().stream()
            .filter(
                call -> {
                  String owner = call.getTargetOwner().getName();
                  String method = call.getName();
                  return owner.startsWith("java.time.")
                      && (method.equals("now") || method.startsWith("system"));
                })
            .forEach(
                call -> events.add(SimpleConditionEvent.violated(call, call.getDescription())));
      }
    };
  }

  private static ArchRule catches(String root) {
    return classes()
        .that()
        .resideInAPackage(root + "..")
        .and()
        .resideOutsideOfPackage(root + ".app..")
        .should(catchOnlyWhatTheyName())
        .because("an error that nobody named is for the edge to report")
        .allowEmptyShould(true);
  }

  private static ArchCondition<JavaClass> catchOnlyWhatTheyName() {
    return new ArchCondition<>("catch only what they name") {
      @Override
      public void check(JavaClass type, ConditionEvents events) {
        for (JavaCodeUnit unit : type.getCodeUnits()) {
          unit.getTryCatchBlocks().stream()
              .flatMap(block -> block.getCaughtThrowables().stream())
              .filter(
                  caught ->
                      caught.isEquivalentTo(Exception.class)
                          || caught.isEquivalentTo(RuntimeException.class))
              .forEach(
                  caught ->
                      events.add(
                          SimpleConditionEvent.violated(
                              unit, unit.getFullName() + " catches " + caught.getName())));
        }
      }
    };
  }
}
