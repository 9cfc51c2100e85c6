/** A sentence as a key and its values, so that engines can speak without knowing a language. */
export interface Text {
  key: string;
  params?: Record<string, string | number | Text>;
}
export const say = (key: string, params?: Text['params']): Text => (params ? { key, params } : { key });
