import { Component, type ReactNode } from 'react';
import { ErrorScreen } from './error-screen.tsx';

interface SectionBoundaryProps {
  /** When this changes the section is tried anew. */
  resetKey?: unknown;
  children: ReactNode;
}
interface SectionBoundaryState {
  failed: { error: unknown } | null;
  resetKey: unknown;
}

/** Keeps the failure of one section from taking the page with it. */
export class SectionBoundary extends Component<SectionBoundaryProps, SectionBoundaryState> {
  override state: SectionBoundaryState = { failed: null, resetKey: this.props.resetKey };

  static getDerivedStateFromError(error: unknown): Partial<SectionBoundaryState> {
    return { failed: { error } };
  }

  static getDerivedStateFromProps(
    props: SectionBoundaryProps,
    state: SectionBoundaryState,
  ): Partial<SectionBoundaryState> | null {
    return props.resetKey === state.resetKey ? null : { failed: null, resetKey: props.resetKey };
  }

  override render(): ReactNode {
    const { failed } = this.state;
    if (!failed) return this.props.children;
    return <ErrorScreen error={failed.error} onRetry={() => this.setState({ failed: null })} />;
  }
}
