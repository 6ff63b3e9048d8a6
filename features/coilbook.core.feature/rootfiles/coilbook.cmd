@echo off
rem Starts Coilbook: without arguments its window, with arguments the command line.
setlocal
set "JAVA=java"
if defined JAVA_HOME set "JAVA=%JAVA_HOME%\bin\java"
if not defined COILBOOK_JAVA_OPTS set "COILBOOK_JAVA_OPTS=-Xmx1g"
set "AREA=%TEMP%\coilbook-%RANDOM%%RANDOM%"
set "APP=-application coilbook.console.application"
if "%~1"=="" set "APP=-clearPersistedState"
for %%J in ("%~dp0plugins\org.eclipse.equinox.launcher_*.jar") do set "LAUNCHER=%%~fJ"
"%JAVA%" %COILBOOK_JAVA_OPTS% -Djava.awt.headless=true -Dequinox.resolver.revision.batch.size=10 "-Djava.util.logging.config.file=%~dp0logging.properties" -jar "%LAUNCHER%" %APP% -configuration "%AREA%" -data @none %*
set RC=%ERRORLEVEL%
rmdir /s /q "%AREA%" 2>nul
exit /b %RC%
