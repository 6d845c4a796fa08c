export { ResumeScreen as default } from '../../components/resume/resume-screen';
