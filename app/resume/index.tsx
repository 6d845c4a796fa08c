export { ResumeHelpScreen as default } from '../../components/resume/resume-help-screen';
