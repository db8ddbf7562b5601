import picture from '../bench.webp';

/** The bench as it is: taken from the replay of an attempt. */
export const BenchPicture = () => (
  <figure className="grid gap-2">
    <img
      src={picture}
      width={1268}
      height={963}
      alt="An open microwave oven seen from above: boards, switches, magnetron, capacitor and transformer with every terminal lettered. Two probes stand on the terminals of the diode."
      className="h-auto w-full rounded-md border border-line bg-mat"
    />
    <figcaption className="text-sm text-ink-2">
      Cover off, one lead of the diode lifted and labelled, both probes on it.
    </figcaption>
  </figure>
);
