/**
 * Certificates of approved runs: the record written in one transaction, the document made from it
 * outside any, their history. How a document is set and printed is the certificate press's
 * business.
 */
package org.evenbeam.logbook.certificates;
