declare module 'vt-pbf' {
  /** Layers as geojson-vt cuts them, as the bytes of one Mapbox vector tile. */
  export function fromGeojsonVt(
    layers: Readonly<Record<string, { readonly features: readonly unknown[] }>>,
    options: { readonly version: 1 | 2; readonly extent: number },
  ): Uint8Array;
}
