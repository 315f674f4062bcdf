import type { FarmView } from "../../../server/contracts/farms.ts";
import { useChangeFarm } from "./api.ts";

/** What the co-operative may see of a farm. Only the farmer decides. */
export function Sharing({ farm }: { farm: FarmView }) {
  const change = useChangeFarm(farm.id);
  return (
    <section aria-labelledby="farm-sharing">
      <h2 id="farm-sharing" className="m-0 border-b-2 border-ink pb-1 font-sign text-lg font-bold">
        What the co-operative sees
      </h2>
      <p>
        The manager always sees whether a house holds on the coldest night. Survey and plan only if the farmer
        agrees.
      </p>
      {farm.can.share ? (
        <label className="flex min-h-11 items-center gap-3">
          <input
            type="checkbox"
            className="size-6 accent-bottle"
            checked={farm.sharedWithManager}
            disabled={change.isPending}
            onChange={(event) => change.mutate({ sharedWithManager: event.target.checked })}
          />
          The manager may open survey and plan
        </label>
      ) : (
        <p className="font-semibold">
          {farm.sharedWithManager
            ? "The farmer shares survey and plan."
            : "The farmer shares the result only."}
        </p>
      )}
      {change.error ? (
        <p role="alert" className="text-sm font-semibold text-redlead">
          {change.error.message}
        </p>
      ) : null}
    </section>
  );
}
