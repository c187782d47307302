/**
 * The tables of each subject, as {@code logbook}'s records interfaces ask for them. Each class
 * reads its tables by SQL and adds to them through {@code store.rows}; what may be done is decided
 * in {@code logbook}, what may never be is refused by the constraints in {@code migrations}.
 */
package org.evenbeam.store.tables;
