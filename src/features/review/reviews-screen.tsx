/** The reviews a person takes part in. */
export function ReviewsScreen() {
  return <p className="p-4">Opening</p>;
}
