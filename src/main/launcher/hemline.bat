@echo off
rem Starts Hemline. Needs a Java 17 or newer runtime: JAVA_HOME if set, else java on the path.
rem HEMLINE_JAVA_OPTS adds JVM options, for example -Xmx4g.
setlocal
set "HOME_DIR=%~dp0.."
set "JAVA=java"
if defined JAVA_HOME set "JAVA=%JAVA_HOME%\bin\java"
set "QUIET=-Xshare:auto -Xlog:disable -Xlog:all=error:stderr"
if /i "%~1"=="view" (
  "%JAVA%" %QUIET% %HEMLINE_JAVA_OPTS% --module-path "%HOME_DIR%\javafx" --add-modules javafx.controls,javafx.swing -cp "%HOME_DIR%\lib\hemline.jar" hemline.cli.Main %*
) else (
  "%JAVA%" %QUIET% -XX:SharedArchiveFile="%HOME_DIR%\lib\hemline.jsa" -XX:+UseParallelGC %HEMLINE_JAVA_OPTS% -Djava.awt.headless=true -cp "%HOME_DIR%\lib\hemline.jar" hemline.cli.Main %*
)
exit /b %ERRORLEVEL%
