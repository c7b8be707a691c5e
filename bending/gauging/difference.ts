/** mm and radians. Half-widths of central differences of the exact model: their error is under 1e-6 of a millimetre a radian for a metre of lever. */
export const difference = { shift: 0.01, turn: 1e-4 } as const;
