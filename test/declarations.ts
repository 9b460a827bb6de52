import { existsSync, readdirSync } from "node:fs";
import { functionsJson } from "../manifest/build/functions-json.js";

export interface Parameter {
  name: string;
  description: string;
  optional?: boolean;
  repeating?: boolean;
  dimensionality?: string;
  customEnumId?: string;
}

export interface Declaration {
  id: string;
  description: string;
  helpUrl: string;
  parameters: Parameter[];
}

export interface Metadata {
  functions: Declaration[];
  enums: { id: string; values: { stringValue: string }[] }[];
  allowErrorForDataTypeAny: boolean;
}

/** functions.json as the build makes it, from the front doors as they stand. */
export function metadata(origin = "https://localhost:3000"): Promise<Metadata> {
  const files = readdirSync("functions")
    .map((family) => `functions/${family}/functions.ts`)
    .filter((file) => existsSync(file));
  return functionsJson(files, origin) as Promise<Metadata>;
}

export async function declarations(): Promise<Map<string, Declaration>> {
  return new Map((await metadata()).functions.map((each) => [each.id, each]));
}
