// The closing line of a run: how many tests passed and failed, out of vitest's report. Arguments: the report, how many
// other steps failed, and how the test step itself ended.
import { readFileSync } from "node:fs";

const [report, broken, testStep] = process.argv.slice(2);

const { passed, failed, skipped } = readReport();
// A build that fails, or an error outside any test, ends the step without a failed test.
const inTests = failed || Number(testStep !== "0");
const all = inTests + Number(broken);
const ran = passed + failed > 0;
console.log(`${passed} passed, ${ran ? all : Math.max(all, 1)} failed${skipped ? `, ${skipped} skipped` : ""}`);
process.exitCode = ran && all === 0 ? 0 : 1;

function readReport() {
  try {
    const { numPassedTests, numFailedTests, numPendingTests, testResults } = JSON.parse(readFileSync(report, "utf8"));
    const unloaded = testResults.filter(
      ({ status, assertionResults }) =>
        status === "failed" && !assertionResults.some((assertion) => assertion.status === "failed"),
    );
    return { passed: numPassedTests, failed: numFailedTests + unloaded.length, skipped: numPendingTests };
  } catch (error) {
    console.log(`No report of the tests: ${error.message}`);
    return { passed: 0, failed: 0, skipped: 0 };
  }
}
