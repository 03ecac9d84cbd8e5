/** What the edit form sends; the server trusts none of it. */
export interface SaveBoatRequest {
  /** Null: a new boat. */
  readonly boatId: string | null;
  /** The version that the typed one is based on; null for a new boat. */
  readonly basedOnNumber: number | null;
  readonly name: unknown;
  readonly sheet: unknown;
}

export type SaveBoatAnswer =
  | { readonly kind: 'saved'; readonly boatId: string; readonly number: number }
  | { readonly kind: 'fields'; readonly problems: readonly { readonly pointer: string; readonly message: string }[] }
  | { readonly kind: 'conflict'; readonly message: string; readonly newestNumber: number }
  | { readonly kind: 'signed-out' }
  | { readonly kind: 'refused'; readonly message: string };

export type SaveBoat = (request: SaveBoatRequest) => Promise<SaveBoatAnswer>;
