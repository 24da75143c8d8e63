import { type ReactNode } from 'react';
import { PageHead } from '../shell/page-head';
import { Banner } from '../ui/banner';
import { Page, Stack } from '../ui/layout';

/** What a form could not do, for the band above it. */
export interface FormTrouble {
  text: string;
  code: string;
}

export interface FormFrameProps {
  title: string;
  back?: string;
  trouble: FormTrouble | null;
  children: ReactNode;
}

/** The page around a form of one's account. */
export function FormFrame({ title, back, trouble, children }: FormFrameProps) {
  return (
    <>
      <PageHead title={title} back={back} />
      <Page width="form">
        <Stack gap={24}>
          {trouble ? (
            <Banner kind="fails">
              {trouble.text} If somebody asks: {trouble.code}
            </Banner>
          ) : null}
          {children}
        </Stack>
      </Page>
    </>
  );
}
