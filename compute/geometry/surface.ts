/** Area of several surfaces together [m²]. */
export function totalM2(surfaces: readonly { readonly areaM2: number }[]): number {
  return surfaces.reduce((sum, { areaM2 }) => sum + areaM2, 0);
}
