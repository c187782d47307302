package org.evenbeam.cli;

import java.util.ArrayList;
import java.util.List;
import org.evenbeam.verification.CheckPointFindings;
import org.evenbeam.wording.Sentences;

/** Findings as lines for a person. */
final class FindingsText {
  private final Sentences sentences;

  FindingsText(Sentences sentences) {
    this.sentences = sentences;
  }

  /** The lines of one check point. */
  List<String> lines(CheckPointFindings found) {
    List<String> lines = new ArrayList<>();
    lines.add(found.question().label() + ": " + sentences.verdict(found.verdict()));
    sentences.findings(found, "").forEach(sentence -> lines.add("  " + sentence));
    found.notes().forEach(note -> lines.add("  " + sentences.notes().sentence(note, "")));
    return lines;
  }
}
