package org.evenbeam.picture;

import java.util.Optional;
import org.evenbeam.verification.CheckPointFindings;
import org.evenbeam.verification.CheckPointQuestion;
import org.evenbeam.verification.Verdict;

/** What a picture shows, for the sentence that stands in its place. */
public sealed interface PictureContent {
  /** Bias against its limits; no findings before the first reading. */
  record Beam(CheckPointQuestion question, Optional<CheckPointFindings> findings)
      implements PictureContent {}

  /** Standard deviation against its limit; no findings before the first reading. */
  record Spread(CheckPointQuestion question, Optional<CheckPointFindings> findings)
      implements PictureContent {}

  /** A verdict's mark; empty for none yet. */
  record Mark(Optional<Verdict> verdict) implements PictureContent {}
}
