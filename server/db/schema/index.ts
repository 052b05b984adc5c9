export * from './gear'
