/** The usual warnings where brine is made and handled. */
export function BrineCautions() {
  return (
    <ul className="grid list-disc gap-1.5 pl-4 text-soft">
      <li>
        Goggles and gloves; flush eyes with clean water for 15 minutes. Calcium chloride heats as it dissolves: add it
        slowly, to water.
      </li>
      <li>Never enter a tank alone or untested: the air in it may not keep you alive.</li>
      <li>Spilled brine is slippery, rusts steel and kills plants. Keep it bunded and out of drains.</li>
      <li>Calcium and magnesium chloride can leave a damp, slippery film in warm or humid weather.</li>
      <li>These figures support a decision. Local policy, the product’s label and a qualified person make it.</li>
    </ul>
  );
}
