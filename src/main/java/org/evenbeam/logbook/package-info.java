/**
 * What every use case shares: who acts ({@link org.evenbeam.logbook.Session}), what each role may
 * do ({@link org.evenbeam.logbook.UseCase}), the one way into a transaction ({@link
 * org.evenbeam.logbook.Desk}) and the root of every refusal. The use cases themselves live one
 * package below, by subject, each beside the interfaces that it needs from the store.
 */
package org.evenbeam.logbook;
