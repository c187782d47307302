/**
 * What the logbook asks of files: the interfaces and the records that pass through them. Reading
 * and writing the files themselves is the exchange's business.
 */
package org.evenbeam.logbook.files;
