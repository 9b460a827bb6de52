import { unzipSync } from "fflate";
import { FileProblem } from "./xlsx-book";

/** More than any workbook that the trial sheet can hold; beyond, the page would run out of memory. */
export const mostPacked = 60e6;
const mostUnpacked = 600e6;

/** The parts of a workbook file by their names; those that are not XML are named, and stay packed. */
export function unpack(bytes: Uint8Array): Record<string, Uint8Array> {
  if (bytes.length === 0) throw new FileProblem("The file is empty.");
  if (bytes.length > mostPacked) throw new FileProblem(tooLarge(bytes.length));
  if (startsWith(bytes, 0xd0, 0xcf, 0x11, 0xe0)) throw new FileProblem(oldOrLocked(bytes));
  if (!startsWith(bytes, 0x50, 0x4b)) throw new FileProblem(noWorkbook);
  let unpacked = 0;
  const packed: Record<string, Uint8Array> = {};
  try {
    const files = unzipSync(bytes, {
      filter: ({ name, originalSize }) => {
        if (!/\.(xml|rels)$/i.test(name)) {
          packed[name] = new Uint8Array();
          return false;
        }
        unpacked += originalSize;
        if (unpacked > mostUnpacked) throw new FileProblem(tooLarge(unpacked));
        return true;
      },
    });
    if (!files["[Content_Types].xml"]) throw new FileProblem(noWorkbook);
    if (Object.keys(packed).some((name) => /workbook\.bin$/i.test(name))) throw new FileProblem(binary);
    return { ...packed, ...files };
  } catch (error) {
    if (error instanceof FileProblem) throw error;
    throw new FileProblem("The file is damaged: its parts can't be unpacked. Fetch it again, or save it anew.", {
      cause: error,
    });
  }
}

function startsWith(bytes: Uint8Array, ...start: number[]): boolean {
  return start.every((byte, i) => bytes[i] === byte);
}

/** Both come as a compound file, [MS-CFB]; one that is locked holds a stream of this name, in UTF-16. */
function oldOrLocked(bytes: Uint8Array): string {
  const name = [..."EncryptedPackage"].flatMap((letter) => [letter.charCodeAt(0), 0]);
  for (let at = 0; at < bytes.length - name.length; at += 64) {
    if (name.every((byte, i) => bytes[at + i] === byte))
      return "The file is protected by a password. Save a copy without one in your spreadsheet, and open that.";
  }
  return "The file is of the old kind (.xls). Save it as .xlsx in your spreadsheet, and open that.";
}

const binary = "The file is a binary workbook (.xlsb). Save it as .xlsx in your spreadsheet, and open that.";
const noWorkbook = "The file isn't an .xlsx workbook. Open it in a spreadsheet, save it as .xlsx, and open that.";

export function tooLarge(size: number): string {
  return `The file is too large to be read here: ${Math.round(size / 1e6)} MB.`;
}
