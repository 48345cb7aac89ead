/** Speed of sound in air at 20 °C, m/s. */
export const SPEED_OF_SOUND = 343.2;

/** Density of air at 20 °C, kg/m³. */
export const AIR_DENSITY = 1.204;

/** Characteristic impedance of air, N s/m³. */
export const AIR_IMPEDANCE = AIR_DENSITY * SPEED_OF_SOUND;

/** Stiffness of a metre of air when it is squeezed quickly (adiabatic): rho c², Pa. */
export const ADIABATIC_BULK_MODULUS = AIR_DENSITY * SPEED_OF_SOUND ** 2;

/** The same between fibres that hold the temperature (isothermal): the pressure of the air, Pa. */
export const ISOTHERMAL_BULK_MODULUS = 101_325;
