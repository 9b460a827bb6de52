import { checks } from "../catalogue";
import { evaluate } from "../cells/evaluate";
import { repeated } from "./repeated";

/**
 * Whether a function may be believed at these inputs: "holds", "marginal", "fails" or "doubtful input", with the reason; the worst verdict for each row.
 * @customfunction LIMITCHECK
 * @helpurl https://localhost:3000/taskpane.html#LIMITCHECK
 * @param function_name Name of the function to check, as text.
 * @param inputs The inputs of that function, in its own order, as cells or ranges.
 */
export function LIMITCHECK(function_name: any[][], ...inputs: any[][][]): any[][] {
  return evaluate(checks.LIMITCHECK, [function_name, ...repeated(inputs)]);
}
