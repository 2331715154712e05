/** The names that the mock of Excel's objects asks of a package that only Node can load. */
export const OfficeApp = { Excel: 'Excel' };
