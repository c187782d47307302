package org.evenbeam.logbook.run;

import java.util.Optional;
import org.evenbeam.verification.Criterion;
import org.evenbeam.verification.DecisionRule;
import org.evenbeam.verification.Verdict;

/**
 * A finding as it was at submission, kept with the version of the rules that made it.
 *
 * @param checkPoint the check point's label
 * @param criterion what was asked
 * @param rule how it was decided
 * @param outcome what was decided; empty where no verdict could be given
 * @param rulesVersion the version of the rules
 * @param figures every figure of the finding, JSON in canonical form
 */
public record KeptFinding(
    String checkPoint,
    Criterion criterion,
    DecisionRule rule,
    Optional<Verdict> outcome,
    int rulesVersion,
    String figures) {}
