export function ReviewPage() {
  return null;
}
