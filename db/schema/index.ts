export * from './people';
export * from './audit';
export * from './homes';
export * from './work';
export * from './mail';
