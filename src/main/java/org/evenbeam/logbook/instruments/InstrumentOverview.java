package org.evenbeam.logbook.instruments;

import java.time.LocalDate;
import java.util.Optional;

/**
 * An instrument with what matters at the bench today.
 *
 * @param instrument the instrument
 * @param status its status, from its last event that set one
 * @param statusText the words of that event
 * @param lastVerified the day on which its last approved run that conforms was performed
 * @param nextDue that day and the plan's interval; empty before the first such run
 */
public record InstrumentOverview(
    Instrument instrument,
    InstrumentStatus status,
    String statusText,
    Optional<LocalDate> lastVerified,
    Optional<LocalDate> nextDue) {}
