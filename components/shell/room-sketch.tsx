import { LengthTspan } from '@/components/ui/length-tspan';
import { MM_PER_INCH } from '@/lib/units/fraction-parts';

/** A kitchen from above as the product draws rooms; beside forms, for the eye alone. */
export function RoomSketch() {
  return (
    <svg
      viewBox="0 0 508 345"
      aria-hidden="true"
      className="w-full fill-graphite text-[12px]"
      strokeWidth="1"
    >
      <defs>
        <pattern
          id="sketch-filler"
          width="5"
          height="5"
          patternUnits="userSpaceOnUse"
          patternTransform="rotate(45)"
        >
          <path d="M0 0V5" className="stroke-chalk" strokeWidth="1.2" />
        </pattern>
      </defs>
      <path d="M70 60H400L392 330H250V250H64Z" className="fill-sheet stroke-ink" strokeWidth="3" />
      <g className="fill-none stroke-graphite">
        <path d="M84 62H126V112H84ZM126 62H190V112H126ZM190 62H254V112H190ZM254 62H318V112H254Z" />
        <path d="M346 62H396V112H346ZM344 112H393.500V176H344ZM344 176H391.500V240H344Z" />
      </g>
      <path d="M71.500 62H84V112H70Z" fill="url(#sketch-filler)" className="stroke-chalk" />
      <path d="M318 62H346V112H318Z" fill="url(#sketch-filler)" className="stroke-chalk" />
      <g className="fill-none stroke-graphite">
        <path d="M70 34H400M66 38l8-8M396 38l8-8" />
        <path d="M426 60L418 330M422 64l8-8M414 334l8-8" />
        <path d="M64 278H250M60 282l8-8M246 282l8-8" />
      </g>
      <text x="235" y="26" textAnchor="middle">
        <Inches value={141.5} />
      </text>
      <text x="432" y="200">
        <Inches value={115.375} />
      </text>
      <text x="157" y="296" textAnchor="middle">
        <Inches value={79.875} />
      </text>
      <path
        d="M400 60L64 250"
        className="fill-none stroke-blueprint"
        strokeDasharray="7 5"
        strokeWidth="1.3"
      />
      <text x="190" y="205" className="fill-blueprint">
        <Inches value={162.25} />
      </text>
      <path d="M142 246l-9 -13h18z" className="fill-pine" />
      <text x="157" y="243" className="fill-pine">
        high point
      </text>
    </svg>
  );
}

function Inches({ value }: { value: number }) {
  return <LengthTspan mm={value * MM_PER_INCH} unit="in" stepMm={MM_PER_INCH / 16} />;
}
