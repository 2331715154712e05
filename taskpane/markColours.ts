/**
 * The colours of the cells that a formula reads, the first one's first: in the formula, on its buttons, in the sheet.
 * On light ground; each stands beside a number, since not everybody tells them apart.
 */
const markColours = ['#175c66', '#ad4310', '#6b3fa0', '#5b6b12'] as const;

/** @param place from 0; after the last colour they begin anew */
export const markColour = (place: number): string => markColours[place % markColours.length];
