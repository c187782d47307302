package org.evenbeam.logbook.people;

import org.evenbeam.logbook.Role;

/**
 * A person to be added.
 *
 * @param signInName what will be typed to sign in; unique
 * @param name as it will stand on certificates
 * @param role what this person may do
 */
public record NewPerson(String signInName, String name, Role role) {}
