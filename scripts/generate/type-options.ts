import type { Options } from 'json-schema-to-typescript';

export const TYPE_OPTIONS: Partial<Options> = {
  bannerComment: '',
  additionalProperties: false,
  ignoreMinAndMaxItems: true,
  format: true,
  style: { printWidth: 110, singleQuote: true },
};
