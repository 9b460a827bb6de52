import { LocaleType, mergeLocales, ThemeService, Univer, UniverInstanceType, type IWorkbookData } from "@univerjs/core";
import { FUniver } from "@univerjs/core/lib/facade";
import {
  CalculationMode,
  CellAlertManagerService,
  FormulaDataModel,
  ILayoutService,
  ISuperTableService,
  SetFormulaCalculationStartMutation,
  SheetInterceptorService,
  SheetsSelectionsService,
  UniverSheetsCorePreset,
  type FWorkbook,
  type FWorksheet,
} from "@univerjs/preset-sheets-core";
import english from "@univerjs/preset-sheets-core/locales/en-US";
import type { Cell } from "../../workbook/address";
import type { Functions } from "../host";
import { keepPartsNamed } from "./accessible-names";
import { Contents } from "./contents";
import { showOwnMessages } from "./error-popup";
import { Messages } from "./messages";
import { shortenNumbers } from "./long-numbers";
import { parameterHelp } from "./parameter-help";
import { repairFormulaEngine } from "./repairs";
import { gridFunction, namespace } from "./sheath-function";
import { Tables, type SheetTable } from "./tables";
import { applyAccent } from "./theme";

export interface Grid {
  api: FUniver;
  /** Another one after another book was opened, as are its contents. */
  readonly workbook: FWorkbook;
  readonly contents: Contents;
  readonly tables: Tables;
  /** Shows another book in place of this one, which is gone with all that could be undone in it. */
  open(data: IWorkbookData, tables: readonly SheetTable[]): void;
  /** Calls back after another book was opened. */
  onOpened(listener: () => void): void;
  /** Calls back after every change of the selected cell or of the sheet shown. */
  onSelection(listener: () => void): () => void;
  /** Calls back after every calculation. */
  onCalculated(listener: () => void): void;
  /** Resolves when what was written so far is calculated. */
  calculated(): Promise<void>;
  /** Resolves when the grid is drawn and takes the keyboard. */
  drawn: Promise<void>;
  focus(): void;
  setDark(dark: boolean): void;
}

/** A spreadsheet grid with its formula bar in `container`, knowing every bound function; nothing else of its kind. */
export function createGrid(
  container: HTMLElement,
  functions: Functions,
  data: IWorkbookData,
  tablesOfData: readonly SheetTable[],
  darkMode: boolean,
): Grid {
  repairFormulaEngine();
  const messages = new Messages();
  const univer = new Univer({
    locale: LocaleType.EN_US,
    locales: { [LocaleType.EN_US]: mergeLocales(english) },
    darkMode,
  });
  const injector = univer.__getInjector();
  applyAccent(injector.get(ThemeService));
  for (const plugin of pluginsFor(container, functions, messages)) {
    if (Array.isArray(plugin)) univer.registerPlugin(plugin[0], plugin[1]);
    else univer.registerPlugin(plugin);
  }
  const api = FUniver.newAPI(univer);
  keepPartsNamed(container);
  const drawn = untilDrawn(api);
  const tables = new Tables(injector.get(ISuperTableService));
  const opened: (() => void)[] = [];
  const show = (data: IWorkbookData, tablesOfData: readonly SheetTable[]) => {
    tables.set(data.id, tablesOfData);
    univer.createUnit(UniverInstanceType.UNIVER_SHEET, data);
    const workbook = api.getActiveWorkbook()!;
    return { workbook, contents: new Contents(workbook, injector.get(FormulaDataModel), messages) };
  };
  let shown = show(data, tablesOfData);
  shortenNumbers(injector.get(SheetInterceptorService));
  showOwnMessages(injector.get(CellAlertManagerService), () => shown);
  api.onBeforeCommandExecute(({ id }) => {
    if (id === SetFormulaCalculationStartMutation.id) messages.startRun();
  });

  const selections = injector.get(SheetsSelectionsService);
  return {
    api,
    get workbook() {
      return shown.workbook;
    },
    get contents() {
      return shown.contents;
    },
    tables,
    open(data, tablesOfData) {
      api.disposeUnit(shown.workbook.getId());
      messages.forgetAll();
      shown = show(data, tablesOfData);
      opened.forEach((listener) => listener());
    },
    onOpened: (listener) => void opened.push(listener),
    onSelection(listener) {
      const watched = [
        selections.selectionMoveEnd$.subscribe(() => listener()),
        selections.selectionSet$.subscribe(() => listener()),
      ];
      const switched = api.addEvent(api.Event.ActiveSheetChanged, () => listener());
      return () => {
        watched.forEach((each) => each.unsubscribe());
        switched.dispose();
      };
    },
    onCalculated: (listener) => void api.getFormula().calculationResultApplied(() => listener()),
    calculated: () => api.getFormula().onCalculationResultApplied(),
    drawn,
    focus: () => injector.get(ILayoutService).focus(),
    setDark: (dark) => api.toggleDarkMode(dark),
  };
}

function untilDrawn(api: FUniver): Promise<void> {
  return new Promise((resolve) =>
    api.addEvent(api.Event.LifeCycleChanged, ({ stage }) => {
      if (stage === api.Enum.LifecycleStages.Rendered) requestAnimationFrame(() => setTimeout(resolve));
    }),
  );
}

/** The one cell that typing goes to, and its sheet. */
export function selectedCell({ workbook }: Grid): { sheet: FWorksheet; cell: Cell } {
  const sheet = workbook.getActiveSheet();
  const range = sheet.getSelection()?.getCurrentCell();
  return { sheet, cell: { row: range?.actualRow ?? 0, column: range?.actualColumn ?? 0 } };
}

function pluginsFor(container: HTMLElement, functions: Functions, messages: Messages) {
  const declared = functions.functions.filter(({ id }) => functions.bound[id]);
  const gridName = (name: string) => `${namespace}.${name}`;
  return UniverSheetsCorePreset({
    container,
    header: true,
    toolbar: false,
    footer: false,
    formulaBar: true,
    contextMenu: false,
    formula: {
      function: declared.map((each) => [gridFunction(each, functions.bound[each.id], messages), gridName(each.name)]),
      description: declared.map((each) => parameterHelp(each, gridName(each.name), functions.enums ?? [])),
      initialFormulaComputing: CalculationMode.FORCED,
    },
  }).plugins;
}
