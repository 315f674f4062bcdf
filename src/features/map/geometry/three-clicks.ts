import { afterRidgeDrag, afterSideDrag, type Footprint, type GroundPoint } from "../../../lib/footprint.ts";

/** A house from three clicks: one end of the ridge, the other end, and a point on a long side. */
export function houseFromClicks([first, second, side]: [GroundPoint, GroundPoint, GroundPoint]): {
  middle: GroundPoint;
  footprint: Footprint;
} {
  const middle = {
    latitudeDeg: (first.latitudeDeg + second.latitudeDeg) / 2,
    longitudeDeg: (first.longitudeDeg + second.longitudeDeg) / 2,
  };
  const { lengthM, bearingDeg } = afterRidgeDrag(middle, second);
  return { middle, footprint: { lengthM, bearingDeg, widthM: afterSideDrag(middle, bearingDeg, side) } };
}
