import { demoPeople } from './people'

const lines = demoPeople.map(({ role, email, password }) => `  ${role.padEnd(10)} ${email.padEnd(22)} ${password}`)

process.stdout.write(
  `To try the roles, sign in as one of these invented people (e-mail address, passphrase):\n${lines.join('\n')}\n`,
)
