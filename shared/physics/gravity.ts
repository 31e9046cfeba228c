/** Standard acceleration of free fall, m/s²; exact (3rd CGPM 1901). */
export const standardGravity = 9.80665;
