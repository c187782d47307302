package org.evenbeam.ui.runsheet;

import java.util.Optional;
import org.evenbeam.verification.Verdict;

/**
 * A check point among the others.
 *
 * @param label how it is called
 * @param counting how many readings count
 * @param planned how many the plan asks for
 * @param verdict what was decided; empty for nothing yet
 */
public record PointTab(String label, int counting, int planned, Optional<Verdict> verdict) {}
