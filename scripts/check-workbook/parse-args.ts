import { parseArgs } from 'node:util';

export const USAGE = 'Usage: npm run -s check -- FILE.xlsx [--json] [--context FILE]';

export type Args = { readonly file: string; readonly json: boolean; readonly context: string | null };

/** The command line, or what is wrong with it. */
export const parseCommandLine = (argv: readonly string[]): Args | { readonly fault: string } => {
  try {
    const { values, positionals } = parseArgs({
      args: [...argv],
      allowPositionals: true,
      options: { json: { type: 'boolean' }, context: { type: 'string' } },
    });
    const [file] = positionals;
    if (file === undefined || positionals.length > 1) return { fault: `Name one workbook. ${USAGE}` };
    return { file, json: values.json === true, context: values.context ?? null };
  } catch (error) {
    return { fault: `${(error as Error).message} ${USAGE}` };
  }
};
