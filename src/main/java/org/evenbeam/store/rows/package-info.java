/**
 * The one way by which rows of trailed tables are written: a transaction that notes every row it
 * touches and seals them with one entry of the audit trail. Which rows a subject has is {@code
 * store.tables}; how the database is opened is {@code store}.
 */
package org.evenbeam.store.rows;
