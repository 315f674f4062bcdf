/** The heat balance of one building. */
export function HeatScreen() {
  return <p className="p-4">Opening</p>;
}
