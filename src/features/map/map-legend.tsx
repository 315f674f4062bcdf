import { VerdictMark } from "../../components/plan/verdict-mark.tsx";

/** What the marks on the boards mean. */
export function MapLegend() {
  return (
    <div className="pointer-events-none absolute right-6 bottom-6 z-[800] border border-ink bg-sheet px-4 py-3 text-sm max-xl:hidden print:hidden">
      <p className="m-0 font-bold">Each board shows the building's own section</p>
      <ul className="m-0 mt-2 grid list-none gap-1.5 p-0">
        <li className="flex items-center gap-3">
          <VerdictMark kind="short" size={20} />
          Short of heat on the coldest night
        </li>
        <li className="flex items-center gap-3">
          <VerdictMark kind="tight" size={20} />
          Nothing spare
        </li>
        <li className="flex items-center gap-3">
          <VerdictMark kind="unfinished" size={20} />
          Not known yet, dashed edge
        </li>
      </ul>
    </div>
  );
}
