package org.evenbeam.ui.trail;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import javafx.beans.property.SimpleStringProperty;
import javafx.beans.property.StringProperty;
import javafx.collections.FXCollections;
import javafx.collections.ObservableList;
import org.evenbeam.logbook.Person;
import org.evenbeam.logbook.Session;
import org.evenbeam.logbook.history.TrailRecords;
import org.evenbeam.logbook.open.OpenLogbook;
import org.evenbeam.trail.ChainCheck;
import org.evenbeam.trail.EntryReader;
import org.evenbeam.trail.SealedEntry;
import org.evenbeam.trail.TrailEntry;
import org.evenbeam.trail.TrailFault;
import org.evenbeam.ui.common.Background;
import org.evenbeam.ui.common.ScreenTexts;

/** The newest entries of the audit trail, and the check of the whole chain. */
public final class TrailViewModel {
  private static final int SHOWN = 500;
  private static final int PAGE = 1000;

  private record Checked(long entries, Optional<TrailFault> fault) {}

  private final OpenLogbook logbook;
  private final Session session;
  private final Background background;
  private final ScreenTexts texts;
  private final ObservableList<TrailLine> lines = FXCollections.observableArrayList();
  private final StringProperty problem = new SimpleStringProperty("");
  private final StringProperty said = new SimpleStringProperty("");

  /** The trail as that person sees it. */
  public TrailViewModel(
      OpenLogbook logbook, Session session, Background background, ScreenTexts texts) {
    this.logbook = logbook;
    this.session = session;
    this.background = background;
    this.texts = texts;
  }

  /** Reads the newest entries anew. */
  public void load() {
    background.run(this::newest, lines::setAll, this::fail);
  }

  private List<TrailLine> newest() {
    Map<String, String> names = new HashMap<>();
    for (Person person : logbook.people().all(session)) {
      names.put(Long.toString(person.id()), person.name());
    }
    long head = logbook.trail().head(session).number();
    List<TrailLine> newestFirst = new ArrayList<>();
    for (SealedEntry sealed : logbook.trail().after(session, Math.max(0, head - SHOWN), SHOWN)) {
      newestFirst.add(0, line(EntryReader.read(sealed.canonical()), names));
    }
    return newestFirst;
  }

  private TrailLine line(TrailEntry entry, Map<String, String> names) {
    String person =
        entry
            .person()
            .map(key -> names.getOrDefault(key, key))
            .orElseGet(() -> texts.text("trail.program"));
    return new TrailLine(
        entry.number(),
        texts.dayAndTime(entry.at()),
        person,
        entry.action(),
        entry.reason().orElse(""));
  }

  /** Follows the chain from its first entry to its head. */
  public void check() {
    said.set(texts.text("trail.checking"));
    background.run(
        this::checked,
        checked ->
            said.set(
                checked
                    .fault()
                    .map(
                        fault ->
                            texts.text(
                                "trail.broken",
                                Long.toString(fault.entry()),
                                texts.name("trail.fault", fault.kind())))
                    .orElseGet(() -> texts.text("trail.whole", Long.toString(checked.entries())))),
        this::fail);
  }

  private Checked checked() {
    TrailRecords.Head head = logbook.trail().head(session);
    ChainCheck check = new ChainCheck();
    List<SealedEntry> page = logbook.trail().after(session, 0, PAGE);
    while (!page.isEmpty() && check.number() < head.number()) {
      for (SealedEntry entry : page) {
        if (entry.number() <= head.number() && check.next(entry).isPresent()) {
          return new Checked(check.number(), check.next(entry));
        }
      }
      page = logbook.trail().after(session, page.get(page.size() - 1).number(), PAGE);
    }
    return new Checked(check.number(), check.end(head.number(), head.hash()));
  }

  private void fail(Throwable thrown) {
    said.set("");
    problem.set(texts.problem(thrown));
  }

  /** The newest entries, newest first. */
  public ObservableList<TrailLine> lines() {
    return lines;
  }

  /** What went wrong; empty for nothing. */
  public StringProperty problem() {
    return problem;
  }

  /** What the check found, in words. */
  public StringProperty said() {
    return said;
  }
}
