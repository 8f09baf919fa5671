/** All files of a drop, folders opened however deep. Must be called while the drop event is handled: entries are gone after it. */
export async function readDropped(transfer: DataTransfer): Promise<File[]> {
  const entries = [...transfer.items].flatMap((item) => item.webkitGetAsEntry() ?? []);
  if (entries.length === 0) return [...transfer.files];
  const found = await Promise.all(entries.map(filesOf));
  return found.flat();
}

async function filesOf(entry: FileSystemEntry): Promise<File[]> {
  if (isFile(entry)) {
    return [await new Promise<File>((resolve, reject) => entry.file(resolve, reject))];
  }
  if (!isDirectory(entry)) return [];
  const reader = entry.createReader();
  const found: File[] = [];
  // A reader gives its folder in portions and ends with an empty one.
  for (let part = await portion(reader); part.length > 0; part = await portion(reader)) {
    for (const child of part) found.push(...(await filesOf(child)));
  }
  return found;
}

const portion = (reader: FileSystemDirectoryReader): Promise<FileSystemEntry[]> =>
  new Promise((resolve, reject) => reader.readEntries(resolve, reject));
const isFile = (entry: FileSystemEntry): entry is FileSystemFileEntry => entry.isFile;
const isDirectory = (entry: FileSystemEntry): entry is FileSystemDirectoryEntry => entry.isDirectory;
