import type { CoverEntry } from "../../../server/contracts/library.ts";
import type { Survey } from "../../../server/contracts/survey.ts";
import { number } from "../../lib/format.ts";

/** The solid layers of the roof; the library lists them from the room outwards. */
export function CoverLayers({ survey, covers }: { survey: Survey; covers: CoverEntry[] }) {
  const part = survey.covers.roof;
  const cover = covers.find((entry) => entry.id === part.cover.value);
  if (!cover) return null;
  return (
    <section aria-label="Layers of the roof">
      <h3 className="m-0 font-sign text-base font-bold">Roof, outside to inside</h3>
      {part.uValue ? (
        <p className="m-0 text-sm text-ink-2">A typed U-value takes the place of these layers.</p>
      ) : null}
      <table className="w-full border-collapse text-sm">
        <thead>
          <tr className="border-b border-ink text-xs text-ink-2">
            <th scope="col" className="py-1 text-left font-semibold">
              Layer
            </th>
            <th scope="col" className="text-left font-semibold">
              What
            </th>
            <th scope="col" className="text-right font-semibold">
              mm
            </th>
          </tr>
        </thead>
        <tbody>
          {[...cover.layers].reverse().map((layer, i) => (
            // biome-ignore lint/suspicious/noArrayIndexKey: layers have no other name than their place
            <tr key={i} className="border-b border-rule">
              <th scope="row" className="py-1.5 text-left font-bold">
                {i + 1}
              </th>
              <td>{layer.name}</td>
              <td className="text-right">
                {layer.thicknessMm === null ? "" : number(layer.thicknessMm, layer.thicknessMm < 2 ? 2 : 0)}
              </td>
            </tr>
          ))}
        </tbody>
      </table>
    </section>
  );
}
