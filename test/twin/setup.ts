import type { TestProject } from "vitest/node";
import { findLibreOffice } from "./find-libreoffice";

declare module "vitest" {
  interface ProvidedContext {
    /** The program soffice. */
    libreOffice: string;
  }
}

/** No LibreOffice, no tests of plain cells: it throws. */
export default function setup(project: TestProject) {
  project.provide("libreOffice", findLibreOffice());
}
