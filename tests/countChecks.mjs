import path from "node:path";

/**
 * Reads Vitest's JSON report and counts the tests, saying how many compare with something outside the project.
 *
 * The rule: a test whose file stands in `tests/published/`, or whose title (with the titles around it) names
 * its source as `(source: key, place)`, is a check against an outside source. A test whose title says
 * `common practice` states a fact of the trade that needs no source and is counted apart.
 *
 * @param {{ testResults: { name: string, status: string, assertionResults: { status: string, fullName: string }[] }[] }} report
 * @param {string} root the repository's folder
 */
export function countChecks(report, root) {
  const counts = { passed: 0, failed: 0, skipped: [], outside: 0, outsidePassed: 0, commonPractice: 0 };
  for (const file of report.testResults) {
    const name = path.relative(root, file.name).split(path.sep).join("/");
    // A file that fails to load reports no tests at all; it counts as one failure.
    if (file.assertionResults.length === 0 && file.status === "failed") counts.failed += 1;
    for (const test of file.assertionResults) {
      const ok = test.status === "passed";
      if (ok) counts.passed += 1;
      else if (test.status === "failed") counts.failed += 1;
      else counts.skipped.push(test.fullName);
      if (/common practice/i.test(test.fullName)) counts.commonPractice += 1;
      else if (name.startsWith("tests/published/") || /\(source: [^)]+\)/.test(test.fullName)) {
        counts.outside += 1;
        if (ok) counts.outsidePassed += 1;
      }
    }
  }
  return counts;
}
