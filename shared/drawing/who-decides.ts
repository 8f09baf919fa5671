/** Stands under every sheet. */
export const WHO_DECIDES =
  'Local codes, the maker’s instructions and a licensed engineer decide; this sheet does not.';
