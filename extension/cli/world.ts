/** What the command needs of the world outside. */
export interface World {
  /** What a path is: a file, a folder, or nothing that can be read. */
  kindOf(path: string): 'file' | 'folder' | 'nothing';
  /** The text of a file, at most a little more than a design may have. Throws where it can't be read. */
  read(path: string): string;
  /** Design files below folders or matching patterns, sorted. */
  find(patterns: readonly string[]): Promise<string[]>;
  /** Runs the language server on the standard streams; ends with the process. */
  serve(): Promise<never>;
  readonly version: string;
  out(text: string): void;
  err(text: string): void;
}
