import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { addCounts, countReport, printCounts } from './vitest-report.mjs';

let folder;
beforeEach(() => (folder = mkdtempSync(join(tmpdir(), 'borewright-report-test-'))));
afterEach(() => rmSync(folder, { recursive: true }));

const passedFile = { status: 'passed', assertionResults: [{ status: 'passed' }, { status: 'passed' }] };
const failedFile = { status: 'failed', assertionResults: [{ status: 'failed' }, { status: 'passed' }] };
const brokenFile = { status: 'failed', assertionResults: [] };

function writeReport({ passed = 0, failed = 0, pending = 0, todo = 0, files }) {
  const file = join(folder, 'report.json');
  const report = {
    numPassedTests: passed,
    numFailedTests: failed,
    numPendingTests: pending,
    numTodoTests: todo,
    testResults: files,
  };
  writeFileSync(file, JSON.stringify(report));
  return file;
}

describe('counting what vitest reports', () => {
  it('counts passed, failed and skipped tests', () => {
    const file = writeReport({ passed: 3, failed: 1, pending: 2, todo: 1, files: [passedFile, failedFile] });
    expect(countReport(file, 1)).toEqual({ passed: 3, failed: 1, skipped: 3 });
  });

  it('counts a file that could not be loaded as failed, once', () => {
    const file = writeReport({ passed: 2, files: [passedFile, brokenFile] });
    expect(countReport(file, 1)).toEqual({ passed: 2, failed: 1, skipped: 0 });
  });

  it('fails a run that ended badly although every test passed', () => {
    const file = writeReport({ passed: 2, files: [passedFile] });
    expect(countReport(file, 1)).toEqual({ passed: 2, failed: 1, skipped: 0 });
  });

  it('fails a run that left no report', () => {
    expect(countReport(join(folder, 'absent.json'), 1)).toEqual({ passed: 0, failed: 1, skipped: 0 });
  });

  it('leaves a good run alone', () => {
    const file = writeReport({ passed: 2, files: [passedFile] });
    expect(countReport(file, 0)).toEqual({ passed: 2, failed: 0, skipped: 0 });
  });
});

describe('printing the counts', () => {
  it.each([
    [{ passed: 12, failed: 0, skipped: 0 }, '12 passed, 0 failed'],
    [{ passed: 12, failed: 1, skipped: 2 }, '12 passed, 1 failed, 2 skipped'],
  ])('%o', (counts, line) => {
    expect(printCounts(counts)).toBe(line);
  });

  it('adds layers up', () => {
    const sum = addCounts({ passed: 1, failed: 2, skipped: 3 }, { passed: 10, failed: 20, skipped: 30 });
    expect(sum).toEqual({ passed: 11, failed: 22, skipped: 33 });
  });
});
