/** One rule that a value breaks. */
export interface ValidationError {
  readonly keyword: string;
  /** JSON pointer to the value. */
  readonly instancePath: string;
  /** JSON pointer to the rule. */
  readonly schemaPath: string;
  readonly params: { readonly additionalProperty?: string; readonly missingProperty?: string };
}

/** Whether a value has the shape of a gain module; `errors` is that of the last call. */
declare const validate: {
  (value: unknown): boolean;
  errors?: readonly ValidationError[] | null;
};
export default validate;
