import { Link } from "react-router-dom";
import { buttonLook } from "../../components/button.tsx";

/** The list of a co-operative that starts from nothing: the one next step. */
export function MapEmpty({ hasFarms }: { hasFarms: boolean }) {
  return (
    <div className="p-6">
      <h2 className="m-0 font-sign text-xl font-bold">No buildings yet</h2>
      <p>
        {hasFarms
          ? "Stand by one and pin it, or find the farm on the map and click where it stands."
          : "Pin the first one. Its farm can be added on the way, and the farmer is invited by letter."}
      </p>
      <Link to="/map/new" className={buttonLook("quiet")}>
        Pin the first building
      </Link>
    </div>
  );
}
