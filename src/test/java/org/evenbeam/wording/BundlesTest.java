package org.evenbeam.wording;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.evenbeam.logbook.NotFound;
import org.evenbeam.logbook.Role;
import org.evenbeam.logbook.StoreFailed;
import org.evenbeam.logbook.UseCase;
import org.evenbeam.logbook.run.RunState;
import org.evenbeam.metrology.NumberRefused;
import org.evenbeam.verification.CheckRisk;
import org.evenbeam.verification.Condition;
import org.evenbeam.verification.Criterion;
import org.evenbeam.verification.DecisionRule;
import org.evenbeam.verification.Note;
import org.evenbeam.verification.Verdict;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class BundlesTest {
  private static final Path SOURCES = Path.of("src/main/java/org/evenbeam");
  private static final Pattern REFUSAL =
      Pattern.compile(
          "(?:super|new \\w+(?:Refused|Input))\\(\\s*(?:cause,\\s*)?\"([a-z][a-z-]*)\"");
  private static final Pattern LITERAL = Pattern.compile("\"([a-z][a-z-]*)\"");

  private final Words words = new Words(Locale.ENGLISH);
  private final Map<String, String> problems = words.all(Words.Bundle.PROBLEM);

  static Stream<Enum<?>> namedInProblems() {
    return Stream.of(
            Role.values(),
            NotFound.Thing.values(),
            RunState.values(),
            UseCase.values(),
            StoreFailed.Reason.values(),
            NumberRefused.Reason.values())
        .flatMap(Arrays::stream);
  }

  @ParameterizedTest
  @MethodSource("namedInProblems")
  void everyConstantThatARefusalNamesHasAWord(Enum<?> constant) {
    assertThat(problems)
        .containsKey(constant.getDeclaringClass().getSimpleName() + "." + constant.name());
  }

  @Test
  void everyRefusalHasItsSentenceAndEverySentenceItsRefusal() throws IOException {
    Set<String> thrown = inSources(REFUSAL);
    Set<String> worded =
        problems.keySet().stream()
            .filter(key -> Character.isLowerCase(key.charAt(0)))
            .collect(Collectors.toCollection(TreeSet::new));

    assertThat(thrown).hasSizeGreaterThan(40);
    assertThat(worded).containsAll(thrown);
    assertThat(inSources(LITERAL)).containsAll(worded);
  }

  private static Set<String> inSources(Pattern pattern) throws IOException {
    TreeSet<String> found = new TreeSet<>();
    try (Stream<Path> files = Files.walk(SOURCES)) {
      for (Path file : files.filter(f -> f.toString().endsWith(".java")).toList()) {
        Matcher matcher = pattern.matcher(Files.readString(file));
        while (matcher.find()) {
          found.add(matcher.group(1));
        }
      }
    }
    return found;
  }

  @Test
  void everyNoteHasItsSentence() {
    Map<String, String> findings = words.all(Words.Bundle.FINDING);
    for (Class<?> note : Note.class.getPermittedSubclasses()) {
      assertThat(findings.keySet()).anyMatch(key -> key.startsWith("note." + note.getSimpleName()));
    }
  }

  @Test
  void everyConstantOfFindingsHasAWord() {
    List<String> needed =
        Stream.of(
                Stream.of(Verdict.values()).map(v -> "verdict." + v),
                Stream.of(DecisionRule.values()).map(v -> "rule." + v),
                Stream.of(Criterion.values()).map(v -> "criterion." + v),
                Stream.of(Condition.values()).map(v -> "condition." + v),
                Stream.of(CheckRisk.Origin.values()).map(v -> "risk.assumed." + v))
            .flatMap(keys -> keys)
            .toList();

    assertThat(words.all(Words.Bundle.FINDING)).containsKeys(needed.toArray(String[]::new));
  }
}
