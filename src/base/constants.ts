/** Molar gas constant [J/(mol K)], exact since the 2019 SI (CODATA 2018). */
export const gasConstant = 8.31446261815324;

/** Standard atmosphere [Pa]: the atmosphere on which gauge pressures are read. */
export const standardAtmosphere = 101325;
