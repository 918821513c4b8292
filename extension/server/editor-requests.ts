import type { Connection, Range } from 'vscode-languageserver';
import type { TextRange } from '../core/report/problem.ts';
import { codeActions } from '../language/code-actions.ts';
import { codeLenses } from '../language/code-lenses.ts';
import { completion } from '../language/completion/completion.ts';
import { definition } from '../language/definition.ts';
import { foldingRanges } from '../language/folding.ts';
import { hover } from '../language/hover.ts';
import { inlayHints } from '../language/inlay-hints.ts';
import type { Subject } from '../language/subject.ts';
import { documentSymbols } from '../language/symbols.ts';
import type { ServerOptions, Settings } from '../protocol/requests.ts';
import type { Answers } from './answers.ts';

/** Answers what the Language Server Protocol asks about a document; each feature is a pure function of a subject. */
export function answerEditor(
  connection: Connection,
  { about }: Answers,
  options: () => ServerOptions & { readonly settings: Settings },
): void {
  connection.onHover(about((subject, { position }) => hover(subject, subject.offsetAt(position)) ?? null, null));
  connection.onCompletion(about((subject, { position }) => completion(subject, subject.offsetAt(position)), null));
  connection.onCodeAction(
    about((subject, { range }) => codeActions(subject, offsets(subject, range), options().checksUri), null),
  );
  connection.onCodeLens(
    about((subject) => {
      const { settings, readoutCommand } = options();
      return settings.codeLens.prediction ? codeLenses(subject, readoutCommand) : [];
    }, null),
  );
  connection.languages.inlayHint.on(
    about((subject, { range }) => inlayHints(subject, offsets(subject, range), options().settings.inlayHints), null),
  );
  connection.onDocumentSymbol(about((subject) => documentSymbols(subject), null));
  connection.onDefinition(
    about((subject, { position }) => definition(subject, subject.offsetAt(position)) ?? null, null),
  );
  connection.onFoldingRanges(about((subject) => foldingRanges(subject), null));
}

function offsets(subject: Subject, range: Range): TextRange {
  return { start: subject.offsetAt(range.start), end: subject.offsetAt(range.end) };
}
