import axe from "axe-core";
import type { Page } from "playwright-core";

/** What axe-core finds wrong with a page as it stands. */
export async function violations(page: Page): Promise<string[]> {
  await page.evaluate(`window.axe ?? (() => { ${axe.source} })()`);
  return page.evaluate(async () => {
    const found = await (window as unknown as { axe: typeof axe }).axe.run(document, { resultTypes: ["violations"] });
    return found.violations.flatMap(({ id, nodes }) =>
      nodes.map(({ target, failureSummary }) => `${id} ${target}: ${failureSummary}`),
    );
  });
}
