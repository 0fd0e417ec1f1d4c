// A Vitest reporter that counts what really ran, over all suites, and writes "passed failed" into the file LEESIDE_COUNTS.
// A test file that cannot be loaded and an error outside of any test count as failed: neither may vanish from the sum.
import { writeFileSync } from 'node:fs';

const countModule = (testModule) => {
  const states = Array.from(testModule.children.allTests(), (test) => test.result().state);
  const suitesWithErrors = Array.from(testModule.children.allSuites()).filter((suite) => suite.errors().length > 0);
  return {
    passed: states.filter((state) => state === 'passed').length,
    failed: states.filter((state) => state === 'failed').length + suitesWithErrors.length + testModule.errors().length,
  };
};

export default class CountResults {
  onTestRunEnd(testModules, unhandledErrors) {
    const counts = testModules.map(countModule);
    const passed = counts.reduce((sum, count) => sum + count.passed, 0);
    const failed = counts.reduce((sum, count) => sum + count.failed, unhandledErrors.length);
    writeFileSync(process.env.LEESIDE_COUNTS, `${passed} ${failed}\n`);
  }
}
