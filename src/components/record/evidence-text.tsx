export interface EvidenceTextProps {
  readonly text: string
}

const isLink = (word: string): boolean => /^https:\/\/\S+$/.test(word)

/** Words that back a value; the addresses among them can be followed. */
export function EvidenceText({ text }: EvidenceTextProps) {
  return (
    <span className="break-words">
      {text.split(/(\s+)/).map((word, at) =>
        isLink(word) ? (
          <a key={at} href={word} rel="nofollow noopener noreferrer ugc" target="_blank" className="link break-all">
            {word}
          </a>
        ) : (
          word
        ),
      )}
    </span>
  )
}
