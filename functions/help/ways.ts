/** Ways to a function: by what stood on the bench, and by what is to be known. Its words are searched as well. */
export interface Way {
  readonly from: string;
  /** In the order of use. */
  readonly functions: readonly string[];
  readonly hint?: string;
}

export const byMeasurement: readonly Way[] = [
  {
    from: 'gas burette, gas syringe, eudiometer: volume of gas',
    functions: ['GASVOLUME', 'REMAINING'],
    hint: 'over water, say that the gas is wet; PACE.DISSOLVED tells what the water holds back',
  },
  { from: 'pressure gauge on a closed vessel', functions: ['GASPRESSURE', 'REMAINING'] },
  { from: 'total pressure while one gas turns into others', functions: ['TOTALPRESSURE'] },
  {
    from: 'balance: mass lost as gas leaves',
    functions: ['MASSLOSS', 'REMAINING'],
    hint: 'give the readability, and hear whether the balance can see the loss at all',
  },
  { from: 'pH electrode, pH meter', functions: ['ACIDITY'] },
  { from: 'conductivity cell', functions: ['CONDUCTIVITY'] },
  {
    from: 'colorimeter, photometer, spectrophotometer: absorbance',
    functions: ['ABSORBANCE', 'STANDARDS'],
    hint: 'with a known absorptivity, or by standards',
  },
  { from: 'burette: quenched aliquots, titrated', functions: ['TITRE'] },
  {
    from: 'polarimeter, refractometer, dilatometer, any reading linear in concentration',
    functions: ['CONVERSION'],
  },
  { from: 'chromatograph or another instrument, by standards', functions: ['STANDARDS'] },
  {
    from: 'stopwatch: time until a colour change, a cross gone, a gas seen',
    functions: ['EVENT', 'EXPONENTS'],
  },
  { from: 'clock times or minutes and seconds', functions: ['CLOCK'] },
  { from: 'temperature logger', functions: ['MEANTEMP'] },
];

export const byQuestion: readonly Way[] = [
  { from: 'Can this run be trusted? Gaps, outliers, a late start, a plateau', functions: ['CHECK'] },
  { from: 'How fast at one moment?', functions: ['TANGENT', 'ALONG'] },
  { from: 'How fast at the start?', functions: ['START', 'EVENT'] },
  { from: 'How fast on average?', functions: ['BETWEEN'] },
  { from: 'Which order does this run follow?', functions: ['ORDERS', 'ORDER', 'HALVINGS'] },
  { from: 'Which order in each reactant?', functions: ['EXPONENTS', 'OVERLAYORDER', 'NORMALTIME'] },
  {
    from: 'What is the rate coefficient (rate constant) k, and its unit?',
    functions: ['COEFFICIENT', 'UNIT'],
  },
  { from: 'What is the half life?', functions: ['HALFLIFE', 'HALVINGS'] },
  { from: 'Does the fit look right beside the data?', functions: ['CURVE', 'ORDERS'] },
  { from: 'Many runs at once, a plate', functions: ['SURVEY'] },
  { from: 'How does it depend on temperature? Activation energy', functions: ['ARRHENIUS', 'EYRING'] },
  { from: 'How fast at another temperature?', functions: ['COEFFICIENTAT'] },
  { from: 'How long until a given share is gone? Shelf life', functions: ['TIMETO', 'COEFFICIENTAT'] },
  { from: 'What single temperature stands for a warm and a cold spell?', functions: ['MEANTEMP'] },
  { from: 'Several steps, intermediates, a mechanism', functions: ['COURSE', 'FITCOURSE'] },
  { from: 'When should I take readings next time?', functions: ['PLAN'] },
];

/** The way of the job, from left to right; each part with where to begin. */
export const job: readonly Way[] = [
  { from: 'Check', functions: ['CHECK', 'CLOCK'], hint: 'is the run sound?' },
  {
    from: 'Amount',
    functions: ['GASVOLUME', 'MASSLOSS', 'ABSORBANCE', 'TITRE', 'REMAINING'],
    hint: 'reading to amount',
  },
  { from: 'Rate', functions: ['TANGENT', 'START', 'BETWEEN'], hint: 'how fast' },
  { from: 'Order', functions: ['ORDERS', 'EXPONENTS'], hint: 'by which law' },
  { from: 'k and half life', functions: ['COEFFICIENT', 'HALFLIFE', 'UNIT'], hint: 'the numbers' },
  { from: 'Temperature', functions: ['ARRHENIUS', 'EYRING'], hint: 'how it moves' },
  { from: 'Prediction', functions: ['COEFFICIENTAT', 'TIMETO'], hint: 'how long' },
];
