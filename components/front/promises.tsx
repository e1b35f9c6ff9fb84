const promises = [
  'A reading is safe on the phone the moment it is typed, with no signal, for a whole day.',
  'A crew is never booked twice; the database itself refuses it.',
  'No size without how sure it is, and the readings it stands on.',
  'The bench never cuts from a superseded sheet without being told in red.',
  'Nothing of one shop is ever seen by another.',
  'No customer hears the same thing twice, or anything at night.',
];

export function Promises() {
  return (
    <ul className="grid gap-x-8 md:grid-cols-2">
      {promises.map((promise) => (
        <li key={promise} className="border-b border-rule py-2">
          {promise}
        </li>
      ))}
    </ul>
  );
}
