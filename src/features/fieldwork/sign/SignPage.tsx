export function SignPage() {
  return null;
}
