/** Need against installed heat, and the choice of heaters. */
export function SizingScreen() {
  return <p className="p-4">Opening</p>;
}
