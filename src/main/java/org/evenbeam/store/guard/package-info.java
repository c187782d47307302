/**
 * The triggers of guarded tables. A laboratory's database file names these classes: none of them is
 * ever renamed, moved or removed, or every insert into an older file fails. Nothing else lives
 * here; which table has which guard is said in {@code migrations/h2}.
 */
package org.evenbeam.store.guard;
