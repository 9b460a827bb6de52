import { CFB } from "@e965/xlsx";
import { describe, expect, test } from "vitest";
import { look } from "../../taskpane/findings/look";
import { fileWorkbook } from "../../taskpane/workbook/file";
import { FileProblem } from "../../taskpane/workbook/xlsx-book";
import { cleanBooks } from "./clean-books";
import { saveWorkbook, withParts } from "./save-workbook";

const book = cleanBooks["ion extraction"]().build();
const saved = saveWorkbook(book);

describe("a saved workbook", () => {
  test("reads back with its values, formulas, spills, tables and names, under the names that were typed", async () => {
    const { sheets, names } = await fileWorkbook(saved).read();
    expect(names).toEqual(book.names);
    const [was, is] = [book.sheets[1], sheets[1]];
    expect(is.tables).toEqual(was.tables);
    expect(is.spills).toEqual(was.spills);
    const at = (row: number, column: number) => [is.values[row - 1][column], is.formulas[row - 1]?.[column]];
    expect(at(4, 4)).toEqual([was.values[1][3], '=SHEATH.CHILDCURRENT(B4,D4,ion,,,"mA/cm^2")']);
    expect(at(4, 3)[1]).toBe('=SHEATH.SHEATHWIDTH(Grid[[#This Row],[V]],Grid[[#This Row],[n edge]],T_e,"child")');
    expect(at(5, 6)).toEqual([was.values[2][5], undefined]);
  });

  test.each(Object.entries(cleanBooks))("has the same findings as in the sheet, none: %s", async (_, make) => {
    const { findings, notFollowed, calls } = await look(await fileWorkbook(saveWorkbook(make().build())).read());
    expect({ findings, notFollowed }).toEqual({ findings: [], notFollowed: [] });
    expect(calls).toBeGreaterThan(30);
  });

  test("may spell our functions in any case, and a text that looks like one stays text", async () => {
    const sheet = { ...book.sheets[0], origin: "A1", values: [[1, 2]], spills: [], tables: [] };
    const formulas = [["=_xldudf_sheath_debyelength(1e16,3)", '="_xldudf_SHEATH_X("&"a"']];
    const [read] = (await fileWorkbook(saveWorkbook({ names: {}, sheets: [{ ...sheet, formulas }] })).read()).sheets;
    expect(read.formulas).toEqual([["=SHEATH.DEBYELENGTH(1e16,3)", '="_xldudf_SHEATH_X("&"a"']]);
  });

  test("with one cell far out is not made as wide in every row", async () => {
    const sheet = {
      ...book.sheets[0],
      origin: "XFD99999",
      values: [[1]],
      formulas: [[undefined]],
      spills: [],
      tables: [],
    };
    const [read] = (await fileWorkbook(saveWorkbook({ names: {}, sheets: [sheet] })).read()).sheets;
    expect(read.values).toHaveLength(99999);
    expect(read.values.reduce((sum, row) => sum + row.length, 0)).toBe(16384);
  });

  test("gives the settings that were kept in it", async () => {
    const value = JSON.stringify(JSON.stringify({ k: { reason: 'a "b" & c', date: "2026-05-04", print: "p" } }));
    const escaped = value.replaceAll("&", "&amp;").replaceAll('"', "&quot;");
    const part =
      '<we:webextension xmlns:we="http://schemas.microsoft.com/office/webextensions/webextension/2010/11"><we:properties>' +
      `<we:property name="wallfall.accepted" value="${escaped}"/></we:properties></we:webextension>`;
    const workbook = fileWorkbook(withParts(saved, { "xl/webextensions/webextension1.xml": part }));
    expect(JSON.parse((await workbook.getSetting("accepted"))!).k.reason).toBe('a "b" & c');
    expect(await workbook.getSetting("other")).toBeUndefined();
  });
});

describe("a file that cannot be looked through says why", () => {
  const refused = (bytes: Uint8Array) => {
    try {
      fileWorkbook(bytes);
    } catch (error) {
      if (error instanceof FileProblem) return error.message;
      throw error;
    }
    return "";
  };

  const container = (stream: string) => {
    const cfb = CFB.utils.cfb_new();
    CFB.utils.cfb_add(cfb, `/${stream}`, new Uint8Array(5000) as never);
    return new Uint8Array(CFB.write(cfb, { type: "array" as never }) as never);
  };

  const archive = (name: string) => {
    const zip = CFB.utils.cfb_new();
    CFB.utils.cfb_add(zip, `/${name}`, new Uint8Array(9) as never);
    return new Uint8Array(CFB.write(zip, { fileType: "zip" as never, type: "array" as never }) as never);
  };

  /** The same file, whose directory says that one part unpacks to four thousand million bytes. */
  const swollen = () => {
    const bytes = saved.slice();
    const view = new DataView(bytes.buffer);
    for (let at = 0; at < bytes.length - 46; at++)
      if (view.getUint32(at, true) === 0x02014b50) view.setUint32(at + 24, 4_000_000_000, true);
    return bytes;
  };

  test.each([
    ["no bytes", new Uint8Array(0), /is empty/],
    ["a text", new TextEncoder().encode("n_e;T_e\n1e16;3\n"), /isn't an \.xlsx workbook/],
    ["a workbook cut off", saved.slice(0, saved.length - 400), /damaged.*save it anew/],
    ["an archive of something else", archive("notes.txt"), /isn't an \.xlsx workbook/],
    ["a password", container("EncryptedPackage"), /protected by a password\. Save a copy without one/],
    ["an older format", container("Workbook"), /old kind.*Save it as \.xlsx/],
    [
      "macros",
      withParts(saved, { "xl/vbaProject.bin": new Uint8Array(9) }),
      /carries macros.*Save a copy without them/,
    ],
    ["old macros", withParts(saved, { "xl/macrosheets/sheet1.xml": "<x/>" }), /carries macros/],
    [
      "a binary workbook",
      withParts(saved, { "xl/workbook.bin": new Uint8Array(9) }),
      /binary workbook.*Save it as \.xlsx/,
    ],
    ["what unpacks to gigabytes", swollen(), /too large/],
    ["sixty million bytes and more", new Uint8Array(60_000_001), /too large to be read here: 60 MB/],
  ])("%s", (_, bytes, says) => {
    expect(refused(bytes)).toMatch(says);
  });
});
