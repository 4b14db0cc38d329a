export const Mark = () => (
  <svg width="34" height="24" viewBox="0 0 34 24" aria-hidden="true">
    <path d="M1 4H9L22 20H33" fill="none" stroke="var(--earth)" strokeWidth="3" />
    <path d="M1 1.2H10.4L23.4 17.2H33" fill="none" stroke="var(--water)" strokeWidth="2.2" />
  </svg>
)
