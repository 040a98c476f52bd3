export { wallAreaFt2, wallAreaM2, type WallSizes } from './area';
export { cheapestContainers, type ContainerCount, type ContainerSize, priceOfContainers } from './containers';
export { coverageFt2PerGal, coverageSource } from './coverage';
export { courseCount, profileFactor, sidingProfile, sidingProfiles } from './profile';
export { sealantYieldFt } from './sealant';
export { exampleContainers, type StainEstimate, type StainNeed, stainNeeded, type StainRange, stainRange } from './stain';
