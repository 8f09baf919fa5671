/** What Ajv writes: see validators.ts, where the bundler resolves this name. */
declare module 'compiled-schemas' {
  type Fault = {
    readonly instancePath: string;
    readonly keyword: string;
    readonly params: Readonly<Record<string, unknown>>;
  };
  type Validate = { (value: unknown): boolean; errors?: readonly Fault[] | null };
  export const set: Validate;
  export const straighten: Validate;
  export const relevel: Validate;
  export const pour: Validate;
  export const event: Validate;
  export const photo: Validate;
  export const batch: Validate;
  export const standard: Validate;
  export const product: Validate;
}
