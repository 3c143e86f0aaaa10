/** Pi, correctly rounded. */
export const PI = 3.141592653589793;

/** Degrees to radians. */
export const radians = (degrees: number): number => (degrees * PI) / 180;
