import { useQuery } from "@tanstack/react-query";
import { useWatch } from "react-hook-form";
import { useParams } from "react-router-dom";
import { StationChooser } from "../../../components/plan/station-chooser.tsx";
import { buildingQuery } from "../../../lib/building-query.ts";
import { unitsFor } from "../../../lib/units.ts";
import { OptionalPart } from "../fields/optional-part.tsx";
import { SurveyQuantity } from "../fields/survey-quantity.tsx";
import { SurveyReference } from "../fields/survey-reference.tsx";
import { useSurveyForm } from "../form-context.ts";
import { typicalQuantity } from "../fresh-parts.ts";

/** The edge of the floor, where most ground heat leaves, and how the site lies. */
export function FloorSection() {
  const { control, library, system } = useSurveyForm();
  const units = unitsFor(system);
  const { buildingId = "" } = useParams();
  const building = useQuery({ ...buildingQuery(buildingId), enabled: buildingId !== "" });
  const edge = useWatch({ control, name: "floor.edge" });
  const entry = library.floorEdges.find((row) => row.id === edge.value);
  return (
    <>
      <SurveyReference
        name="floor.edge"
        label="Edge of the floor"
        options={library.floorEdges}
        about={(id) => {
          const row = library.floorEdges.find((candidate) => candidate.id === id);
          return row ? units.text(row.lossWMK, "linearLoss") : "";
        }}
      />
      <OptionalPart
        name="floor.edgeLoss"
        add="Type a loss along the edge"
        remove="Use the library's edge"
        fresh={() => ({ ...typicalQuantity(entry?.lossWMK ?? 1, "linearLoss", system), origin: "guess" })}
      >
        <SurveyQuantity name="floor.edgeLoss" label="Loss along the floor edge" />
      </OptionalPart>
      <SurveyQuantity name="elevation" label="Height above the sea" hint="thin air cuts what burners give" />
      <SurveyQuantity
        name="frostHollow"
        label="Frost hollow"
        hint="how much colder still nights are here than around"
      />
      {building.data ? <StationChooser building={building.data} units={units} /> : null}
    </>
  );
}
