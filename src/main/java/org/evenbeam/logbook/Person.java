package org.evenbeam.logbook;

/**
 * A person of the laboratory.
 *
 * @param id the key in the logbook
 * @param signInName what is typed to sign in; unique
 * @param name as it stands on certificates
 * @param role what this person may do
 * @param active false once the person has left; people are never deleted
 */
public record Person(long id, String signInName, String name, Role role, boolean active) {}
