/** Sides of an outline, in mm. */
export const smallestMm = 1;
export const largestMm = 5000;

/** Corners of a drawn outline, its holes included. */
export const mostCorners = 3000;
export const mostHoles = 200;
