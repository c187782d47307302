/**
 * Files that come in and go out: tables of check points and readings, and the whole-laboratory
 * import. Their content is hostile until it is checked; nothing is decided here.
 */
package org.evenbeam.exchange;
