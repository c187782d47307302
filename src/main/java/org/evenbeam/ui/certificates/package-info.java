/** Certificates: their history, and looking at one. */
package org.evenbeam.ui.certificates;
