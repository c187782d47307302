/**
 * The certificate press: an editable template is filled from a certificate record, set on pages and
 * printed as PDF, with the same pictures as the screen. What a certificate says is settled in its
 * record; nothing is decided here.
 */
package org.evenbeam.certificate;
