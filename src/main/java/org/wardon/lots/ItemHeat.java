package org.wardon.lots;

/**
 * How an item takes, holds and conducts heat.
 *
 * @param densityKgM3 density with air spaces, kg/m3
 * @param specificHeatJkgK specific heat, J/(kg K)
 * @param conductivityWmK conductivity with air spaces, W/(m K)
 */
record ItemHeat(double densityKgM3, double specificHeatJkgK, double conductivityWmK) {}
