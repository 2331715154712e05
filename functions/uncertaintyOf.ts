/** Where the uncertainty of an answer comes from, in the words that several functions share. */
export const uncertaintyOf = {
  conversion:
    'None is given: each reading is converted by itself. The scatter of the readings shows in the uncertainty of a rate or a rate coefficient worked out from them; what shifts all of them alike, such as a wrong blank or temperature, does not.',
  line: 'The standard uncertainty comes from the scatter about what is fitted by least squares; the 95 % limits are Student’s, with the degrees of freedom that are left.',
  neighbours:
    'The standard uncertainty carries the scatter of single readings through; the 95 % limits are Student’s.',
  tangent:
    'With points given, the standard uncertainty comes from the scatter about the polynomial, with points − degree − 1 degrees of freedom, and knows nothing of a bend the polynomial cannot follow. With points left out, uncertainty and limits are those of one degree more in the same readings, which are nearly free of that bias, from the scatter pooled over the run. The 95 % limits are Student’s.',
  profile:
    'The standard uncertainty comes from the curvature of the sum of squares at its least. The 95 % limits are those of the profile likelihood: they hold every value that an F test at the 5 % level cannot rule out, and need not lie evenly on both sides.',
  readability:
    'With a readability, from the steps of the display alone: each of the two masses lies anywhere within half a step, so their difference has the standard uncertainty δ/√6 (GUM, F.2.2.1). It was stated, not estimated, so its degrees of freedom are ∞.',
} as const;
