/** What is being typed into a cell, before it is put in. */
import type { FUniver } from '@univerjs/core/facade';
import { Subject, type Observable } from 'rxjs';

export interface Typing {
  /** As far as it goes; `null` while no cell is edited, or nothing was typed yet. */
  readonly text: string | null;
  /** Keys were struck, or the edit has ended. */
  readonly changes: Observable<void>;
}

export function followTyping(api: FUniver): Typing {
  let text: string | null = null;
  const changes = new Subject<void>();
  const tell = (typed: string | null): void => {
    text = typed;
    changes.next();
  };
  api.addEvent(api.Event.SheetEditChanging, ({ value }) => tell(value.toPlainText().replace(/[\r\n]+$/, '')));
  api.addEvent(api.Event.SheetEditEnded, () => tell(null));
  return {
    get text() {
      return text;
    },
    changes,
  };
}
