/** The run sheet: readings as they are typed, and beside them what they show. */
package org.evenbeam.ui.runsheet;
