/** Says that a form of a page has done its work. On the page before it does, or it would not be read out. */
export function DoneLine({ message }: { readonly message: string }) {
  return (
    <p role="status" className="min-h-6 text-sm font-semibold">
      {message}
    </p>
  )
}
