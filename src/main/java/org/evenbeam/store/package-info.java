/**
 * Where a laboratory's logbook is kept: the database in its folder, opened by one program at a
 * time; its migrations, its two users and their passwords; transactions that are on the disk when
 * they return. Rows and their trail are {@code store.rows}, the subjects' tables {@code
 * store.tables}, the triggers {@code store.guard}. What may be done by whom is {@code logbook};
 * nothing here asks for a permission.
 */
package org.evenbeam.store;
