import { OriginGlyph } from "../../components/form/origin-glyph.tsx";
import { originWords } from "../../components/form/origin-words.ts";
import type { ManagementSentence } from "./plain-words.ts";

interface GrantedProps {
  sentences: ManagementSentence[];
  /** Begins a question about one of them; left out for readers who do not answer. */
  onContradict?: (subject: string) => void;
}

/** What was taken for granted about how the farm is run; each line can be contradicted. */
export function Granted({ sentences, onContradict }: GrantedProps) {
  return (
    <section aria-labelledby="granted-heading">
      <h2 id="granted-heading" className="m-0 font-sign text-lg font-bold">
        What we took for granted about your house
      </h2>
      <p className="m-0 text-sm text-ink-2">
        If one of these is not so, the answer changes. An empty square was not told by anybody: it is a
        typical value.
      </p>
      <ul className="m-0 mt-1 list-none p-0">
        {sentences.map((sentence) => (
          <li
            key={sentence.id}
            className="grid grid-cols-[20px_minmax(0,1fr)] items-start gap-x-2 border-b border-rule py-2 md:grid-cols-[20px_minmax(0,1fr)_auto]"
          >
            <span className="pt-1.5">
              <OriginGlyph origin={sentence.origin} />
            </span>
            <span>
              {sentence.text}
              <span className="block text-xs text-ink-2">{originWords[sentence.origin].long}</span>
            </span>
            {onContradict ? (
              <button
                type="button"
                onClick={() => onContradict(sentence.subject)}
                className="col-start-2 min-h-11 justify-self-start text-sm font-semibold text-bottle underline underline-offset-4 hover:text-bottle-deep md:col-start-3 print:hidden"
              >
                That is not so<span className="sr-only">{`: ${sentence.subject}`}</span>
              </button>
            ) : null}
          </li>
        ))}
      </ul>
    </section>
  );
}
