@echo off
rem Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
rem Runs the headless command of Spanfield from a checkout on Windows. Needs JDK 17 and Maven 3.9 or newer on the PATH.
rem The automated checks run on Linux only; this twin has not been run by them.
setlocal
set "root=%~dp0"
set "product=%root%releng\spanfield.product\target\products\spanfield\linux\gtk\x86_64"
if not exist "%product%\plugins" (
  echo spanfield: building the program, the first time takes a minute or two 1>&2
  pushd "%root%"
  call mvn -B -q -ntp -DskipSuiteTests verify
  if errorlevel 1 (
    popd
    echo spanfield: the build failed 1>&2
    exit /b 5
  )
  popd
)
call "%product%\spanfield.cmd" %*
exit /b %ERRORLEVEL%
