export type SortedFiles = {
  readonly workbooks: readonly File[];
  readonly photographs: readonly File[];
  /** Neither, by their names. */
  readonly others: readonly string[];
};

const WORKBOOK = /\.(xlsx|xlsm|xlsb|xls|ods|csv)$/i;
const PHOTOGRAPH = /\.(jpe?g|png|webp|heic|heif|tiff?|gif|bmp)$/i;
/** What a system leaves in a folder for itself. */
const HIDDEN = /^(\.|thumbs\.db$|desktop\.ini$|~\$)/i;

/** Tells what was dropped apart by name. What a file really is, the server finds by its content. */
export function sortFiles(files: readonly File[]): SortedFiles {
  const workbooks: File[] = [];
  const photographs: File[] = [];
  const others: string[] = [];
  for (const file of files) {
    if (HIDDEN.test(file.name)) continue;
    if (WORKBOOK.test(file.name)) workbooks.push(file);
    else if (PHOTOGRAPH.test(file.name) || file.type.startsWith('image/')) photographs.push(file);
    else others.push(file.name);
  }
  return { workbooks, photographs, others };
}
