package org.evenbeam.trail;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.evenbeam.trail.TrailFault.Kind;
import org.junit.jupiter.api.Test;

class ChainCheckTest {
  private final List<SealedEntry> chain =
      new ArrayList<>(Entries.chain(List.of(), List.of(), List.of(), List.of()));

  @Test
  void wholeChainIsFoundWhole() {
    assertThat(check()).isEmpty();
  }

  @Test
  void emptyChainIsWholeWithAHeadOfZero() {
    assertThat(new ChainCheck().end(0, TrailEntry.NO_PREVIOUS)).isEmpty();
  }

  @Test
  void missingEntryIsFound() {
    chain.remove(1);
    assertThat(check()).contains(TrailFault.ofChain(Kind.NUMBER_OUT_OF_ORDER, 3));
  }

  @Test
  void missingFirstEntryIsFound() {
    chain.remove(0);
    assertThat(check()).contains(TrailFault.ofChain(Kind.NUMBER_OUT_OF_ORDER, 2));
  }

  @Test
  void entriesInTheWrongOrderAreFound() {
    chain.add(1, chain.remove(2));
    assertThat(check()).contains(TrailFault.ofChain(Kind.NUMBER_OUT_OF_ORDER, 3));
  }

  @Test
  void missingLastEntryIsFoundByTheHead() {
    SealedEntry last = chain.remove(3);
    assertThat(check(last.number(), last.hash()))
        .contains(TrailFault.ofChain(Kind.HEAD_DIFFERS, 4));
  }

  @Test
  void headWithAnotherHashIsFound() {
    assertThat(check(4, "ff".repeat(32))).contains(TrailFault.ofChain(Kind.HEAD_DIFFERS, 4));
  }

  @Test
  void changedTextIsFound() {
    SealedEntry entry = chain.get(2);
    chain.set(
        2, new SealedEntry(3, 1, entry.canonical().replace("entered", "struck"), entry.hash()));
    assertThat(check()).contains(TrailFault.ofChain(Kind.HASH_DIFFERS, 3));
  }

  @Test
  void changedTextWithItsHashMadeAnewIsFoundAtTheNextEntry() {
    chain.set(1, sealed(2, chain.get(1).canonical().replace("entered", "struck")));
    assertThat(check()).contains(TrailFault.ofChain(Kind.PREVIOUS_DIFFERS, 3));
  }

  @Test
  void textThatIsNotCanonicalIsFound() {
    chain.set(3, sealed(4, chain.get(3).canonical().replace(",", ", ")));
    assertThat(check()).contains(TrailFault.ofChain(Kind.NOT_CANONICAL, 4));
  }

  @Test
  void textThatIsNoEntryIsFound() {
    chain.set(3, sealed(4, "{}"));
    assertThat(check()).contains(TrailFault.ofChain(Kind.NOT_CANONICAL, 4));
    chain.set(3, sealed(4, "no JSON at all"));
    assertThat(check()).contains(TrailFault.ofChain(Kind.NOT_CANONICAL, 4));
  }

  @Test
  void otherNumberInsideTheTextIsFound() {
    chain.set(
        3, sealed(4, chain.get(3).canonical().replace("\"number\":\"4\"", "\"number\":\"5\"")));
    assertThat(check()).contains(TrailFault.ofChain(Kind.NUMBER_DIFFERS, 4));
  }

  @Test
  void unknownFormIsFound() {
    SealedEntry entry = chain.get(0);
    chain.set(0, new SealedEntry(1, 2, entry.canonical(), entry.hash()));
    assertThat(check()).contains(TrailFault.ofChain(Kind.FORM_UNKNOWN, 1));
  }

  @Test
  void firstFaultStays() {
    chain.remove(1);
    chain.remove(1);
    ChainCheck check = new ChainCheck();
    check.next(chain.get(0));
    Optional<TrailFault> first = check.next(chain.get(1));
    assertThat(check.next(chain.get(0))).isEqualTo(first);
    assertThat(check.end(9, "")).isEqualTo(first).isPresent();
  }

  private Optional<TrailFault> check() {
    SealedEntry last = chain.get(chain.size() - 1);
    return check(last.number(), last.hash());
  }

  private Optional<TrailFault> check(long head, String hash) {
    ChainCheck check = new ChainCheck();
    chain.forEach(check::next);
    return check.end(head, hash);
  }

  private static SealedEntry sealed(long number, String canonical) {
    String hash = Sha256.hex(canonical.getBytes(StandardCharsets.UTF_8));
    return new SealedEntry(number, TrailEntry.FORM, canonical, hash);
  }
}
