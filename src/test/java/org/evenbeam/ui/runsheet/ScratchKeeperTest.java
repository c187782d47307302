package org.evenbeam.ui.runsheet;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import java.util.function.Consumer;
import java.util.function.Supplier;
import org.evenbeam.ui.common.Background;
import org.junit.jupiter.api.Test;

class ScratchKeeperTest {
  private final Deque<Runnable> inFlight = new ArrayDeque<>();
  private final List<String> saved = new ArrayList<>();
  private final ScratchKeeper keeper =
      new ScratchKeeper(
          new OneByOne(), (point, text) -> saved.add(point + ": " + text), thrown -> {});

  @Test
  void oneSaveIsInFlightAndTheNewestTextWins() {
    keeper.keep("50 g", "5");
    keeper.keep("50 g", "50");
    keeper.keep("50 g", "50.1");
    assertThat(inFlight).hasSize(1);
    inFlight.remove().run();
    assertThat(inFlight).hasSize(1);
    inFlight.remove().run();
    assertThat(inFlight).isEmpty();
    assertThat(saved).containsExactly("50 g: 5", "50 g: 50.1");
  }

  @Test
  void whatBecameAReadingIsNoLongerSaved() {
    keeper.keep("50 g", "50");
    keeper.keep("50 g", "50.1");
    keeper.forget("50 g");
    inFlight.remove().run();
    assertThat(inFlight).isEmpty();
    assertThat(saved).containsExactly("50 g: 50");
  }

  @Test
  void eachCheckPointKeepsItsOwn() {
    keeper.keep("50 g", "50");
    keeper.keep("100 g", "100");
    inFlight.remove().run();
    inFlight.remove().run();
    assertThat(saved).containsExactly("50 g: 50", "100 g: 100");
  }

  private final class OneByOne implements Background {
    @Override
    public <T> void run(Supplier<T> work, Consumer<T> done, Consumer<Throwable> failed) {
      inFlight.add(() -> done.accept(work.get()));
    }
  }
}
