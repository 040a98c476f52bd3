export * from './people';
export * from './homes';
export * from './work';
export * from './mail';
