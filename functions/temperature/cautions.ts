/** Where a figure of this family can be taken for more than it is. */
export const shelfLifeCaution =
  'A shelf life or a storage limit is not decided by this figure: the governing guideline and a qualified person decide. Local rules come first.';
