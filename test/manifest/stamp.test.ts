import { readFileSync } from "node:fs";
import { DOMParser } from "@xmldom/xmldom";
import { expect, test } from "vitest";
import { readOrigin, stamp } from "../../manifest/build/stamp.js";

const source = readFileSync(new URL("../../manifest/manifest.xml", import.meta.url), "utf8");
const facts = { origin: "https://plasma.example.org/wallfall", version: "1.2.3", id: undefined, name: undefined };

function textOf(xml: string, name: string): string | null {
  return new DOMParser().parseFromString(xml, "text/xml").getElementsByTagName(name)[0].textContent;
}

test("every address moves under the given origin, folder and all", async () => {
  const stamped = await stamp(source, facts);
  expect(stamped).not.toContain("localhost");
  expect(stamped.split("https://plasma.example.org/wallfall/").length).toBe(
    source.split("https://localhost:3000/").length,
  );
});

test("nothing but addresses, version and comments changes", async () => {
  const same = { ...facts, origin: "https://localhost:3000", version: "0.0.0" };
  const plain = (xml: string) =>
    xml
      .replace(/<!--.*?-->|<\?xml.*?\?>/gs, "")
      .replace(/\s+/g, " ")
      .replace(/> </g, "><")
      .trim();
  expect(plain(await stamp(source, same))).toBe(plain(source));
});

test("the version gets the fourth part that the platform wants", async () => {
  expect(textOf(await stamp(source, facts), "Version")).toBe("1.2.3.0");
  await expect(stamp(source, { ...facts, version: "next" })).rejects.toThrow(/takes numbers only, such as 1.2.3/);
});

test("a copy under another name and id keeps everything else", async () => {
  const id = "00000000-0000-4000-8000-000000000001";
  const stamped = await stamp(source, { ...facts, id, name: "Wallfall & friends" });
  expect(textOf(stamped, "Id")).toBe(id);
  expect(stamped).toContain('<DisplayName DefaultValue="Wallfall &amp; friends"/>');
});

test("an id that is none gets one offered", async () => {
  await expect(stamp(source, { ...facts, id: "random" })).rejects.toThrow(
    /give a UUID of your own, such as [\da-f-]{36}$/,
  );
});

test("a manifest that is not well-formed is refused, not mended", async () => {
  await expect(stamp(source.replace("</Hosts>", ""), facts)).rejects.toThrow(/manifest.xml/);
});

test("an origin is an https address; a slash at its end is dropped", () => {
  expect(readOrigin(undefined)).toBe("https://localhost:3000");
  expect(readOrigin("https://plasma.example.org/wallfall/")).toBe("https://plasma.example.org/wallfall");
  for (const text of ["plasma.example.org", "http://plasma.example.org", "https://plasma.example.org/?a=1", ""]) {
    expect(() => readOrigin(text), text).toThrow(/give an https address such as/);
  }
});
