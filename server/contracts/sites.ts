import type { BuildingKind, PlanSummary, ShapeType } from "./buildings.ts";

/** A row of the manager's table: status and result, no survey answers. */
export interface SiteRow {
  buildingId: string;
  buildingName: string;
  farmId: string;
  farmName: string;
  place: string;
  country: string;
  latitudeDeg: number;
  longitudeDeg: number;
  kind: BuildingKind;
  shapeType: ShapeType;
  outline: { x: number; y: number }[];
  floorAreaM2: number;
  answered: number;
  questions: number;
  advisorName: string | null;
  farmerName: string | null;
  plan: PlanSummary | null;
  /** May the manager open survey and plan? The farmer decides. */
  canOpen: boolean;
}

export interface SitesView {
  cooperativeId: string;
  cooperativeName: string;
  rows: SiteRow[];
}
