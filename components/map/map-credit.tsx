/** Always in sight, on every map: what it is not for, and whose coastline it is. */
export function MapCredit() {
  return (
    <p className="map-credit" data-testid="map-credit">
      <strong>Sample chart: not for navigation.</strong>{' '}
      <span>Coastline: GSHHG 2.3.7, P. Wessel &amp; W. H. F. Smith (LGPL-3.0-or-later)</span>
    </p>
  );
}
