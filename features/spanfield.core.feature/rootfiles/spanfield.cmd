@echo off
rem Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
rem Starts the headless command of an installed Spanfield on Windows. Needs a Java runtime of version 17 or newer on the PATH.
setlocal
set "home=%~dp0"
set "launcher="
for %%j in ("%home%plugins\org.eclipse.equinox.launcher_*.jar") do set "launcher=%%j"
java -Xmx1g -Xshare:auto -XX:TieredStopAtLevel=1 -XX:+UseSerialGC -Djava.awt.headless=true -Dfile.encoding=UTF-8 %SPANFIELD_JAVA_OPTS% -jar "%launcher%" -nosplash -application spanfield.cli.cli -data @noDefault %*
exit /b %ERRORLEVEL%
