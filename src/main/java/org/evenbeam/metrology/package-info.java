/**
 * Numbers as a laboratory writes them: decimals as typed, units, certified values and their
 * uncertainty budgets. Sees {@code stats} only. Nothing here decides anything about an instrument;
 * that is {@code verification}.
 */
package org.evenbeam.metrology;
