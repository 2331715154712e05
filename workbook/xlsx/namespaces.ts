/** The two families of names that a workbook may be written in: a new part goes by those of the others. */
export interface Namespaces {
  readonly main: string;
  readonly office: string;
}

/** ISO/IEC 29500-4, which nearly every program writes. */
export const transitional: Namespaces = {
  main: 'http://schemas.openxmlformats.org/spreadsheetml/2006/main',
  office: 'http://schemas.openxmlformats.org/officeDocument/2006/relationships',
};

/** ISO/IEC 29500-1: "Strict Open XML Spreadsheet" among the kinds that Excel saves. */
const strict: Namespaces = {
  main: 'http://purl.oclc.org/ooxml/spreadsheetml/main',
  office: 'http://purl.oclc.org/ooxml/officeDocument/relationships',
};

/** @param xml of the workbook's part, or of one of its sheets */
export const namespacesOf = (xml: string): Namespaces => (xml.includes(strict.main) ? strict : transitional);
