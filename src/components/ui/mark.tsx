/** The pole standing in its foam: the sign of the product. */
export function Mark({ className }: { className?: string }) {
  return (
    <svg viewBox="0 0 20 24" width="20" height="24" className={className} aria-hidden="true">
      <path d="M5.2 13.5 6 22.9h8l.8-9.4" className="fill-foam stroke-ink" strokeWidth="1.3" />
      <path d="M0 13.5h5.4M14.6 13.5H20" className="stroke-ink" strokeWidth="1.7" />
      <path d="M8.4 0h3.2l.8 21H7.6z" className="fill-ink" />
    </svg>
  );
}
