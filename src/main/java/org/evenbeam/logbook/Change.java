package org.evenbeam.logbook;

import java.time.Instant;
import java.util.Optional;

/**
 * What the audit trail writes about a transaction that changes something.
 *
 * @param at when, to the microsecond
 * @param person the key of who acts; empty for what the program does by itself
 * @param action the use case
 * @param reason why, where a reason was asked for
 */
public record Change(Instant at, Optional<Long> person, UseCase action, Optional<String> reason) {}
