/** What the product says to whoever runs it: structured, and never a name, an address or a query. */
export interface Log {
  debug: (fields: object, message: string) => void;
  info: (fields: object, message: string) => void;
  warn: (fields: object, message: string) => void;
  error: (fields: object, message: string) => void;
}
