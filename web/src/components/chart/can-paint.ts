/** Whether this browser can paint at all; where it cannot, the table stands in the picture's place. */
export const canPaint = (): boolean => typeof Path2D !== 'undefined';
