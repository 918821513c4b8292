/** A half-open range of a text, in UTF-16 code units from its start (the unit of editors and of LSP). */
export interface TextRange {
  readonly start: number;
  readonly end: number;
}

/** error: the module cannot work as asked or the file is invalid; warning: an engineer should look; information: validity notes. */
export type Severity = 'error' | 'warning' | 'information';

/** An edit that mends a problem: `text` replaces `range`. */
export interface Fix {
  readonly title: string;
  readonly range: TextRange;
  readonly text: string;
}

/** What is wrong, where, how bad, and what to do about it. */
export interface Problem {
  /** A word from the closed list in `checks/codes.ts`; also the anchor of its section in `extension/docs/checks.md`. */
  readonly code: string;
  readonly severity: Severity;
  /** One or two plain sentences: what is wrong with figures, then what to do. */
  readonly message: string;
  /** Dotted path of the key concerned, e.g. `pump.beam.radius` or `surfaces[0].beam_radius`; '' for the whole file. */
  readonly path: string;
  readonly range: TextRange;
  readonly fixes?: readonly Fix[];
  /** Accepted by a comment of the design: why, and how bad it would be otherwise. It is then listed as a note. */
  readonly accepted?: { readonly reason: string; readonly severity: Severity };
}
