package org.evenbeam.logbook;

/**
 * One open transaction, as the store knows it. Records interfaces take it as their first argument,
 * so that what belongs to one transaction is visible in the code.
 */
public interface Transaction {}
