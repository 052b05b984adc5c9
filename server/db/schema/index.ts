export * from './gear'
export * from './people'
export * from './proposals'
