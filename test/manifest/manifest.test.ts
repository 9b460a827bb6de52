import { existsSync, readFileSync } from "node:fs";
import { DOMParser, type Element } from "@xmldom/xmldom";
import { OfficeAddinManifest } from "office-addin-manifest";
import { describe, expect, test } from "vitest";
import packageJson from "../../package.json";
import { built, readBuilt } from "./built";

const origin = "https://localhost:3000";
const root = new DOMParser().parseFromString(readBuilt("manifest.xml"), "text/xml").documentElement!;
const all = [...root.getElementsByTagName("*")];
const resources = all.filter((element) => element.hasAttribute("id") && element.tagName.startsWith("bt:"));

/** The elements at a path of names, each step a child of the one before. */
function at(...path: string[]): Element[] {
  return path.reduce((found, name) => found.flatMap((each) => children(each).filter(is(name))), [root as Element]);
}

function children(element: Element): Element[] {
  return [...element.childNodes].filter((node): node is Element => node.nodeType === node.ELEMENT_NODE);
}

function is(name: string) {
  return (element: Element) => element.tagName === name;
}

/** What a resid stands for. */
function resource(resid: string): Element[] {
  return resources.filter((element) => element.getAttribute("id") === resid);
}

const value = (element: Element) => element.getAttribute("DefaultValue") ?? "";

test("the platform's own tool reads the manifest as a task pane add-in for workbooks", async () => {
  const read = await OfficeAddinManifest.readManifestFile(built("manifest.xml"));
  expect(read).toMatchObject({
    id: expect.stringMatching(/^[\da-f]{8}-[\da-f]{4}-4[\da-f]{3}-[89ab][\da-f]{3}-[\da-f]{12}$/),
    version: `${packageJson.version}.0`,
    displayName: "Wallfall",
    officeAppType: "TaskPaneApp",
    hosts: ["Workbook"],
    permissions: "ReadWriteDocument",
    defaultSettings: { sourceLocation: `${origin}/taskpane.html` },
  });
});

test("the functions go by the namespace SHEATH, and run apart from the pane", () => {
  const [functions] = at("VersionOverrides", "Hosts", "Host", "AllFormFactors", "ExtensionPoint");
  expect(functions.getAttribute("xsi:type")).toBe("CustomFunctions");
  const [namespace] = children(functions).filter(is("Namespace"));
  expect(value(resource(namespace.getAttribute("resid")!)[0])).toBe("SHEATH");
  expect(all.filter(is("Runtimes"))).toEqual([]);
  expect(at("Requirements", "Sets", "Set").map((set) => set.getAttribute("Name"))).toEqual(["CustomFunctionsRuntime"]);
});

test("the button on the ribbon opens the pane", () => {
  const [action] = all.filter(is("Action"));
  expect(action.getAttribute("xsi:type")).toBe("ShowTaskpane");
  const [location] = children(action).filter(is("SourceLocation"));
  expect(value(resource(location.getAttribute("resid")!)[0])).toBe(`${origin}/taskpane.html`);
});

test("every resid names one resource of the kind that its place takes", () => {
  const kinds: Record<string, string> = {
    "bt:Image": "bt:Image",
    SourceLocation: "bt:Url",
    LearnMoreUrl: "bt:Url",
    FunctionFile: "bt:Url",
    Namespace: "bt:String",
    Label: "bt:String",
    Title: "bt:String",
    Description: "bt:String",
  };
  const users = all.filter((element) => element.hasAttribute("resid"));
  expect(users.length).toBeGreaterThan(15);
  for (const user of users) {
    const resid = user.getAttribute("resid")!;
    expect(
      resource(resid).map(({ tagName }) => tagName),
      resid,
    ).toEqual([kinds[user.tagName]]);
  }
});

test("no resource is left unused", () => {
  const used = new Set(all.map((element) => element.getAttribute("resid")));
  expect(resources.map((element) => element.getAttribute("id")!).filter((id) => !used.has(id))).toEqual([]);
});

test("every address in the manifest is under its origin, and its file is in the build", () => {
  const addresses = all.map(value).filter((text) => text.includes("://"));
  expect(addresses.length).toBeGreaterThan(10);
  for (const address of addresses) {
    expect(address.startsWith(`${origin}/`), address).toBe(true);
    expect(existsSync(built(new URL(address).pathname.slice(1))), address).toBe(true);
  }
});

