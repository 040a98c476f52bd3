/** A worked example for somebody without a home yet: invented, with the kind of figures that come out. */
const example = [
  { wall: 'Front, south-west', sun: '1,240 kWh/m² a year', coat: 'coat lasts about 3 years' },
  { wall: 'Back, north-east', sun: '520 kWh/m² a year', coat: 'coat lasts about 7 years' },
];

export function FirstHome() {
  return (
    <figure className="m-0">
      <figcaption className="text-quiet">A cabin in Montana, set up in about three minutes, might say:</figcaption>
      <ul className="mt-3 grid">
        {example.map((row) => (
          <li key={row.wall} className="course px-4 py-3">
            <strong>{row.wall}</strong>
            <span className="block text-quiet">
              {row.sun}: {row.coat}
            </span>
          </li>
        ))}
      </ul>
    </figure>
  );
}
