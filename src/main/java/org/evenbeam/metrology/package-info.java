/**
 * Numbers as a laboratory writes them: decimals as typed, units, certified values and their
 * uncertainty budgets; and the physics of the bench: densities of water and air, volume from
 * weighings, values against temperature, a balance's minimum weight and eccentricity. Sees {@code
 * stats} only. Nothing here decides anything about an instrument; that is {@code verification}.
 */
package org.evenbeam.metrology;
