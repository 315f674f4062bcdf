import type { HouseBalance, SurfaceFlow } from "../../../../server/engine/plan/plan-types.ts";
import { type FigureColumn, FigureTable } from "../../../components/chart/figure-table.tsx";
import { number, percent } from "../../../lib/format.ts";
import type { Units } from "../../../lib/units.ts";
import { togetherByRoofSide } from "./roof-sides.ts";

/** Every surface of the envelope: size, U-value, heat and the temperature of its faces. */
export function SurfaceTable({ balance, units }: { balance: HouseBalance; units: Units }) {
  const all = Math.max(
    1,
    balance.surfaces.reduce((sum, surface) => sum + surface.lossW, 0),
  );
  const columns: FigureColumn<SurfaceFlow>[] = [
    {
      id: "label",
      header: "Surface",
      names: true,
      cell: (row) => (
        <span className="block min-w-36 py-1 leading-tight whitespace-normal">
          {row.label}
          <span className="block text-xs text-ink-2">{row.assemblyName}</span>
        </span>
      ),
      plain: (row) => row.label,
    },
    {
      id: "area",
      header: "Area",
      unit: units.symbol("area"),
      cell: (row) => units.figure(row.areaM2, "area").value,
      plain: (row) => units.amount(row.areaM2, "area"),
    },
    {
      id: "u",
      header: "U-value",
      unit: units.symbol("uValue"),
      cell: (row) => units.figure(row.uValueWM2K, "uValue").value,
      plain: (row) => units.amount(row.uValueWM2K, "uValue"),
    },
    {
      id: "loss",
      header: "Heat",
      unit: units.symbol("power"),
      cell: (row) => <b>{units.figure(row.lossW, "power").value}</b>,
      plain: (row) => units.amount(row.lossW, "power"),
    },
    {
      id: "flux",
      header: "For its area",
      unit: units.symbol("heatFlux"),
      cell: (row) => units.figure(row.areaM2 > 0 ? row.lossW / row.areaM2 : null, "heatFlux").value,
      plain: (row) => (row.areaM2 > 0 ? units.amount(row.lossW / row.areaM2, "heatFlux") : ""),
    },
    {
      id: "share",
      header: "Share",
      cell: (row) => percent(row.lossW / all),
      plain: (row) => number((row.lossW / all) * 100, 1),
    },
    {
      id: "inner",
      header: "Inner face",
      unit: units.symbol("temperature"),
      cell: (row) => (
        <>
          {units.figure(row.faceTempsC[0], "temperature").value}
          {row.wetInside ? <span className="block text-xs font-semibold">wet</span> : null}
        </>
      ),
      plain: (row) => units.amount(row.faceTempsC[0] ?? Number.NaN, "temperature"),
    },
    {
      id: "outer",
      header: "Outer face",
      unit: units.symbol("temperature"),
      cell: (row) => units.figure(row.faceTempsC.at(-1), "temperature").value,
      plain: (row) => units.amount(row.faceTempsC.at(-1) ?? Number.NaN, "temperature"),
    },
  ];
  const total: SurfaceFlow = {
    surfaceId: "all",
    label: "All surfaces",
    role: "",
    areaM2: balance.surfaces.reduce((sum, surface) => sum + surface.areaM2, 0),
    assemblyName: "",
    uValueWM2K: Number.NaN,
    lossW: all,
    toAirW: 0,
    toSkyW: 0,
    faceTempsC: [],
    layerNames: [],
    wetInside: false,
  };
  return (
    <FigureTable
      caption="Heat by surface"
      columns={columns}
      rows={togetherByRoofSide(balance.surfaces)}
      rowKey={(row) => row.surfaceId}
      foot={total}
    />
  );
}
