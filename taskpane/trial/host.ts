/** The part of the host that calls custom functions: its own runtime, the built functions, and their declarations. */

export interface Parameter {
  name: string;
  description?: string;
  optional?: boolean;
  /** Takes any number of ranges, as one last argument: an array of matrices. */
  repeating?: boolean;
  customEnumId?: string;
}

/** One function of functions.json. */
export interface Declaration {
  id: string;
  name: string;
  description: string;
  parameters: Parameter[];
}

export interface WordList {
  id: string;
  values: { stringValue: string; tooltip?: string }[];
}

export interface Declarations {
  functions: Declaration[];
  enums?: WordList[];
}

export type HostFunction = (...args: unknown[]) => unknown;

export interface Functions extends Declarations {
  /** What functions.js bound to its ids. */
  bound: Readonly<Record<string, HostFunction>>;
}

declare const CustomFunctions: {
  _association: { mappings: Record<string, HostFunction> };
  Error: new (code: string, message?: string) => Error & { code: string };
};

/** Loads functions.js as the host does, unchanged, after the host's runtime. */
export async function loadFunctions(): Promise<Functions> {
  const declared = fetch("functions.json").then((response) => response.json() as Promise<Declarations>);
  await keepingTheWindow(() => script("custom-functions-runtime.js"));
  await script("functions.js");
  return { ...(await declared), bound: CustomFunctions._association.mappings };
}

export function hostError(code: string, message?: string): Error & { code: string } {
  return new CustomFunctions.Error(code, message);
}

export function isHostError(cell: unknown): cell is Error & { code: string } {
  return cell instanceof CustomFunctions.Error;
}

function script(src: string): Promise<void> {
  return new Promise((resolve, reject) => {
    const element = document.createElement("script");
    element.src = src;
    element.onload = () => resolve();
    element.onerror = () => reject(new Error(`${src} could not be loaded; run the build first.`));
    document.head.append(element);
  });
}

/** The host's runtime takes dialogs and history away from the page, which the pane and the grid still need. */
async function keepingTheWindow(load: () => Promise<void>): Promise<void> {
  const { alert, confirm, prompt } = window;
  await load();
  Object.assign(window, { alert, confirm, prompt });
  Reflect.deleteProperty(history, "pushState");
  Reflect.deleteProperty(history, "replaceState");
}
