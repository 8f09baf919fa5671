import { readWorkbookFile } from '#server/workbook/read-workbook-file.ts';
import { readSource } from '#shared/workbook/read-source.ts';
import { refusalText } from '#shared/workbook/refusal-text.ts';
import { WorkbookRefused } from '#shared/workbook/workbook-refused.ts';
import { parseCommandLine } from './parse-args.ts';
import { ContextRefused, demoCheck, readContext } from './read-context.ts';
import { reportJson } from './report-json.ts';
import { reportText } from './report-text.ts';

export type Outcome = {
  /** 0 clean or notes only, 1 findings, 2 unreadable. */
  readonly exitCode: 0 | 1 | 2;
  readonly stdout: string;
  readonly stderr: string;
};

type Problem = { readonly code: string; readonly detail: string };

const unreadable = (problem: Problem, json: boolean): Outcome =>
  json
    ? { exitCode: 2, stdout: `${JSON.stringify({ problem })}\n`, stderr: '' }
    : { exitCode: 2, stdout: '', stderr: `${problem.detail}\n` };

const problemOf = (error: unknown, file: string): Problem => {
  if (error instanceof WorkbookRefused) return { code: error.code, detail: refusalText(error) };
  if (error instanceof ContextRefused) return { code: 'context-unusable', detail: error.message };
  const code = (error as NodeJS.ErrnoException).code;
  if (code === 'ENOENT') return { code: 'file-missing', detail: `There is no file ${file}.` };
  if (code === 'EISDIR') return { code: 'file-unreadable', detail: `${file} is a folder, not a workbook.` };
  if (code !== undefined)
    return { code: 'file-unreadable', detail: `${file} cannot be read: ${(error as Error).message}` };
  throw error;
};

/** Checks one workbook on the demo standard, without server or database. */
export const runCheck = async (argv: readonly string[]): Promise<Outcome> => {
  const args = parseCommandLine(argv);
  if ('fault' in args) return unreadable({ code: 'usage', detail: args.fault }, argv.includes('--json'));
  try {
    const check = args.context === null ? demoCheck : await readContext(args.context);
    const result = check(readSource(await readWorkbookFile(args.file)));
    const grave = result.findings.some(({ severity }) => severity !== 'note');
    const report = args.json ? reportJson(result) : reportText(result);
    return { exitCode: grave ? 1 : 0, stdout: `${report}\n`, stderr: '' };
  } catch (error) {
    return unreadable(problemOf(error, args.file), args.json);
  }
};
