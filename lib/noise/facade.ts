/**
 * Sound at a facade and through it (EN 12354-3, ISO 16283-3; solver method 6), as factors on energy.
 * Entering power is L_in - 3 - R + 10 lg S for a free-field incident level L_in.
 */
export const ENTERING = 10 ** -0.3;

/** A listener on a facade hears the reflection: +3 dB. */
export const ON_FACADE = 10 ** 0.3;

/** Emitters behind the plane of the facade lose 10 dB (engineering value of the method). */
export const BEHIND_FACADE = 0.1;

/** D_c of a radiating element, dB: in front of a vertical face, behind it, over a roof or another face that lies flat. */
export const IN_FRONT = 3;
export const BEHIND_BUILDING = -7;
export const OVER_ROOF = 0;

/** C_d of a room with diffuse field, dB (EN 12354-4 Annex B). */
export const DIFFUSE = -6;
