import { Ajv2020, type ValidateFunction } from 'ajv/dist/2020.js';
import addFormatsModule from 'ajv-formats';
import type { JobDefinition } from '#server/jobs/define-job.ts';

// The package is CommonJS; under ESM its default export may stand one step deeper.
const addFormats = ('default' in addFormatsModule
  ? addFormatsModule.default
  : addFormatsModule) as unknown as (ajv: Ajv2020) => void;
const ajv = new Ajv2020({ strict: true });
addFormats(ajv);
const compiled = new Map<string, ValidateFunction>();

/** @throws Error naming the job and the first fault; a payload that its handler cannot read never reaches the queue. */
export function checkPayload<P extends object>(job: JobDefinition<P>, payload: P): void {
  const validate = compiled.get(job.name) ?? ajv.compile(job.payload);
  compiled.set(job.name, validate);
  if (!validate(payload)) {
    throw new Error(`The payload of ${job.name} does not fit: ${ajv.errorsText(validate.errors)}.`);
  }
}
