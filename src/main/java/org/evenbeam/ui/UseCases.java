package org.evenbeam.ui;

import org.evenbeam.logbook.certificates.Certificates;
import org.evenbeam.logbook.instruments.Instruments;
import org.evenbeam.logbook.people.People;
import org.evenbeam.logbook.plans.Plans;
import org.evenbeam.logbook.run.Bench;
import org.evenbeam.logbook.run.Runs;
import org.evenbeam.logbook.run.Submissions;
import org.evenbeam.logbook.signoff.SignOff;

/** What the screens can ask of the logbook. */
public record UseCases(
    People people,
    Instruments instruments,
    Plans plans,
    Runs runs,
    Bench bench,
    Submissions submissions,
    SignOff signOff,
    Certificates certificates) {}
