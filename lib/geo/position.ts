/** A place on WGS 84: degrees north and east, negative to the south and west. */
export interface Position {
  readonly lat: number;
  readonly lon: number;
}
