/** One plan in plain words. */
export function ReviewScreen() {
  return <p className="p-4">Opening</p>;
}
