/** Rows of a sheet with a fit, which a copy freezes: 8, 4, 2, 1 at 0, 10, 20 and 30. */
export const fit =
  '<row r="1"><c r="A1"><v>0</v></c><c r="B1"><v>8</v></c><c r="C1"><f>_xldudf_PACE_COEFFICIENT(A1:A4,B1:B4,1)</f></c></row>' +
  [4, 2, 1]
    .map(
      (y, n) =>
        `<row r="${n + 2}"><c r="A${n + 2}"><v>${10 * n + 10}</v></c><c r="B${n + 2}"><v>${y}</v></c></row>`,
    )
    .join('');
