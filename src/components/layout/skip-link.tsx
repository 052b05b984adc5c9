export function SkipLink() {
  return (
    <a
      href="#main"
      className="sr-only z-20 rounded-ui bg-action px-4 py-2 font-semibold text-on-action focus:not-sr-only focus:absolute focus:top-2 focus:left-2 print:hidden"
    >
      Skip to the content
    </a>
  )
}
