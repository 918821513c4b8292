/** Every problem that reading a design can raise, with the title of its section in `extension/docs/checks.md`. */
export const READING_CODES = [
  { code: 'file-too-large', title: 'The file is larger than a design can be' },
  { code: 'not-text', title: 'The file is not text' },
  { code: 'empty-file', title: 'The file holds no design' },
  { code: 'several-documents', title: 'The file holds more than one document' },
  { code: 'yaml-syntax', title: 'The text is not valid YAML' },
  { code: 'nested-too-deep', title: 'Values are nested too deep' },
  { code: 'duplicate-key', title: 'A key appears twice in one section' },
  { code: 'bad-alias', title: 'An alias or a merge leads nowhere' },
  { code: 'alias-expansion', title: 'Aliases expand to too many values' },
  { code: 'too-many-problems', title: 'Only the first problems are shown' },
  { code: 'unknown-key', title: 'A key is not known' },
  { code: 'missing-key', title: 'A key is missing' },
  { code: 'excluded-key', title: 'A key has no place beside another' },
  { code: 'missing-value', title: 'A key has no value' },
  { code: 'wrong-type', title: 'A value is of the wrong kind' },
  { code: 'not-allowed', title: 'A value is not one of those allowed' },
  { code: 'out-of-range', title: 'A value is outside what can be' },
  { code: 'unusual-value', title: 'A value is outside what is usual' },
] as const;

export type ReadingCode = (typeof READING_CODES)[number]['code'];
