/** Waves of the water and hatching of the earth, under ids of one drawing. */
export function Engravings({ id }: { id: string }) {
  return (
    <defs>
      <pattern
        id={`${id}-hatch`}
        width="6"
        height="6"
        patternUnits="userSpaceOnUse"
        patternTransform="rotate(-45)"
        className="text-ink"
      >
        <path d="M0 3H6" fill="none" stroke="currentColor" strokeWidth="1.1" />
      </pattern>
      <pattern id={`${id}-waves`} width="36" height="11" patternUnits="userSpaceOnUse" className="text-wave">
        <path d="M0 5.5q4.5 -3 9 0t9 0t9 0t9 0" fill="none" stroke="currentColor" strokeWidth="0.7" />
      </pattern>
    </defs>
  );
}
