export { StepRoute as default } from '../../components/wizard/step-route';
export { stepParams as generateStaticParams } from '../../components/wizard/step-params';
