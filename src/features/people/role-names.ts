export const roleNames = { member: 'Member', moderator: 'Moderator', admin: 'Admin' } as const

export type RoleName = keyof typeof roleNames
