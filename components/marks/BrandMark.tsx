/** The steelyard itself: the studio hangs on the short arm, the poise on the long one. */
export function BrandMark({ width = 44 }: { width?: number }) {
  return (
    <svg width={width} height={(width * 30) / 44} viewBox="0 0 44 30" fill="none" aria-hidden="true" className="block flex-none">
      <g className="stroke-ink" strokeWidth="2" strokeLinejoin="round">
        <path d="M2 12.5 42 8" strokeLinecap="round" />
        <path d="M20 10.2v2.6M24 9.8v2.6M28 9.3v2.6M36 8.5v2.6M40 8v2.6" strokeWidth="1.3" />
        <path d="M13.5 11.2V6.8" />
        <circle cx="13.5" cy="4.3" r="2.3" strokeWidth="1.8" />
        <path d="M6 12.2v4M1.5 20.5 6 16.4l4.5 4.1M2.6 20v7.5h6.8V20" strokeWidth="1.8" />
        <path d="M32 9.2v6" strokeWidth="1.8" />
        <path d="M28.8 15.4h6.4L38 27.5H26z" strokeWidth="1.8" className="fill-lamp" />
      </g>
    </svg>
  );
}
