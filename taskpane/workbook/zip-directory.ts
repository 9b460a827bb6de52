/** One file inside a zip archive, as its directory lists it. */
export interface ZipEntry {
  name: string;
  /** Size when unpacked, in bytes, as the archive claims. */
  size: number;
}

const endOfDirectory = 0x06054b50;
const fileInDirectory = 0x02014b50;
/** A comment of at most 65,535 bytes may follow the end record of 22 bytes. */
const furthest = 65557;

/**
 * The directory of a zip archive, read without unpacking anything; undefined where the bytes are no whole archive.
 * (PKWARE's APPNOTE.TXT, 4.3.12 and 4.3.16; archives so large that they need 64-bit records are not taken.)
 */
export function zipDirectory(bytes: Uint8Array): ZipEntry[] | undefined {
  const view = new DataView(bytes.buffer, bytes.byteOffset, bytes.byteLength);
  const end = endRecord(view);
  if (end === undefined) return undefined;
  const count = view.getUint16(end + 10, true);
  let at = view.getUint32(end + 16, true);
  const entries: ZipEntry[] = [];
  for (let i = 0; i < count; i++) {
    if (at + 46 > view.byteLength || view.getUint32(at, true) !== fileInDirectory) return undefined;
    const [name, extra, comment] = [28, 30, 32].map((offset) => view.getUint16(at + offset, true));
    const text = new TextDecoder().decode(bytes.subarray(at + 46, at + 46 + name));
    entries.push({ name: text, size: view.getUint32(at + 24, true) });
    at += 46 + name + extra + comment;
  }
  return entries;
}

function endRecord(view: DataView): number | undefined {
  const lowest = Math.max(0, view.byteLength - furthest);
  for (let at = view.byteLength - 22; at >= lowest; at--) if (view.getUint32(at, true) === endOfDirectory) return at;
  return undefined;
}
