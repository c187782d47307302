package org.evenbeam.logbook.open;

import org.evenbeam.logbook.certificates.Certificates;
import org.evenbeam.logbook.history.TrailReading;
import org.evenbeam.logbook.instruments.Instruments;
import org.evenbeam.logbook.laboratory.LaboratorySetUp;
import org.evenbeam.logbook.people.People;
import org.evenbeam.logbook.plans.Plans;
import org.evenbeam.logbook.run.Bench;
import org.evenbeam.logbook.run.Runs;
import org.evenbeam.logbook.run.Submissions;
import org.evenbeam.logbook.signoff.SignOff;
import org.evenbeam.logbook.standards.Standards;

/** The use cases of one open logbook. */
public record OpenLogbook(
    LaboratorySetUp laboratory,
    People people,
    Instruments instruments,
    Standards standards,
    Plans plans,
    Runs runs,
    Bench bench,
    Submissions submissions,
    SignOff signOff,
    Certificates certificates,
    TrailReading trail) {}
