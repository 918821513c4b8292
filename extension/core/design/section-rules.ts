import validate from './generated/validate.js';
import { steps } from './steps.ts';

/** What the schema's conditions say of a section with these keys and values, whether or not its text reads. */
export interface SectionRules {
  /** Keys that it can't do without and has not. */
  readonly missing: readonly string[];
  /** Whether another key of it leaves no place for this one. */
  excludes(key: string): boolean;
}

type Data = Readonly<Record<string, unknown>>;

/** `path` of the section, '' for the root; `data` with values as the text writes them, numbers as numbers. */
export function sectionRules(path: string, data: Data): SectionRules {
  const at = steps(path);
  const pointer = at.map((step) => `/${step}`).join('');
  const errorsOf = (section: Data) => {
    validate(
      at.reduceRight<unknown>(
        (inner, step) => (typeof step === 'number' ? listWith(step, inner) : { [step]: inner }),
        section,
      ),
    );
    return validate.errors ?? [];
  };
  const excluded = (section: Data) =>
    errorsOf(section).filter(({ keyword, instancePath }) => keyword === 'not' && instancePath.startsWith(`${pointer}/`))
      .length;
  const before = excluded(data);
  return {
    missing: errorsOf(data).flatMap(({ keyword, instancePath, params }) =>
      keyword === 'required' && instancePath === pointer && params.missingProperty ? [params.missingProperty] : [],
    ),
    // Of two that exclude each other the schema may blame either.
    excludes: (key) => excluded({ ...data, [key]: '' }) > before,
  };
}

function listWith(index: number, item: unknown): readonly unknown[] {
  return [...Array.from({ length: Math.min(index, 1000) }, () => ({})), item];
}
