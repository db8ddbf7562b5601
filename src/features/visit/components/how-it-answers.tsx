/** What the bench is and is not, in plain words. */
export const HowItAnswers = () => (
  <section aria-labelledby="how-it-answers" className="grid max-w-[68ch] gap-3">
    <h2 id="how-it-answers" className="text-xl font-bold">
      Where the readings come from
    </h2>
    <p>
      Nothing is scripted. The oven is a circuit of parts with tolerances, and every reading, blown
      fuse and shock is what that circuit gives when it is solved with your leads lifted, your meter
      connected and your cover on or off. Two trainees never measure the same ohms.
    </p>
    <p>
      The bench cannot teach your hands: the feel of a tight connector, the smell of a burnt
      winding, the weight of a transformer. It is for practice before a real oven and beside one.
    </p>
  </section>
);
