/** Speed of light in vacuum, m/s (exact by definition of the metre). */
export const speedOfLightMPerS = 299_792_458;

/** Impedance of free space, Ω. */
export const freeSpaceImpedanceOhm = 376.7303;

/** Boltzmann constant, J/K (exact by definition of the kelvin). */
export const boltzmannJPerK = 1.380649e-23;