// The platform's documentation, from memory: texts of the add-in, its resources, and the ids that point at them.
describe("the platform's length limits are kept", () => {
  const lengths: [string, Element[], (element: Element) => string, number][] = [
    ["display name", at("DisplayName"), value, 125],
    ["provider name", at("ProviderName"), (element) => element.textContent!, 125],
    ["description", at("Description"), value, 250],
    ["short strings", at("VersionOverrides", "Resources", "bt:ShortStrings", "bt:String"), value, 125],
    ["long strings", at("VersionOverrides", "Resources", "bt:LongStrings", "bt:String"), value, 250],
    ["addresses", all.filter((element) => value(element).includes("://")), value, 2048],
    ["ids of resources", resources, (element) => element.getAttribute("id")!, 32],
    [
      "ids of controls",
      [...all.filter(is("Group")), ...all.filter(is("Control"))],
      (element) => element.getAttribute("id")!,
      125,
    ],
    ["ids of panes", all.filter(is("TaskpaneId")), (element) => element.textContent!, 125],
  ];
  test.each(lengths)("%s", (_what, elements, text, most) => {
    expect(elements.length).toBeGreaterThan(0);
    for (const element of elements) {
      expect(text(element).length, text(element)).toBeGreaterThan(0);
      expect(text(element).length, text(element)).toBeLessThanOrEqual(most);
    }
  });
});

test("labels and titles take short strings, the descriptions beside them long ones", () => {
  const listOf = (element: Element) => resource(element.getAttribute("resid")!)[0].parentNode!.nodeName;
  const overrides = at("VersionOverrides")[0];
  const inside = (name: string) => [...overrides.getElementsByTagName(name)];
  for (const element of [...inside("Label"), ...inside("Title")]) expect(listOf(element)).toBe("bt:ShortStrings");
  for (const element of inside("Description")) expect(listOf(element)).toBe("bt:LongStrings");
});

// The platform's published schema, from memory: each element's children in the only order it takes.
const orders: Record<string, string[]> = {
  OfficeApp:
    "Id AlternateId Version ProviderName DefaultLocale DisplayName Description IconUrl HighResolutionIconUrl SupportUrl AppDomains Hosts Requirements DefaultSettings Permissions VersionOverrides ExtendedOverrides".split(
      " ",
    ),
  VersionOverrides: "Description Requirements Hosts Resources WebApplicationInfo EquivalentAddins".split(" "),
  "Host in VersionOverrides": "Runtimes AllFormFactors DesktopFormFactor MobileFormFactor".split(" "),
  AllFormFactors: ["ExtensionPoint"],
  CustomFunctions: ["Script", "Page", "Metadata", "Namespace"],
  DesktopFormFactor: ["GetStarted", "FunctionFile", "ExtensionPoint"],
  GetStarted: ["Title", "Description", "LearnMoreUrl"],
  Group: ["Label", "Icon", "Control"],
  Control: ["Label", "Supertip", "Icon", "Action"],
  Supertip: ["Title", "Description"],
  Action: ["TaskpaneId", "SourceLocation"],
  Resources: ["bt:Images", "bt:Urls", "bt:ShortStrings", "bt:LongStrings"],
};

test.each(Object.entries(orders))("the children of %s stand in the order that the schema fixes", (where, order) => {
  const parents = all.concat(root).filter((element) => placeOf(element) === where);
  expect(parents.length).toBeGreaterThan(0);
  for (const parent of parents) {
    const names = children(parent).map(({ tagName }) => tagName);
    expect(names.filter((name) => !order.includes(name))).toEqual([]);
    expect(names).toEqual([...names].sort((a, b) => order.indexOf(a) - order.indexOf(b)));
  }
});

function placeOf(element: Element): string {
  if (element.getAttribute("xsi:type") === "CustomFunctions") return "CustomFunctions";
  if (element.tagName === "Host" && element.hasAttribute("xsi:type")) return "Host in VersionOverrides";
  return element.tagName;
}

describe("the icons", () => {
  test.each([16, 32, 64, 80, 128])("there is one of %i pixels square, and it shows something", (size) => {
    const png = readFileSync(built(`icon-${size}.png`));
    expect([...png.subarray(0, 8)]).toEqual([137, 80, 78, 71, 13, 10, 26, 10]); // PNG specification, 5.2
    expect([png.readUInt32BE(16), png.readUInt32BE(20)]).toEqual([size, size]); // IHDR, 11.2.2
    // A square of one colour takes fewer bytes than this at any of the sizes.
    expect(png.length).toBeGreaterThan(300);
  });

  test("each is named for the size that it has, and the add-in's own two are 32 and 64", () => {
    const images = all.filter(is("bt:Image")).filter((image) => image.hasAttribute("size"));
    expect(images.length).toBeGreaterThan(0);
    for (const image of images) {
      const size = image.getAttribute("size");
      expect(value(resource(image.getAttribute("resid")!)[0])).toBe(`${origin}/icon-${size}.png`);
    }
    expect(at("IconUrl").map(value)).toEqual([`${origin}/icon-32.png`]);
    expect(at("HighResolutionIconUrl").map(value)).toEqual([`${origin}/icon-64.png`]);
  });

  test("every place that takes an icon has the three sizes it needs", () => {
    // The platform's documentation, from memory: 16, 32 and 80; 20, 24, 40, 48 and 64 besides.
    const places = all.filter(is("Icon"));
    expect(places).toHaveLength(2);
    for (const place of places) {
      const sizes = children(place).map((image) => image.getAttribute("size"));
      expect(sizes).toEqual(expect.arrayContaining(["16", "32", "80"]));
    }
  });
});
