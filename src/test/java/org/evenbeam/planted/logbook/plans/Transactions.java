package org.evenbeam.planted.logbook.plans;

/** A way round the desk. */
public final class Transactions {}
