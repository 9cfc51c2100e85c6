/** How many answers on this device are not sent; asks the store only when somebody wants to know. */
export async function unsentHere({ sendFirst = false } = {}): Promise<number> {
  const { device } = await import('./device');
  if (!device.ok) return 0;
  if (sendFirst) await device.store.sendNow();
  return device.store.sendState().unsent;
}
