/** Raised when pictures would be prepared otherwise; facts are kept by it. */
export const PHOTO_PIPELINE = '1';
