import { countResults } from '@/scripts/checks/jest-run.mjs';

const results = (numPassedTests: number, numFailedTests: number, numRuntimeErrorTestSuites: number) =>
  JSON.stringify({ numPassedTests, numFailedTests, numRuntimeErrorTestSuites });

describe('countResults', () => {
  it('counts a file that could not be run as one failed test', () => {
    expect(countResults(results(40, 2, 1), 1)).toEqual({ passed: 40, failed: 3 });
  });

  it('counts no failure after a clean run', () => {
    expect(countResults(results(40, 0, 0), 0)).toEqual({ passed: 40, failed: 0 });
  });

  it('counts one failure when Jest fails though no test did', () => {
    expect(countResults(results(40, 0, 0), 1)).toEqual({ passed: 40, failed: 1 });
  });

  it('counts one failure when Jest ended without a word', () => {
    expect(countResults(null, 1)).toEqual({ passed: 0, failed: 1 });
  });
});
