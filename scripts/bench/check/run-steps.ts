import { spawn } from 'node:child_process';
import { fileURLToPath } from 'node:url';
import { build } from 'esbuild';
import { DEMO_PRODUCT, DEMO_STANDARD } from '#shared/standard/demo.ts';

export type Structures = {
  readonly 'fill-short': readonly string[];
  readonly 'embedment-short': readonly string[];
};

const here = (name: string): string => fileURLToPath(new URL(name, import.meta.url));

/** Runs a program to its end and gives its output. */
function run(program: string, args: readonly string[], input: string): Promise<string> {
  return new Promise((resolve, reject) => {
    const child = spawn(program, args, {
      stdio: ['pipe', 'pipe', 'inherit'],
      env: { PATH: process.env['PATH'], TZ: 'UTC' },
    });
    const parts: Buffer[] = [];
    child.stdout.on('data', (part: Buffer) => parts.push(part));
    child.once('error', reject);
    child.once('close', (code) => {
      if (code === 0) resolve(Buffer.concat(parts).toString('utf8'));
      else reject(new Error(`${program} ended with ${code}; what it said stands above.`));
    });
    child.stdin.end(input);
  });
}

/** The step's program in one plain file, as the product's own are; gives its path. */
export async function buildStep(): Promise<string> {
  const outfile = here('../../../node_modules/.cache/upstand-bench/step.mjs');
  await build({
    entryPoints: [here('./step-child.ts')],
    outfile,
    bundle: true,
    packages: 'external',
    platform: 'node',
    format: 'esm',
  });
  return outfile;
}

export async function runStep(program: string, step: 'read' | 'records', file: string): Promise<void> {
  await run(process.execPath, ['--max-semi-space-size=32', program, step, file], '');
}

/** Says how to install openpyxl when it is not there, and fails. */
export async function runOpenpyxl(file: string): Promise<Structures & { readonly pours: number }> {
  const figures = JSON.stringify({ standard: DEMO_STANDARD, product: DEMO_PRODUCT });
  const said = await run('/usr/bin/python3', [here('./openpyxl_check.py'), file], figures);
  return JSON.parse(said) as Structures & { pours: number };
}
